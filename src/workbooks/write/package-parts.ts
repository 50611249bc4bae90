import type { StoredWorkbook } from "../content";
import { element, escapedText, part } from "../xml";
import { paneKinds, paneParts, paneRelation } from "./pane-parts";
import { relationships } from "./relationships";
import { usedRange } from "./sheet-part";

const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const relation = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const packaged = "http://schemas.openxmlformats.org/package/2006";
const kind = "application/vnd.openxmlformats-officedocument.spreadsheetml";

const sheetFile = (index: number) => `worksheets/sheet${index + 1}.xml`;

/** Parts beside the sheets, with their kind and the relation by which the workbook finds them. */
const companions = [
  ["styles.xml", `${kind}.styles+xml`, "styles"],
  ["sharedStrings.xml", `${kind}.sharedStrings+xml`, "sharedStrings"],
  ["metadata.xml", `${kind}.sheetMetadata+xml`, "sheetMetadata"],
] as const;

const documentParts = [
  ["xl/workbook.xml", `${kind}.sheet.main+xml`, `${relation}/officeDocument`],
  [
    "docProps/core.xml",
    "application/vnd.openxmlformats-package.core-properties+xml",
    `${packaged}/relationships/metadata/core-properties`,
  ],
  [
    "docProps/app.xml",
    "application/vnd.openxmlformats-officedocument.extended-properties+xml",
    `${relation}/extended-properties`,
  ],
] as const;

function contentTypes({ sheets, opensPane }: StoredWorkbook): string {
  const parts = [
    ...documentParts.map(([name, type]) => [name, type] as const),
    ...sheets.map((_, i) => [`xl/${sheetFile(i)}`, `${kind}.worksheet+xml`] as const),
    ...companions.map(([name, type]) => [`xl/${name}`, type] as const),
    ...(opensPane ? paneKinds : []),
  ];
  return part(
    element(
      "Types",
      { xmlns: `${packaged}/content-types` },
      element("Default", {
        Extension: "rels",
        ContentType: "application/vnd.openxmlformats-package.relationships+xml",
      }),
      element("Default", { Extension: "xml", ContentType: "application/xml" }),
      ...parts.map(([name, ContentType]) => element("Override", { PartName: `/${name}`, ContentType })),
    ),
  );
}

const quoted = (sheet: string) => `'${sheet.replaceAll("'", "''")}'`;
const absolute = (range: string) => range.replace(/([A-Z]+)(\d+)/g, "$$$1$$$2");

function workbookPart({ sheets }: StoredWorkbook): string {
  const names = sheets.flatMap((sheet, localSheetId) => {
    const area = `${quoted(sheet.name)}!${absolute(usedRange(sheet))}`;
    const titles = `${quoted(sheet.name)}!$1:$${sheet.frozenRows}`;
    const defined = (name: string, range: string) =>
      element("definedName", { name: `_xlnm.${name}`, localSheetId }, escapedText(range));
    return [defined("Print_Area", area), ...(sheet.frozenRows > 0 ? [defined("Print_Titles", titles)] : [])];
  });
  return part(
    element(
      "workbook",
      { xmlns: main, "xmlns:r": relation },
      element(
        "bookViews",
        {},
        element("workbookView", { xWindow: 0, yWindow: 0, windowWidth: 24_000, windowHeight: 14_000 }),
      ),
      element(
        "sheets",
        {},
        ...sheets.map(({ name }, i) => element("sheet", { name, sheetId: i + 1, "r:id": `rId${i + 1}` })),
      ),
      element("definedNames", {}, ...names),
      // Not calculated anew when it is opened: without the add-in each value would become #NAME?.
      element("calcPr", { calcId: 191_029 }),
    ),
  );
}

/** What `cm="1"` of a cell refers to: its formula is a dynamic array. */
const metadata = part(
  element(
    "metadata",
    { xmlns: main, "xmlns:xda": "http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray" },
    element(
      "metadataTypes",
      { count: 1 },
      element("metadataType", {
        name: "XLDAPR",
        minSupportedVersion: 120_000,
        copy: 1,
        pasteAll: 1,
        pasteValues: 1,
        merge: 1,
        splitFirst: 1,
        rowColShift: 1,
        clearFormats: 1,
        clearComments: 1,
        assign: 1,
        coerce: 1,
        cellMeta: 1,
      }),
    ),
    element(
      "futureMetadata",
      { name: "XLDAPR", count: 1 },
      element(
        "bk",
        {},
        element(
          "extLst",
          {},
          element(
            "ext",
            { uri: "{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}" },
            element("xda:dynamicArrayProperties", { fDynamic: 1, fCollapsed: 0 }),
          ),
        ),
      ),
    ),
    element("cellMetadata", { count: 1 }, element("bk", {}, element("rc", { t: 1, v: 0 }))),
  ),
);

function coreProperties({ title, description }: StoredWorkbook): string {
  return part(
    element(
      "cp:coreProperties",
      {
        "xmlns:cp": `${packaged}/metadata/core-properties`,
        "xmlns:dc": "http://purl.org/dc/elements/1.1/",
      },
      element("dc:title", {}, escapedText(title)),
      element("dc:creator", {}, "Beadline"),
      ...(description ? [element("dc:description", {}, escapedText(description))] : []),
    ),
  );
}

const application = part(
  element(
    "Properties",
    { xmlns: "http://schemas.openxmlformats.org/officeDocument/2006/extended-properties" },
    element("Application", {}, "Beadline"),
  ),
);

/** Every part of the package but the sheets, the styles and the texts. */
export function packageParts(workbook: StoredWorkbook): Record<string, string> {
  const sheetRelations = workbook.sheets.map((_, i) => [sheetFile(i), `${relation}/worksheet`] as const);
  return {
    "[Content_Types].xml": contentTypes(workbook),
    "_rels/.rels": relationships([
      ...documentParts.map(([name, , type]) => [name, type] as const),
      ...(workbook.opensPane ? [paneRelation] : []),
    ]),
    "docProps/app.xml": application,
    "docProps/core.xml": coreProperties(workbook),
    "xl/workbook.xml": workbookPart(workbook),
    "xl/_rels/workbook.xml.rels": relationships([
      ...sheetRelations,
      ...companions.map(([name, , type]) => [name, `${relation}/${type}`] as const),
    ]),
    "xl/metadata.xml": metadata,
    ...(workbook.opensPane ? paneParts(workbook.opensPane) : {}),
  };
}
