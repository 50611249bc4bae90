import { make } from "../dom";

/** What must be answered before a formula goes into the sheet. */
export class Questions {
  readonly element = make("div", { class: "questions", role: "alert" });

  /** The first answer has the keyboard: it is the one that does no harm. */
  ask(words: string, ...answers: HTMLElement[]): void {
    this.element.replaceChildren(
      make("p", {}, words),
      ...(answers.length > 0 ? [make("div", { class: "pane-buttons" }, ...answers)] : []),
    );
    answers[0]?.focus();
  }

  clear(): void {
    this.element.replaceChildren();
  }
}
