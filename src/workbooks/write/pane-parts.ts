import type { PaneReference } from "../content";
import { element, part } from "../xml";
import { relationships } from "./relationships";

// [MS-OWEXML]: the parts by which a workbook opens an add-in's pane.

const folder = "xl/webextensions";
const relation = "http://schemas.microsoft.com/office/2011/relationships";
const office = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

export const paneKinds = [
  [`${folder}/taskpanes.xml`, "application/vnd.ms-office.webextensiontaskpanes+xml"],
  [`${folder}/webextension1.xml`, "application/vnd.ms-office.webextension+xml"],
] as const;

/** From the package itself, not from the workbook in it. */
export const paneRelation = [`${folder}/taskpanes.xml`, `${relation}/webextensiontaskpanes`] as const;

/**
 * Not `visibility="1"`, which would ask everybody without the add-in to trust and install it: the pane opens by the
 * property, where the add-in is installed, and stays shut where it is not.
 */
const taskpanes = part(
  element(
    "wetp:taskpanes",
    { "xmlns:wetp": "http://schemas.microsoft.com/office/webextensions/taskpanes/2010/11" },
    element(
      "wetp:taskpane",
      { dockstate: "right", visibility: 0, width: 350, row: 4 },
      element("wetp:webextensionref", { "xmlns:r": office, "r:id": "rId1" }),
    ),
  ),
);

const webextension = ({ id, version, store, storeType }: PaneReference): string =>
  part(
    element(
      "we:webextension",
      {
        "xmlns:we": "http://schemas.microsoft.com/office/webextensions/webextension/2010/11",
        id: `{${id.toUpperCase()}}`,
      },
      element("we:reference", { id, version, store, storeType }),
      element("we:alternateReferences"),
      element(
        "we:properties",
        {},
        element("we:property", { name: "Office.AutoShowTaskpaneWithDocument", value: "true" }),
      ),
      element("we:bindings"),
      element("we:snapshot", { "xmlns:r": office }),
    ),
  );

export const paneParts = (pane: PaneReference): Record<string, string> => ({
  [`${folder}/taskpanes.xml`]: taskpanes,
  [`${folder}/_rels/taskpanes.xml.rels`]: relationships([["webextension1.xml", `${relation}/webextension`]]),
  [`${folder}/webextension1.xml`]: webextension(pane),
});
