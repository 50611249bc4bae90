import { cellName, columnName } from "../../sheets";
import { isError, type StoredCell, type StoredSheet } from "../content";
import { linksOutside } from "../outside-formula";
import { couldSpill, toStored } from "../stored-formula";
import { element, escaped, escapedText, part } from "../xml";
import type { SharedStrings } from "./shared-strings";
import type { Styles } from "./styles";

const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

/** Of the font that files are measured in: pixels of a digit, and of the edges of a cell. */
const digit = 7;
const edges = 5;
const pointsPerPixel = 0.75;

/** A4; the other side of the world chooses its own on its printer. */
const paperSize = 9;

/** One worksheet: prints landscape on one page's width, with its header on each page. */
export function sheetPart(
  sheet: StoredSheet,
  styles: Styles,
  strings: SharedStrings,
  isFirst: boolean,
): string {
  return part(
    element(
      "worksheet",
      { xmlns: main },
      element("sheetPr", {}, element("pageSetUpPr", { fitToPage: 1 })),
      element("dimension", { ref: usedRange(sheet) }),
      view(sheet, isFirst),
      element("sheetFormatPr", { defaultRowHeight: 15 }),
      ...columns(sheet, styles),
      element("sheetData", {}, ...rows(sheet, styles, strings)),
      element("pageMargins", { left: 0.5, right: 0.5, top: 0.6, bottom: 0.6, header: 0.3, footer: 0.3 }),
      element("pageSetup", { paperSize, orientation: "landscape", fitToWidth: 1, fitToHeight: 0 }),
    ),
  );
}

/** From A1 to the last cell that is stored, so that a printout begins at the title. */
export function usedRange({ cells }: StoredSheet): string {
  let [row, column] = [0, 0];
  for (const cell of cells) {
    row = Math.max(row, cell.row);
    column = Math.max(column, cell.column);
  }
  return `A1:${cellName(row, column)}`;
}

function view({ frozenRows }: StoredSheet, isFirst: boolean): string {
  const below = cellName(frozenRows, 0);
  const frozen = [
    element("pane", { ySplit: frozenRows, topLeftCell: below, activePane: "bottomLeft", state: "frozen" }),
    element("selection", { pane: "bottomLeft", activeCell: below, sqref: below }),
  ];
  const attributes = { tabSelected: isFirst ? 1 : undefined, workbookViewId: 0 };
  return element("sheetViews", {}, element("sheetView", attributes, ...(frozenRows > 0 ? frozen : [])));
}

function columns(sheet: StoredSheet, styles: Styles): string[] {
  const list = sheet.columns.flatMap(({ width, look }, index) => {
    if (width === undefined && !look) return [];
    // 64 pixels is what a column has that says nothing.
    const characters = Math.round((100 * ((width ?? 64) - edges)) / digit) / 100;
    const style = look ? styles.index(look) : undefined;
    return [element("col", { min: index + 1, max: index + 1, width: characters, style, customWidth: 1 })];
  });
  return list.length > 0 ? [element("cols", {}, ...list)] : [];
}

function rows({ cells, heights = [] }: StoredSheet, styles: Styles, strings: SharedStrings): string[] {
  const byRow = new Map<number, StoredCell[]>(heights.map(({ row }) => [row, []]));
  for (const cell of cells) {
    const row = byRow.get(cell.row);
    if (row) row.push(cell);
    else byRow.set(cell.row, [cell]);
  }
  const heightOf = new Map(heights.map(({ row, height }) => [row, height * pointsPerPixel]));
  return [...byRow]
    .sort(([a], [b]) => a - b)
    .map(([row, list]) => {
      const ht = heightOf.get(row);
      const written = list
        .sort((a, b) => a.column - b.column)
        .map((cell) => cellElement(cell, styles, strings));
      return element("row", { r: row + 1, ht, customHeight: ht === undefined ? undefined : 1 }, ...written);
    });
}

/** What Excel would take for a formula when somebody edits the cell, and an apostrophe that it would take for a mark. */
const likeFormula = /^[=+\-@'＝＋－＠]/;

function cellElement(planned: StoredCell, styles: Styles, strings: SharedStrings): string {
  const cell = disarmed(planned);
  const { formula, look = {}, value } = cell;
  const isMarkedText = formula === undefined && typeof value === "string" && likeFormula.test(value);
  const isDynamic = formula !== undefined && (cell.spill !== undefined || couldSpill(formula));
  const [type, content] = valueElement(cell, strings);
  const attributes = {
    r: cellName(cell.row, cell.column),
    s: styles.index(look, isMarkedText) || undefined,
    t: type,
    // The first and only entry of metadata.xml: a dynamic array.
    cm: isDynamic ? 1 : undefined,
  };
  if (formula === undefined) return element("c", attributes, ...content);
  const array = isDynamic ? { t: "array", ref: filledRange(cell) } : {};
  return element("c", attributes, element("f", array, escaped(toStored(formula))), ...content);
}

/**
 * A formula that was typed here and takes something from another file or program is kept as a text: what it gives is
 * not known here, and no file of ours starts anything.
 */
function disarmed(cell: StoredCell): StoredCell {
  if (cell.formula === undefined || !linksOutside(cell.formula)) return cell;
  const { formula, spill: _, ...rest } = cell;
  return { ...rest, value: formula };
}

function filledRange({ row, column, spill: [down, across] = [1, 1] }: StoredCell): string {
  const corner = cellName(row, column);
  return down * across === 1 ? corner : `${corner}:${columnName(column + across - 1)}${row + down}`;
}

/** Younger errors, of a result without room and the like, need more than their name: they come back when calculated. */
const storable: ReadonlySet<string> = new Set([
  "#NULL!",
  "#DIV/0!",
  "#VALUE!",
  "#REF!",
  "#NAME?",
  "#NUM!",
  "#N/A",
]);

function valueElement(
  { value, formula }: StoredCell,
  strings: SharedStrings,
): [string | undefined, string[]] {
  const v = (text: string) => [element("v", {}, text)];
  if (value === undefined) return [undefined, []];
  if (typeof value === "number") {
    return Number.isFinite(value) ? [undefined, v(String(value))] : ["e", v("#NUM!")];
  }
  if (typeof value === "boolean") return ["b", v(value ? "1" : "0")];
  if (isError(value)) return ["e", v(storable.has(value.error) ? value.error : "#VALUE!")];
  return formula === undefined ? ["s", v(String(strings.index(value)))] : ["str", v(escapedText(value))];
}
