import { strToU8, zipSync } from "fflate";
import type { StoredWorkbook } from "../content";
import { packageParts } from "./package-parts";
import { SharedStrings } from "./shared-strings";
import { sheetPart } from "./sheet-part";
import { Styles } from "./styles";

/** A moment for every part alike, so that the same content gives the same bytes. Local, as archives count it. */
const moment = new Date(2026, 0, 1);

/** A workbook file (.xlsx). The same content always gives the same bytes. */
export function writeWorkbook(workbook: StoredWorkbook): Uint8Array {
  checkNames(workbook.sheets.map(({ name }) => name));
  const [styles, strings] = [new Styles(), new SharedStrings()];
  const sheets = workbook.sheets.map((sheet, index) => [
    `xl/worksheets/sheet${index + 1}.xml`,
    sheetPart(sheet, styles, strings, index === 0),
  ]);
  const parts: Record<string, string> = {
    ...packageParts(workbook),
    ...Object.fromEntries(sheets),
    "xl/styles.xml": styles.xml(),
    "xl/sharedStrings.xml": strings.xml(),
  };
  const files = Object.entries(parts).map(([name, text]) => [name, strToU8(text)] as const);
  return zipSync(Object.fromEntries(files), { mtime: moment, level: 9 });
}

/** Excel declares a workbook damaged whose sheets have names that it would not take. */
function checkNames(names: readonly string[]): void {
  if (names.length === 0) throw new Error("a workbook needs a sheet");
  const seen = new Set<string>();
  for (const name of names) {
    if (name === "" || name.length > 31 || /[:\\/?*[\]]|^'|'$/.test(name)) {
      throw new Error(
        `“${name}” is no name for a sheet: 1 to 31 characters, none of : \\ / ? * [ ], no ' at its ends`,
      );
    }
    if (seen.has(name.toLowerCase())) throw new Error(`two sheets are named “${name}”`);
    seen.add(name.toLowerCase());
  }
}
