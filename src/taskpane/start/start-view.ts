import type { Catalogue } from "../../catalogue/catalogue";
import { JOBS, type Job } from "../../sheets/jobs";
import { button, make } from "../dom";
import type { Pane } from "../pane";
import { addressOn, columnsOf, parseBlock, rowsOf } from "../workbook/address";
import { writeWithWayBack } from "../workbook/undo";

/** Sheets that are ready for a job, written into the workbook, and the button that takes their examples out. */
export class StartView {
  readonly element = make("div", { class: "start" });
  readonly #pane: Pane;
  readonly #opened = make("div", { class: "opened-jobs" });

  constructor(_catalogue: Catalogue, pane: Pane) {
    this.#pane = pane;
    pane.onForget(() => this.#opened.replaceChildren());
    this.element.append(
      make("h2", { tabindex: "-1" }, "Start a sheet"),
      make(
        "p",
        { class: "sentence" },
        "A sheet with headings, units and formulas, filled with example data that is marked and goes by one button.",
      ),
      this.#opened,
      make("ul", { class: "jobs" }, ...JOBS.map((job) => this.#job(job))),
    );
  }

  focus(): void {
    this.element.querySelector("button")?.focus();
  }

  #job(job: Job): HTMLElement {
    const start = button("Start this sheet", () => void this.#pane.attempt(() => this.#start(job)));
    start.setAttribute("aria-label", `Start this sheet: ${job.name}`);
    return make("li", { class: "job" }, make("h3", {}, job.name), make("p", {}, job.sentence), start);
  }

  async #start(job: Job): Promise<void> {
    const { workbook, history } = this.#pane;
    const { log: _none, ...sheet } = job.sheet;
    const name = await workbook.addSheet(sheet);
    const card = this.#card(job, name);
    this.#opened.prepend(card);
    history.add({
      sentence: `Added the sheet ${name}`,
      takeBack: async () => {
        await workbook.removeSheet(name);
        card.remove();
      },
    });
    this.#pane.say(`The sheet ${name} is open, with example data.`);
    card.querySelector("button")?.focus();
  }

  /** Stays while there are examples to remove. */
  #card(job: Job, name: string): HTMLElement {
    const card = make(
      "div",
      { class: "opened-job" },
      make("h3", {}, name),
      make("p", {}, "Holds example data, invented. Remove it before you put in your own."),
    );
    const remove = button(
      "Remove the example data",
      () =>
        void this.#pane.attempt(async () => {
          const writings = job.examples.map((range) => ({
            range: addressOn(name, range),
            inputs: emptyCells(range),
          }));
          await writeWithWayBack(
            this.#pane.workbook,
            this.#pane.history,
            `Removed the example data of ${name}`,
            writings,
          );
          card.remove();
          this.#pane.say(`The example data of ${name} is removed; the formulas stay.`);
          this.focus();
        }),
    );
    card.append(remove);
    return card;
  }
}

function emptyCells(range: string): string[][] {
  const block = parseBlock(range);
  return Array.from({ length: rowsOf(block) }, () => Array.from({ length: columnsOf(block) }, () => ""));
}
