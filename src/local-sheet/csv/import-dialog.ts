import type { Catalogue } from "../../catalogue/catalogue";
import { make } from "../../taskpane/dom";
import type { Workbook } from "../workbook";
import type { DecodedText } from "./decode";
import { findings, refusalOf } from "./findings";
import { formatControls } from "./format-controls";
import { formulaNote } from "./formula-note";
import { previewTable } from "./preview-table";
import { type Log, readLog } from "./read-log";
import { type LogFormat, sniff } from "./sniff";
import { rowsThatFit, sheetName, toSheet } from "./to-sheet";
import { counted } from "./words";

/** Shows how a log was understood before anything is written, opens it, and then offers the formula for it. */
export class ImportDialog {
  readonly #dialog: HTMLDialogElement;
  readonly #workbook: Workbook;
  readonly #catalogue: Catalogue;
  readonly #onOpened: (fileName: string) => void;

  constructor(
    dialog: HTMLDialogElement,
    workbook: Workbook,
    catalogue: Catalogue,
    onOpened: (fileName: string) => void,
  ) {
    this.#dialog = dialog;
    this.#workbook = workbook;
    this.#catalogue = catalogue;
    this.#onOpened = onOpened;
    // Keys pressed in the dialog are not meant for the grid beneath it, which listens on the whole page.
    for (const kind of ["keydown", "keypress", "keyup", "paste", "copy"]) {
      dialog.addEventListener(kind, (event) => event.stopPropagation());
    }
  }

  /** Says what the page is busy with, and lets the browser draw it before the work blocks everything. */
  async wait(words: string): Promise<void> {
    this.#fill(words);
    await new Promise((resolve) => requestAnimationFrame(() => setTimeout(resolve)));
  }

  refuse(fileName: string, reason: string): void {
    this.#fill(
      `${fileName} was not opened`,
      make("p", {}, `The file cannot be opened as a log: ${reason}`),
      buttons(this.#closing("Close", "button primary")),
    );
  }

  show(fileName: string, { text, characters }: DecodedText): void {
    const detected = sniff(text);
    const result = make("div", { class: "understood" });
    const open = make("button", { type: "button", class: "button primary" });
    let log: Log;
    const update = (format: LogFormat) => {
      log = readLog(text, format);
      const frame = { class: "preview-frame", tabindex: "0", role: "group", "aria-label": "First rows" };
      result.replaceChildren(make("div", frame, previewTable(log)), findings(log, characters));
      const fitting = rowsThatFit(log);
      open.disabled = refusalOf(log) !== undefined;
      open.textContent =
        fitting < log.rows.length ? `Open the first ${counted(fitting, "row")}` : "Open as a new sheet";
    };
    update(detected);
    open.addEventListener("click", () => void this.#import(fileName, log));
    const controls = formatControls(detected, update);
    this.#fill(`Open ${fileName}`, controls, result, buttons(this.#closing("Cancel"), open));
    open.focus();
  }

  async #import(fileName: string, log: Log): Promise<void> {
    await this.wait(`Writing ${fileName} to a sheet…`);
    const sheet = toSheet(sheetName(fileName), log);
    const name = await this.#workbook.addSheet(sheet);
    this.#onOpened(fileName);
    const rows = rowsThatFit(log);
    this.#fill(
      `${fileName} is open`,
      make(
        "p",
        {},
        `${counted(rows, "row")} of readings on the sheet “${name}”. Blank fields are empty cells.`,
      ),
      formulaNote(this.#workbook, this.#catalogue, name, log, (sheet.readings?.row ?? 0) + 1, () =>
        this.#dialog.close(),
      ),
      buttons(this.#closing("Go to the sheet")),
    );
  }

  #fill(title: string, ...content: Node[]): void {
    this.#dialog.replaceChildren(make("h2", { id: "import-title" }, title), ...content);
    if (!this.#dialog.open) this.#dialog.showModal();
  }

  #closing(words: string, className = "button"): HTMLElement {
    const button = make("button", { type: "button", class: className }, words);
    button.addEventListener("click", () => this.#dialog.close());
    return button;
  }
}

const buttons = (...all: HTMLElement[]) => make("div", { class: "buttons" }, ...all);
