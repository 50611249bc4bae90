import { catalogue } from "../taskpane/catalogue";
import { mountPane } from "../taskpane/shell";
import { WorkbookFiles } from "./files";
import { showFormulaOfSpill } from "./formula-of-spill";
import { loadBuiltFunctions, registerFunctions } from "./functions";
import { createGrid, openWorkbook } from "./grid";
import { GridWorkbook } from "./grid-workbook";
import { showMessages } from "./message-line";
import { openLogs } from "./open-log";
import { GridPaneWorkbook } from "./pane-workbook";
import { resultFormats } from "./result-format";
import { type Sample, sampleList, sampleSheets } from "./samples/list";
import { SampleMenu } from "./samples/menu";
import { OwnWork } from "./samples/own-work";
import { workbookData } from "./samples/workbook-data";
import { showFittingDigits } from "./shown-digits";
import { trySheet } from "./try-sheet";
import "../styles/look.css";
import "../styles/controls.css";
import "../taskpane/pane.css";
import "./sheet.css";
import "./csv/import-dialog.css";
import "./samples/menu.css";

const element = (id: string) => document.getElementById(id)!;

async function start(): Promise<void> {
  const pane = mountPane(element("functions"), catalogue, { sheetExpected: true });
  keepKeys(element("functions"));
  toggleFunctions(element("toggle-functions"), element("functions"));
  const [functions, samples] = await Promise.all([loadBuiltFunctions(), sampleList()]);
  const first = samples[0];
  if (!first) throw new Error("there are no samples");
  const sheetsOf = async (sample: Sample) =>
    workbookData([...(await sampleSheets(sample)), trySheet(catalogue)]);
  const grid = createGrid(element("grid"), await sheetsOf(first));
  const messages = registerFunctions(grid.univer.__getInjector(), functions, resultFormats(catalogue));
  showFittingDigits(grid.univer.__getInjector());
  showFormulaOfSpill(grid.univer.__getInjector());
  grid.api.getFormula().executeCalculation();
  const workbook = new GridWorkbook(grid, messages);
  Object.defineProperty(window, "beadlineSheet", { value: Object.freeze(workbook) });
  showMessages(element("message"), workbook);
  void pane.connect(new GridPaneWorkbook(grid, workbook));
  grid.api.addEvent(grid.api.Event.WorkbookCreated, () => pane.forget());
  const work = new OwnWork(grid);
  const files = new WorkbookFiles(grid, work, element("files") as HTMLDialogElement, (name) => {
    menu.current = undefined;
    element("sample-name").textContent = name;
  });
  openLogs(workbook, catalogue, element("sample-name"), (file) => files.open(file));
  element("save").addEventListener("click", () => files.save());
  const menu = new SampleMenu(element("samples") as HTMLDialogElement, samples, {
    hasOwnWork: () => work.isThere(),
    async open(sample) {
      openWorkbook(grid, await sheetsOf(sample));
      work.forget();
      tell(sample);
    },
  });
  const tell = (sample: Sample) => {
    menu.current = sample;
    files.name = sample.name;
    element("sample-name").textContent = `${sample.name}${sample.invented ? " · invented data" : ""}`;
  };
  tell(first);
  element("open-samples").addEventListener("click", () => menu.show());
}

/** Keys pressed in the pane are not meant for the grid, which listens on the whole page. */
function keepKeys(pane: HTMLElement): void {
  for (const kind of ["keydown", "keypress", "keyup", "paste", "copy", "cut"]) {
    pane.addEventListener(kind, (event) => event.stopPropagation());
  }
}

function toggleFunctions(button: HTMLElement, list: HTMLElement): void {
  button.addEventListener("click", () => {
    list.hidden = !list.hidden;
    button.setAttribute("aria-expanded", String(!list.hidden));
    button.textContent = list.hidden ? "Show pane" : "Hide pane";
  });
}

start().catch((failure: unknown) => {
  const reason = failure instanceof Error ? failure.message : String(failure);
  element("message").textContent =
    `The sheet could not be opened: ${reason}. Build again and reload the page.`;
});
