import { make } from "../../taskpane/dom";
import type { Sample } from "./list";

export interface MenuActions {
  hasOwnWork: () => Promise<boolean>;
  open: (sample: Sample) => Promise<void>;
}

/** The samples with their sentences, to open one in place of the open sheets. Asks before own work is lost. */
export class SampleMenu {
  readonly #dialog: HTMLDialogElement;
  readonly #samples: readonly Sample[];
  readonly #actions: MenuActions;
  #current: Sample | undefined;

  constructor(dialog: HTMLDialogElement, samples: readonly Sample[], actions: MenuActions) {
    this.#dialog = dialog;
    this.#samples = samples;
    this.#actions = actions;
    // Keys pressed in the dialog are not meant for the grid beneath it, which listens on the whole page.
    for (const kind of ["keydown", "keypress", "keyup", "paste", "copy"]) {
      dialog.addEventListener(kind, (event) => event.stopPropagation());
    }
  }

  /** The one whose sheets are open. */
  set current(sample: Sample | undefined) {
    this.#current = sample;
  }

  show(): void {
    const items = this.#samples.map((sample) => make("li", {}, this.#choice(sample)));
    this.#fill(
      "Samples",
      make(
        "p",
        {},
        "Works, sensors and readings are invented. A sample opens in place of the sheets that are open.",
      ),
      make("ul", { class: "sample-list" }, ...items),
      make("div", { class: "buttons" }, this.#closing("Close")),
    );
    this.#dialog.querySelector<HTMLElement>("[aria-current], .sample-choice")?.focus();
  }

  #choice(sample: Sample): HTMLElement {
    const button = make(
      "button",
      { type: "button", class: "sample-choice", ...(sample === this.#current && { "aria-current": "true" }) },
      make("strong", {}, sample.name),
      make("span", {}, sample.sentence),
      ...(sample.invented ? [make("span", { class: "invented" }, "invented data")] : []),
    );
    button.addEventListener("click", () => void this.#choose(sample));
    return button;
  }

  async #choose(sample: Sample): Promise<void> {
    if (await this.#actions.hasOwnWork()) this.#ask(sample);
    else await this.#open(sample);
  }

  #ask(sample: Sample): void {
    const discard = make("button", { type: "button", class: "button" }, "Close them and open the sample");
    discard.addEventListener("click", () => void this.#open(sample));
    const keep = this.#closing("Keep my sheets", "button primary");
    this.#fill(
      "Close your sheets?",
      make(
        "p",
        {},
        `You have worked on the open sheets. “${sample.name}” opens in their place, and nothing of them is kept.`,
      ),
      make("div", { class: "buttons" }, discard, keep),
    );
    keep.focus();
  }

  async #open(sample: Sample): Promise<void> {
    this.#fill(`Opening ${sample.name}…`);
    try {
      await this.#actions.open(sample);
      this.#dialog.close();
    } catch (failure) {
      const reason = failure instanceof Error ? failure.message : String(failure);
      this.#fill(
        `${sample.name} was not opened`,
        make("p", {}, `Your sheets are still open: ${reason}. Build again and reload the page.`),
        make("div", { class: "buttons" }, this.#closing("Close")),
      );
    }
  }

  #fill(title: string, ...content: Node[]): void {
    this.#dialog.replaceChildren(make("h2", { id: "samples-title" }, title), ...content);
    if (!this.#dialog.open) this.#dialog.showModal();
  }

  #closing(words: string, className = "button"): HTMLElement {
    const button = make("button", { type: "button", class: className }, words);
    button.addEventListener("click", () => this.#dialog.close());
    return button;
  }
}
