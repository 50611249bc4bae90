import { button, freshId, make } from "../../taskpane/dom";
import { localTime } from "../../taskpane/live/local-time";
import type { DrawnFigure } from "../../taskpane/look/figure";
import type { Grid } from "../grid";
import { keepKeys } from "../keep-keys";
import { partsOf } from "./line-up";
import { pageFit } from "./page-fit";
import { printedPicture } from "./picture";
import { leftOutWords, type PrintedSheet } from "./printed-sheet";
import { readSheet } from "./read-sheet";
import { sheetTable, written } from "./sheet-table";

export interface Printing {
  /** Of the open file or sample. */
  source: () => string;
  version: string;
  drawn: () => readonly DrawnFigure[];
  /** Takes over what is being typed. */
  settle: () => Promise<unknown>;
}

/**
 * The sheet in front laid out for paper, first to be seen over the page, then printed. The grid is drawn on a canvas,
 * of which a browser would print the part that is in view.
 */
export class PrintView {
  readonly #place: HTMLElement;
  readonly #grid: Grid;
  readonly #printing: Printing;
  /** The rest of the page, out of reach while this is open. */
  readonly #behind: HTMLElement[];
  #before: HTMLElement | undefined;

  constructor(place: HTMLElement, grid: Grid, printing: Printing) {
    this.#place = place;
    this.#grid = grid;
    this.#printing = printing;
    this.#behind = [...document.body.children].filter(
      (each): each is HTMLElement => each instanceof HTMLElement && each !== place,
    );
    place.addEventListener("keydown", (event) => {
      if (event.key === "Escape") this.close();
    });
    keepKeys(place);
    addEventListener("keydown", (event) => this.#onKey(event), true);
    // By the browser's own menu: what is there to be printed is laid out now, without pictures, and goes afterwards.
    addEventListener("beforeprint", () => {
      if (!this.isOpen) this.#layOut();
    });
    addEventListener("afterprint", () => {
      if (this.#place.dataset.shown === undefined) this.close();
    });
  }

  get isOpen(): boolean {
    return !this.#place.hidden;
  }

  async open(): Promise<void> {
    await this.#printing.settle();
    this.#before = document.activeElement instanceof HTMLElement ? document.activeElement : undefined;
    this.#place.dataset.shown = "";
    await this.#wait();
    for (const each of this.#behind) each.inert = true;
    try {
      const paper = this.#layOut();
      this.#place.querySelector<HTMLElement>(".primary")?.focus();
      await this.#addPictures(paper);
    } catch (failure) {
      this.#refuse(failure instanceof Error ? failure.message : String(failure));
    }
  }

  close(): void {
    this.#place.hidden = true;
    this.#place.replaceChildren();
    delete this.#place.dataset.shown;
    document.body.classList.remove("has-print-view");
    for (const each of this.#behind) each.inert = false;
    this.#before?.focus();
    this.#before = undefined;
  }

  /** Ctrl+P leads here, wherever the keyboard is; with a dialog open the browser prints as it always does. */
  #onKey(event: KeyboardEvent): void {
    const isPrint =
      (event.ctrlKey || event.metaKey) && !event.shiftKey && !event.altKey && event.key.toLowerCase() === "p";
    if (!isPrint || document.querySelector("dialog[open]")) return;
    event.preventDefault();
    event.stopPropagation();
    if (!this.isOpen) void this.open();
    else if (this.#place.querySelector(".print-paper")) print();
  }

  /** A long sheet takes a moment: the browser draws that this is so before the work holds everything up. */
  async #wait(): Promise<void> {
    this.#show(make("p", { class: "print-bar", role: "status" }, "Laying out the sheet…"));
    await new Promise((resolve) => requestAnimationFrame(() => setTimeout(resolve)));
  }

  #refuse(reason: string): void {
    const close = button("Close", () => this.close());
    const words = make(
      "p",
      { class: "print-what", role: "alert" },
      `The sheet cannot be laid out: ${reason}.`,
    );
    this.#show(make("div", { class: "print-bar" }, words, close));
    close.focus();
  }

  #show(...content: HTMLElement[]): void {
    this.#place.replaceChildren(...content);
    this.#place.hidden = false;
    document.body.classList.add("has-print-view");
  }

  #layOut(): HTMLElement {
    const sheet = readSheet(this.#grid);
    const fit = pageFit(sheet.widths);
    const { lines, head, body } = partsOf(sheet);
    const source = this.#printing.source();
    const foot = `${sheet.name} · ${source} · Beadline ${this.#printing.version} · Records and analysis only`;
    const paper = make(
      "article",
      { class: "print-paper on-paper" },
      make("h2", {}, sheet.name),
      make("p", { class: "print-source" }, `${source} · printed ${localTime(new Date())}`),
      ...this.#notes(sheet),
      ...lines.map((cell) => written(make("p"), cell)),
      sheet.rows.length === 0
        ? make("p", {}, "The sheet is empty.")
        : sheetTable({ widths: sheet.widths, head, body, foot, caption: `${sheet.name}, ${source}` }, fit),
    );
    this.#place.classList.toggle("wide", fit.wide);
    this.#show(this.#bar(sheet), paper);
    return paper;
  }

  #notes(sheet: PrintedSheet): HTMLElement[] {
    const words = leftOutWords(sheet);
    return words === undefined ? [] : [make("p", { class: "print-left-out", role: "status" }, words)];
  }

  #bar({ name }: PrintedSheet): HTMLElement {
    return make(
      "div",
      { class: "print-bar" },
      make("p", { class: "print-what" }, `“${name}” as it goes onto paper`),
      make("div", { class: "print-pictures" }),
      button("Print", () => print(), "primary"),
      button("Close", () => this.close()),
    );
  }

  /** Each picture that is drawn in the pane, with a tick that leaves it out or takes it in. */
  async #addPictures(paper: HTMLElement): Promise<void> {
    for (const { figure, ofSheet } of this.#printing.drawn()) {
      const picture = await printedPicture(figure, paper);
      // Closed in the meantime, or laid out anew.
      if (!paper.isConnected) return;
      picture.hidden = !ofSheet;
      const tick = make("input", { type: "checkbox", id: freshId("printed"), checked: ofSheet });
      tick.addEventListener("change", () => {
        picture.hidden = !tick.checked;
      });
      const words = ofSheet ? "With the survey's picture" : "With the picture of the reference functions";
      this.#place
        .querySelector(".print-pictures")
        ?.append(make("div", { class: "print-tick" }, tick, make("label", { for: tick.id }, words)));
      paper.append(picture);
    }
  }
}
