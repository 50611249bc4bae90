import type { StoredSheet } from "../content";
import { Archive, targetFrom } from "./archive";
import { readLooks } from "./looks";
import { readSheet } from "./sheet";
import { attribute, children, down, isOn, type ParseXml, textOf, type XmlNode } from "./xml-node";

export interface ReadWorkbook {
  sheets: StoredSheet[];
  /** What the file holds and the sheets do not, in words. */
  leftOut: string[];
}

/** A workbook's sheets; throws with a reason, to be read after "The file cannot be opened: ". */
export function readWorkbook(bytes: Uint8Array, parse: ParseXml): ReadWorkbook {
  refuseOthers(bytes);
  const archive = new Archive(bytes, parse);
  const main = mainPart(archive);
  const workbook = archive.root(main);
  if (!workbook) throw new Error("it is no workbook of the kind .xlsx");
  if (isOn(attribute(down(workbook, "workbookPr"), "date1904"))) {
    throw new Error("it counts its days from 1904. Save it with the usual dates (from 1900) first");
  }
  const relations = relationsOf(archive, main);
  const part = (kind: string) => {
    const target = relations.find(({ type }) => type.endsWith(`/${kind}`))?.target;
    return target === undefined ? undefined : archive.root(target);
  };
  const surroundings = {
    looks: readLooks(part("styles")),
    texts: [...children(part("sharedStrings"), "si")].map(textOf),
  };
  const leftOut = new Set<string>();
  if (relations.some(({ type }) => type.endsWith("/vbaProject"))) leftOut.add("macros");
  const sheets: StoredSheet[] = [];
  for (const sheet of children(down(workbook, "sheets"), "sheet")) {
    const id = attribute(sheet, "r:id") ?? attribute(sheet, "id");
    const relation = relations.find((each) => each.id === id);
    if (!relation?.type.endsWith("/worksheet")) {
      leftOut.add(
        relation?.type.endsWith("/chartsheet") ? "sheets that are charts" : "sheets of an unknown kind",
      );
      continue;
    }
    const root = archive.root(relation.target);
    for (const [element, words] of unread) if (down(root, element)) leftOut.add(words);
    const name = attribute(sheet, "name") ?? `Sheet ${sheets.length + 1}`;
    const { left, ...read } = readSheet(name, root, surroundings);
    for (const words of left) leftOut.add(words);
    sheets.push(read);
  }
  if (sheets.length === 0) throw new Error("it holds no worksheet");
  if (hasOwnNames(workbook)) leftOut.add("names of ranges");
  return { sheets, leftOut: [...leftOut] };
}

const unread = [
  ["mergeCells", "merged cells"],
  ["drawing", "charts and pictures"],
  ["conditionalFormatting", "conditional formats"],
  ["dataValidations", "rules for input"],
  ["tableParts", "tables (their cells are there)"],
  ["legacyDrawing", "comments"],
  ["hyperlinks", "links"],
] as const;

/** Names other than the file's own for print areas and filters. */
const hasOwnNames = (workbook: XmlNode): boolean =>
  [...children(down(workbook, "definedNames"), "definedName")].some(
    (name) => !attribute(name, "name")?.startsWith("_xl"),
  );

function refuseOthers(bytes: Uint8Array): void {
  if (bytes[0] === 0xd0 && bytes[1] === 0xcf) {
    throw new Error(
      "it is an old workbook (.xls), or one with a password. Save it as .xlsx without one first",
    );
  }
  if (bytes[0] !== 0x50 || bytes[1] !== 0x4b) throw new Error("it is no workbook of the kind .xlsx");
}

interface Relation {
  id: string;
  type: string;
  target: string;
}

function mainPart(archive: Archive): string {
  const found = relationsOf(archive, "").find(({ type }) => type.endsWith("/officeDocument"));
  return found?.target ?? "xl/workbook.xml";
}

function relationsOf(archive: Archive, part: string): Relation[] {
  const at = part.lastIndexOf("/") + 1;
  const root = archive.root(`${part.slice(0, at)}_rels/${part.slice(at)}.rels`);
  return [...children(root, "Relationship")].map((each) => ({
    id: attribute(each, "Id") ?? "",
    type: attribute(each, "Type") ?? "",
    target: targetFrom(part, attribute(each, "Target") ?? ""),
  }));
}
