import { catalogue } from "../taskpane/catalogue";
import { catalogueList } from "../taskpane/catalogue-list";
import { loadBuiltFunctions, registerFunctions } from "./functions";
import { createGrid } from "./grid";
import { GridWorkbook } from "./grid-workbook";
import { showMessages } from "./message-line";
import { openLogs } from "./open-log";
import { resultFormats } from "./result-format";
import { sampleFile, sampleWorkbook } from "./sample";
import { showFittingDigits } from "./shown-digits";
import "../styles/look.css";
import "../styles/controls.css";
import "../taskpane/catalogue-list.css";
import "./sheet.css";
import "./csv/import-dialog.css";

const element = (id: string) => document.getElementById(id)!;

async function start(): Promise<void> {
  element("functions").append(catalogueList(catalogue));
  toggleFunctions(element("toggle-functions"), element("functions"));
  const [functions, sample] = await Promise.all([loadBuiltFunctions(), sampleWorkbook(catalogue)]);
  const grid = createGrid(element("grid"), sample);
  const messages = registerFunctions(grid.univer.__getInjector(), functions, resultFormats(catalogue));
  showFittingDigits(grid.univer.__getInjector());
  grid.api.getFormula().executeCalculation();
  const workbook = new GridWorkbook(grid, messages);
  Object.defineProperty(window, "beadlineSheet", { value: Object.freeze(workbook) });
  showMessages(element("message"), workbook);
  openLogs(workbook, catalogue, element("sample-name"));
  element("sample-name").textContent = `${sampleFile.replace(/^.*\//, "")} · invented data`;
}

function toggleFunctions(button: HTMLElement, list: HTMLElement): void {
  button.addEventListener("click", () => {
    list.hidden = !list.hidden;
    button.setAttribute("aria-expanded", String(!list.hidden));
    button.textContent = list.hidden ? "Show functions" : "Hide functions";
  });
}

start().catch((failure: unknown) => {
  const reason = failure instanceof Error ? failure.message : String(failure);
  element("message").textContent =
    `The sheet could not be opened: ${reason}. Build again and reload the page.`;
});
