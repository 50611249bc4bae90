import { type Grid, openWorkbook } from "../grid";
import type { OwnWork } from "../samples/own-work";
import { FileDialog } from "./dialog";
import { openWorkbookFile } from "./open-workbook";
import { offerSaving } from "./save";

export { looksLikeWorkbook } from "./open-workbook";

/** Workbook files of the local sheet: opening, saving, and asking before the page with unsaved work is left. */
export class WorkbookFiles {
  readonly #grid: Grid;
  readonly #work: OwnWork;
  readonly #dialog: FileDialog;
  readonly #onOpened: (name: string) => void;
  #name = "Beadline";

  constructor(grid: Grid, work: OwnWork, dialog: HTMLDialogElement, onOpened: (name: string) => void) {
    this.#grid = grid;
    this.#work = work;
    this.#dialog = new FileDialog(dialog);
    this.#onOpened = onOpened;
    window.addEventListener("beforeunload", (event) => {
      // The browser asks in its own words.
      if (this.#work.found) event.preventDefault();
    });
  }

  /** What the open sheets are called. */
  set name(name: string) {
    this.#name = name;
  }

  open(file: File): Promise<void> {
    return openWorkbookFile(file, this.#dialog, {
      hasOwnWork: () => this.#work.isThere(),
      open: (data, name) => {
        openWorkbook(this.#grid, data);
        this.#work.forget();
        this.#name = name;
        this.#onOpened(name);
      },
    });
  }

  save(): void {
    offerSaving(this.#grid, this.#dialog, {
      name: () => this.#name,
      settle: () => this.#work.isThere(),
      saved: () => this.#work.forget(),
    });
  }
}
