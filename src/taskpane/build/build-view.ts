import type { Catalogue, CatalogueFunction } from "../../catalogue/catalogue";
import { button, freshId, make } from "../dom";
import { rememberUse } from "../find/recent";
import { isManyCells } from "../formula/arguments";
import { localForm } from "../formula/local-form";
import { isCellwise, rangeOf } from "../formula/shape";
import type { Pane } from "../pane";
import { shownResult } from "../understand/live-example";
import { addressOn, parseAddress, parseBlock } from "../workbook/address";
import type { FormulaCell, Traits } from "../workbook/workbook";
import { type Draft, emptyDraft, formulaOf, givenOf } from "./draft";
import { ExplainCard } from "./explain";
import { Field } from "./field";
import { functionChoice, oldExcelNote } from "./function-choice";
import { type Form, insert } from "./insert";
import { pickSelection } from "./pick";
import { cellsInUse, freePlace, PAST_THE_END, placeOf, type ResultPlace } from "./place";
import { type Preview, preview } from "./preview";
import { seenFromElsewhere, suggestTarget, type Target } from "./target";

const DELAY = 200;

/** Builds a formula field by field, shows what it gives, and puts it into the sheet. */
export class BuildView {
  readonly element = make("div", { class: "build" });
  readonly #catalogue: Catalogue;
  readonly #pane: Pane;
  readonly #choice: HTMLSelectElement;
  readonly #form = make("div", { class: "build-form" });
  readonly #explain: ExplainCard;
  readonly #previewBox = make("section", {
    class: "outcome",
    "aria-label": "Preview",
    "aria-live": "polite",
  });
  readonly #placeBox = make("div", { class: "place" });
  readonly #questions = make("div", { class: "questions", role: "alert" });
  readonly #blanks = make("input", { type: "checkbox", id: freshId("blanks") });
  readonly #blankRow: HTMLElement;
  readonly #perRow = make("input", { type: "checkbox", id: freshId("per-row") });
  readonly #perRowRow: HTMLElement;
  readonly #targetInput: HTMLInputElement;
  readonly #insertButton: HTMLButtonElement;
  #fields: Field[] = [];
  #around: Pick<Draft, "before" | "after"> = { before: "=", after: "" };
  #found: CatalogueFunction | undefined;
  /** The cell whose formula is being changed. */
  #own: FormulaCell | undefined;
  /** The sheet whose cells the fields name without a sheet. */
  #home: string | undefined;
  #shown: Preview | undefined;
  #target: Target | undefined;
  #traits: Traits = { decimal: ".", list: ",", spills: true, name: "the sheet" };
  #timer: ReturnType<typeof setTimeout> | undefined;
  #turn = 0;

  constructor(catalogue: Catalogue, pane: Pane) {
    this.#catalogue = catalogue;
    this.#pane = pane;
    const choiceId = freshId("function");
    this.#choice = functionChoice(catalogue, choiceId);
    this.#choice.addEventListener("change", () => this.start(this.#named(this.#choice.value)));
    this.#explain = new ExplainCard(catalogue, pane, (draft, cell) => this.edit(draft, cell));
    this.#blanks.addEventListener("change", () => this.#changed());
    this.#perRow.addEventListener("change", () => this.#changed());
    this.#blankRow = make(
      "div",
      { class: "tick" },
      this.#blanks,
      make(
        "label",
        { for: this.#blanks.id },
        "Keep empty cells empty",
        make(
          "span",
          { class: "hint" },
          "Excel hands an empty cell of a range to a function as 0, a reading like any other. IF(ISBLANK(…)) keeps it blank.",
        ),
      ),
    );
    this.#perRowRow = make(
      "div",
      { class: "tick" },
      this.#perRow,
      make(
        "label",
        { for: this.#perRow.id },
        "One formula in each row",
        make(
          "span",
          { class: "hint" },
          "For tables, merged cells and Excel before 2021, where one formula cannot fill a column.",
        ),
      ),
    );
    const targetId = freshId("target");
    this.#targetInput = make("input", {
      id: targetId,
      class: "field",
      type: "text",
      autocomplete: "off",
      spellcheck: "false",
      name: "target",
    });
    this.#targetInput.addEventListener("input", () => this.#changed());
    const pickTarget = button("Use selection", () => void this.#pane.attempt(() => this.#pickTarget()));
    pickTarget.setAttribute("aria-label", "Use selection for the place");
    this.#insertButton = button(
      "Insert formula",
      () => void this.#pane.attempt(() => this.#insert()),
      "primary",
    );
    this.#placeBox.append(
      make("label", { for: targetId }, "Goes into"),
      make("div", { class: "control-row" }, this.#targetInput, pickTarget),
      make("p", { class: "place-words", role: "status" }),
    );
    this.element.append(
      make("h2", { tabindex: "-1" }, "Build a formula"),
      this.#explain.element,
      make("label", { for: choiceId, class: "label" }, "Function"),
      this.#choice,
      this.#form,
    );
    pane.onForget(() => this.start(undefined));
    pane.onConnect(async (workbook) => {
      this.#traits = await workbook.getTraits();
      // Drawn before there was a sheet, the form has no buttons for it yet.
      if (this.#found) this.#fill(this.#draft(this.#found));
      workbook.onChange(() => this.#onSheetChange());
    });
    this.start(undefined);
  }

  /** Opens empty on a function. */
  start(found: CatalogueFunction | undefined): void {
    this.#own = undefined;
    this.#home = undefined;
    this.#fill(found && emptyDraft(found));
  }

  /** Opens on the formula that a cell has. */
  edit(draft: Draft, cell: FormulaCell): void {
    this.#own = cell;
    this.#home = parseAddress(cell.anchor).sheet;
    this.#fill(draft);
    this.#fields[0]?.focus();
  }

  /** When the view comes into sight. */
  async opened(): Promise<void> {
    await this.#explain.update();
    this.#changed();
  }

  focus(): void {
    if (this.#fields[0]) this.#fields[0].focus();
    else this.#choice.focus();
  }

  #named = (id: string) => this.#catalogue.functions.find((each) => each.id === id);

  #fill(draft: Draft | undefined): void {
    this.#found = draft?.found;
    this.#choice.value = draft?.found.id ?? "";
    this.#questions.replaceChildren();
    this.#shown = undefined;
    this.#target = undefined;
    this.#targetInput.value = "";
    if (!draft) {
      this.#fields = [];
      this.#form.replaceChildren(
        make("p", { class: "hint" }, "Choose a function, or select a cell that holds one of its formulas."),
      );
      return;
    }
    const { found, fields, keepBlanks, before, after } = draft;
    this.#around = { before, after };
    this.#blanks.checked = keepBlanks;
    this.#perRow.checked = !this.#traits.spills && isCellwise(found);
    const pick = this.#pane.canReach
      ? (field: Field) => void this.#pane.attempt(() => this.#pick(field))
      : undefined;
    this.#fields = found.parameters.map((parameter) => new Field(parameter, () => this.#changed(), pick));
    fields.forEach((text, index) => {
      if (text !== "") this.#fields[index]!.text = text;
    });
    this.#form.replaceChildren(
      ...(this.#own ? [] : [make("p", { class: "sentence" }, found.description)]),
      ...this.#parts(found, fields),
    );
    this.#changed();
  }

  #parts(found: CatalogueFunction, filled: readonly string[]): HTMLElement[] {
    const needed = this.#fields.filter(({ parameter }) => !parameter.optional);
    const rest = this.#fields.filter(({ parameter }) => parameter.optional);
    const more = make(
      "details",
      { class: "more", open: filled.some((text, index) => text !== "" && found.parameters[index]!.optional) },
      make("summary", {}, `Further arguments (${rest.length})`),
      ...rest.map(({ element }) => element),
    );
    const copy = button("Copy formula", () => void this.#pane.attempt(() => this.#copy()));
    return [
      ...needed.map(({ element }) => element),
      ...(rest.length > 0 ? [more] : []),
      this.#blankRow,
      ...(isCellwise(found) && this.#pane.canReach ? [this.#perRowRow] : []),
      this.#previewBox,
      ...(this.#pane.canReach ? [this.#placeBox] : []),
      this.#questions,
      make("div", { class: "pane-buttons" }, ...(this.#pane.canReach ? [this.#insertButton] : []), copy),
      ...(this.#traits.spills ? [] : [oldExcelNote()]),
    ];
  }

  #draft(found: CatalogueFunction): Draft {
    return {
      found,
      fields: this.#fields.map(({ text }) => text),
      keepBlanks: this.#blanks.checked,
      ...this.#around,
    };
  }

  async #pick(field: Field): Promise<void> {
    const workbook = this.#pane.workbook;
    this.#home ??= parseAddress(await workbook.getSelection()).sheet;
    const { address, downToEnd } = await pickSelection(workbook, field.parameter, this.#home);
    field.text = address;
    field.offer(downToEnd && `Down to row ${parseBlock(parseAddress(downToEnd).range).lastRow + 1}`, () => {
      field.text = downToEnd ?? address;
      this.#changed();
    });
    this.#changed();
  }

  async #pickTarget(): Promise<void> {
    const { sheet, range } = parseAddress(await this.#pane.workbook.getSelection());
    this.#targetInput.value = addressOn(sheet ?? "", range.split(":")[0] ?? "");
    this.#changed();
  }

  #onSheetChange(): void {
    if (this.element.hidden) return;
    void this.#explain.update();
    this.#changed();
  }

  /** Shows anew what the fields give, a moment after the last change. */
  #changed(): void {
    this.#questions.replaceChildren();
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => void this.#refresh(), DELAY);
  }

  async #refresh(): Promise<void> {
    const found = this.#found;
    if (!found || this.element.hidden) return;
    const turn = ++this.#turn;
    const given = givenOf(this.#draft(found));
    this.#blankRow.hidden = !given.some((each) => {
      const range = rangeOf(each);
      return range !== undefined && isManyCells(range);
    });
    const lacking = this.#lacking();
    const formula = formulaOf(this.#draft(found), this.#catalogue.namespace, given);
    const code = make("code", { class: "formula" }, formula);
    const local = localForm(formula, this.#traits);
    const localRow =
      local === formula
        ? []
        : [make("p", { class: "hint" }, "Typed by hand in this workbook: ", make("code", {}, local))];
    if (lacking) {
      this.#shown = undefined;
      this.#previewBox.replaceChildren(code, ...localRow, make("p", { class: "hint" }, lacking));
      this.#place("");
      return;
    }
    try {
      const shown = await preview(
        found,
        seenFromElsewhere(given, this.#home),
        this.#catalogue.namespace,
        this.#pane.reachable,
      );
      if (turn !== this.#turn) return;
      this.#shown = "onlyTheSheet" in shown ? undefined : shown;
      const result =
        "onlyTheSheet" in shown
          ? make("p", { class: "hint" }, "What this gives can only be seen in the sheet.")
          : make(
              "div",
              { class: "live-result" },
              make("span", { class: "gives" }, "gives "),
              shownResult(found, given, shown.cells, shown.shape.rows),
            );
      this.#previewBox.replaceChildren(code, ...localRow, result);
      if (this.#pane.canReach) await this.#showPlace(given, turn);
    } catch (failure) {
      if (turn !== this.#turn) return;
      this.#previewBox.replaceChildren(code, make("p", { class: "fault" }, this.#pane.sentence(failure)));
    }
  }

  #lacking(): string | undefined {
    const missing = this.#fields.filter((field) => field.fault !== undefined);
    if (missing.length === 0) return undefined;
    const names = missing.map(({ parameter }) => parameter.name);
    const wrong = missing.find((field) => field.text.trim() !== "");
    return wrong ? `${wrong.parameter.name}: ${wrong.fault}` : `Still to fill in: ${names.join(", ")}.`;
  }

  async #findTarget(given: readonly string[]): Promise<Target> {
    const typed = this.#targetInput.value.trim();
    if (typed !== "") {
      const { sheet, range } = parseAddress(typed);
      const home = sheet ?? parseAddress(await this.#pane.workbook.getSelection()).sheet ?? "";
      return { sheet: home, cell: range.replaceAll("$", "").toUpperCase(), why: "as chosen" };
    }
    if (this.#own) {
      // Read again each time: results may have spilled since.
      this.#own = (await this.#pane.workbook.getFormula(this.#own.anchor)) ?? this.#own;
      const { sheet = "", range } = parseAddress(this.#own.anchor);
      return { sheet, cell: range, why: "its own cell" };
    }
    return suggestTarget(this.#pane.workbook, given, this.#home);
  }

  async #showPlace(given: readonly string[], turn: number): Promise<void> {
    const target = await this.#findTarget(given);
    if (turn !== this.#turn) return;
    this.#target = target;
    this.#targetInput.placeholder = `${target.cell}, ${target.why}`;
    const place = await this.#placeAt(target);
    if (turn !== this.#turn) return;
    if (!place) return this.#place(PAST_THE_END, true);
    const { area, shape, occupiedCount, hindrance } = place;
    const size = area.includes(":")
      ? `Fills ${area}, ${shape.rows} × ${shape.columns} cells`
      : `Fills ${area}`;
    if (hindrance) this.#place(`${size}. ${hindrance}`, true);
    else if (occupiedCount > 0) this.#place(`${size}. Not free: ${cellsInUse(occupiedCount)} there.`, true);
    else this.#place(`${size}; the space is free.`);
  }

  #placeAt(target: Target): Promise<ResultPlace | undefined> {
    const own = this.#own && target.why === "its own cell" ? parseAddress(this.#own.range).range : undefined;
    // One cell while there is no preview.
    const shape = this.#shown?.shape ?? { rows: 1, columns: 1 };
    return placeOf(this.#pane.workbook, target, shape, own, this.#formWanted());
  }

  #formWanted(): Form {
    return this.#perRow.checked && this.#found && isCellwise(this.#found) ? "per row" : "spill";
  }

  #place(words: string, warns = false): void {
    const line = this.#placeBox.querySelector(".place-words")!;
    line.classList.toggle("warn", warns);
    if (line.textContent !== words) line.textContent = words;
  }

  async #insert(consent = false): Promise<void> {
    const found = this.#found;
    const workbook = this.#pane.workbook;
    if (!found) return;
    const wrong = this.#fields.find((field) => field.fault !== undefined);
    if (wrong) {
      wrong.focus();
      return this.#ask(`${wrong.parameter.name}: ${wrong.fault}`);
    }
    clearTimeout(this.#timer);
    await this.#refresh();
    const given = givenOf(this.#draft(found));
    const target = this.#target ?? (await this.#findTarget(given));
    const place = await this.#placeAt(target);
    if (!place) return this.#ask(PAST_THE_END);
    const { area, shape, occupiedCount, occupied, hindrance } = place;
    if (hindrance) {
      const byRow = isCellwise(found) && this.#formWanted() === "spill" && !hindrance.includes("protected");
      return this.#ask(hindrance, ...(byRow ? [this.#byRowButton()] : []), this.#elsewhereButton(target));
    }
    if (occupiedCount > 0 && !consent) {
      const some = occupied.slice(0, 3).join(", ");
      return this.#ask(
        `${area} is not free: ${cellsInUse(occupiedCount)} (${some}${occupiedCount > 3 ? ", …" : ""}).`,
        // The one that does no harm comes first, and has the keyboard.
        this.#elsewhereButton(target),
        button("Overwrite them", () => void this.#pane.attempt(() => this.#insert(true))),
      );
    }
    await insert(workbook, this.#pane.history, {
      draft: this.#draft(found),
      given: target.sheet === this.#home ? given : seenFromElsewhere(given, this.#home),
      namespace: this.#catalogue.namespace,
      target,
      area,
      shape,
      form: this.#formWanted(),
      cells: this.#shown?.cells ?? [],
      clears: occupiedCount > 0,
    });
    rememberUse(found.id);
    this.#questions.replaceChildren();
    this.#targetInput.value = "";
    this.#own = await workbook.getFormula(addressOn(target.sheet, target.cell));
    this.#pane.say(`Inserted in ${target.cell}${area.includes(":") ? `; it fills ${area}` : ""}.`);
  }

  #byRowButton(): HTMLElement {
    return button("Write one formula in each row", () => {
      this.#perRow.checked = true;
      void this.#pane.attempt(() => this.#insert());
    });
  }

  #elsewhereButton(target: Target): HTMLElement {
    return button(
      "Put it beside the data",
      () =>
        void this.#pane.attempt(async () => {
          const free = await freePlace(this.#pane.workbook, target);
          this.#own = undefined;
          this.#targetInput.value = addressOn(target.sheet, free);
          await this.#insert();
        }),
    );
  }

  #ask(words: string, ...buttons: HTMLElement[]): void {
    this.#questions.replaceChildren(
      make("p", {}, words),
      ...(buttons.length > 0 ? [make("div", { class: "pane-buttons" }, ...buttons)] : []),
    );
    buttons[0]?.focus();
  }

  async #copy(): Promise<void> {
    if (!this.#found) return;
    const draft = this.#draft(this.#found);
    const formula = localForm(formulaOf(draft, this.#catalogue.namespace, givenOf(draft)), this.#traits);
    await this.#pane.copy(formula);
    rememberUse(this.#found.id);
  }
}
