import { make } from "../../taskpane/dom";

export interface Choice {
  words: string;
  primary?: boolean;
  /** What it does; without it, it only closes. */
  act?: () => void | Promise<void>;
}

/** A dialog with a title, a few sentences and buttons. */
export class FileDialog {
  readonly #dialog: HTMLDialogElement;

  constructor(dialog: HTMLDialogElement) {
    this.#dialog = dialog;
    // Keys pressed in the dialog are not meant for the grid beneath it, which listens on the whole page.
    for (const kind of ["keydown", "keypress", "keyup", "paste", "copy", "cut"]) {
      dialog.addEventListener(kind, (event) => event.stopPropagation());
    }
  }

  show(title: string, sentences: readonly string[], choices: readonly Choice[]): void {
    const buttons = choices.map(({ words, primary, act }) => {
      const button = make("button", { type: "button", class: primary ? "button primary" : "button" }, words);
      button.addEventListener("click", () => {
        if (act) void act();
        else this.close();
      });
      return button;
    });
    this.#dialog.replaceChildren(
      make("h2", { id: `${this.#dialog.id}-title` }, title),
      ...sentences.map((sentence) => make("p", {}, sentence)),
      ...(buttons.length > 0 ? [make("div", { class: "buttons" }, ...buttons)] : []),
    );
    if (!this.#dialog.open) this.#dialog.showModal();
    buttons.find((button) => button.classList.contains("primary"))?.focus();
  }

  /** Says what the page is busy with, and lets the browser draw it before the work blocks everything. */
  async busy(words: string): Promise<void> {
    this.show(words, [], []);
    await new Promise((resolve) => requestAnimationFrame(() => setTimeout(resolve)));
  }

  close(): void {
    this.#dialog.close();
  }
}
