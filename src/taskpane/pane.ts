import { button, freshId, make } from "./dom";
import { sentenceOf, Trouble } from "./workbook/trouble";
import { History } from "./workbook/undo";
import type { Workbook } from "./workbook/workbook";

/** What every view of the pane works with: the workbook once there is one, the way back, and one line to speak in. */
export class Pane {
  readonly history = new History();
  /** The line at the foot: what was done, what went wrong, and the way back. */
  readonly foot: HTMLElement;
  readonly #words = make("p", { class: "said", role: "status" });
  readonly #back: HTMLButtonElement;
  readonly #onConnect: ((workbook: Workbook) => Promise<void>)[] = [];
  readonly #onForget: (() => void)[] = [];
  readonly #expected: boolean;
  #workbook: Workbook | undefined;

  /** `expected`: whether a sheet is there or about to be, so that buttons for it make sense. */
  constructor(expected: boolean) {
    this.#expected = expected;
    this.#back = button("Undo", () => void this.attempt(() => this.#takeBack()));
    this.#back.hidden = true;
    this.foot = make("div", { class: "pane-foot" }, this.#words, this.#back);
    this.history.onChange(() => {
      const { last } = this.history;
      this.#back.hidden = last === undefined;
      this.#back.setAttribute("aria-label", last ? `Undo: ${last.sentence}` : "Undo");
      this.#back.title = last?.sentence ?? "";
    });
  }

  async connect(workbook: Workbook): Promise<void> {
    this.#workbook = workbook;
    for (const each of this.#onConnect) await this.attempt(() => each(workbook));
  }

  onConnect(listener: (workbook: Workbook) => Promise<void>): void {
    this.#onConnect.push(listener);
  }

  /** When another workbook is opened in place of the one at hand. */
  onForget(listener: () => void): void {
    this.#onForget.push(listener);
  }

  forget(): void {
    this.history.clear();
    this.say("");
    for (const each of this.#onForget) each();
  }

  get canReach(): boolean {
    return this.#expected || this.#workbook !== undefined;
  }

  get reachable(): Workbook | undefined {
    return this.#workbook;
  }

  get workbook(): Workbook {
    if (!this.#workbook)
      throw new Trouble(
        "There is no sheet beside the pane. Open it in Excel, or wait until the sheet is open.",
      );
    return this.#workbook;
  }

  /** Does it, and says in a sentence what kept it from being done. */
  async attempt(work: () => Promise<void>): Promise<void> {
    try {
      await work();
    } catch (failure) {
      this.say(this.sentence(failure), true);
    }
  }

  sentence = sentenceOf;

  say(words: string, isTrouble = false): void {
    this.#words.classList.toggle("fault", isTrouble);
    this.#words.textContent = words;
  }

  /** To the clipboard; where the host forbids it, the text is shown selected, to be copied by hand. */
  async copy(text: string): Promise<void> {
    try {
      await navigator.clipboard.writeText(text);
      this.say("Copied.");
    } catch {
      const id = freshId("copy");
      const field = make("input", { id, class: "field", type: "text", readonly: true, value: text });
      this.#words.replaceChildren(make("label", { for: id }, "Copy this with Ctrl+C: "), field);
      field.select();
    }
  }

  async #takeBack(): Promise<void> {
    const step = await this.history.takeBack();
    if (step) this.say(`Taken back: ${step.sentence[0]!.toLowerCase()}${step.sentence.slice(1)}.`);
  }
}
