import { cellName, type PlannedCell, SheetDraft, type SheetPlan, type WorkbookPlan } from "../../sheets";
import { shifted } from "../shifted-formula";

export const aboutName = "About this workbook";

/** The first sheet of a workbook file: what it is, that it is invented, and where to look. */
export function aboutSheet({ name, sentence, invented, sheets }: WorkbookPlan): SheetPlan {
  const sheet = new SheetDraft(
    aboutName,
    [
      { width: 168, format: "text" },
      { width: 96, format: "text" },
      { width: 720, format: "text" },
    ],
    0,
  )
    .title(name)
    .notes(
      "A2",
      sentence,
      ...(invented
        ? ["INVENTED: works, sensors and readings are made up. Nothing of it was ever measured."]
        : []),
      "For records and analysis only: never an interlock or a release decision by itself.",
    )
    .heading("A6", "What it needs")
    .notes(
      "A7",
      "The functions BEAD. of the Beadline add-in. The values were stored with the file: without the add-in they can be read, and",
      "turn into #NAME? when Excel calculates anew. Copy and paste values before you pass a copy on to somebody without it.",
    )
    .heading("A10", "What to look at")
    .headers("A11", [
      ["sheet", "text"],
      ["fills", "text"],
      ["formula", "text"],
    ]);
  let row = 11;
  for (const { name: on, cells } of sheets) {
    for (const { where, formula } of formulasOf(cells)) {
      sheet.labels(cellName(row, 0), on).labels(cellName(row, 1), where).examples(cellName(row, 2), formula);
      row++;
    }
  }
  return sheet.plan();
}

/** Each formula with the cells that it fills; one that was filled to the right stands once. */
function formulasOf(cells: readonly PlannedCell[]): { where: string; formula: string }[] {
  const found: { first: PlannedCell; last: PlannedCell }[] = [];
  for (const cell of cells) {
    if (cell.formula === undefined) continue;
    const before = found.at(-1);
    if (before && isFilledRight(before.last, cell)) before.last = cell;
    else found.push({ first: cell, last: cell });
  }
  return found.map(({ first, last }) => {
    const { row, column, spill: [down, across] = [1, 1] } = first;
    const corner = cellName(row, column);
    const filled = down * across > 1 ? `:${cellName(row + down - 1, column + across - 1)}` : "";
    const where = first === last ? corner + filled : `${corner} to ${cellName(last.row, last.column)}`;
    return { where, formula: first.formula! };
  });
}

const isFilledRight = (left: PlannedCell, { row, column, formula }: PlannedCell): boolean =>
  left.row === row && left.column + 1 === column && shifted(left.formula!, 0, 1) === formula;
