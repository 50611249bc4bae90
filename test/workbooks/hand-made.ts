/** Workbook files made by hand, part by part, as a hostile or another program might write them. */
import { DOMParser } from "@xmldom/xmldom";
import { strToU8, zipSync } from "fflate";
import { type ParseXml, readWorkbook } from "../../src/workbooks";

export const parse: ParseXml = (text) =>
  new DOMParser({
    onError: (_, message) => {
      throw new Error(message);
    },
  }).parseFromString(text, "text/xml").documentElement as never;

export const read = (bytes: Uint8Array) => readWorkbook(bytes, parse);

export const zipped = (parts: Readonly<Record<string, string>>): Uint8Array =>
  zipSync(Object.fromEntries(Object.entries(parts).map(([name, text]) => [name, strToU8(text)])));

export const attributeText = (text: string): string =>
  text.replaceAll("&", "&amp;").replaceAll("<", "&lt;").replaceAll(">", "&gt;").replaceAll('"', "&quot;");

export interface Given {
  /** The elements of `sheetData`. */
  rows?: string;
  /** What follows it in the sheet. */
  more?: string;
  sheetName?: string;
  /** What follows the list of sheets. */
  workbook?: string;
  relations?: string;
  styles?: string;
  /** Further parts, or others in place of those above. */
  parts?: Readonly<Record<string, string>>;
}

/** The parts of a workbook of one sheet. */
export const partsOf = ({
  rows = "",
  more = "",
  sheetName = "S",
  workbook = "",
  relations = "",
  styles = "",
  parts = {},
}: Given): Record<string, string> => ({
  "xl/workbook.xml": `<workbook xmlns:r="r"><sheets><sheet name="${attributeText(sheetName)}" sheetId="1" r:id="a"/></sheets>${workbook}</workbook>`,
  "xl/_rels/workbook.xml.rels": `<Relationships><Relationship Id="a" Type="t/worksheet" Target="s.xml"/><Relationship Id="b" Type="t/styles" Target="styles.xml"/>${relations}</Relationships>`,
  "xl/styles.xml": `<styleSheet>${styles}</styleSheet>`,
  "xl/s.xml": `<worksheet><sheetData>${rows}</sheetData>${more}</worksheet>`,
  ...parts,
});

export const handMade = (given: Given): Uint8Array => zipped(partsOf(given));

/** A row of cells with formulas and the values that they had. */
export const formulas = (list: readonly string[], value = "7"): string =>
  `<row>${list.map((formula) => `<c><f>${attributeText(formula)}</f><v>${value}</v></c>`).join("")}</row>`;
