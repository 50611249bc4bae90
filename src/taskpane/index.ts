import { catalogue } from "./catalogue";
import { followOfficeTheme } from "./office-theme";
import { mountPane } from "./shell";
import { openWaysIn } from "./ways-in";
import { workbookOfExcel } from "./workbook/excel";
import "../styles/look.css";
import "../styles/controls.css";
import "./pane.css";
import "./taskpane.css";

/** Works with and without Excel around it: the pane is there first, the workbook joins it where there is one. */
async function start(container: HTMLElement): Promise<void> {
  const pane = mountPane(container, catalogue);
  const workbook = await workbookOfExcel();
  if (!workbook) return;
  followOfficeTheme();
  openWaysIn(pane);
  await pane.connect(workbook);
}

const container = document.getElementById("pane");
if (container) void start(container);
