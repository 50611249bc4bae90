import type { Catalogue, CatalogueFunction } from "../../catalogue/catalogue";
import { button, freshId, make } from "../dom";
import { rememberUse } from "../find/recent";
import { localForm } from "../formula/local-form";
import { isCellwise } from "../formula/shape";
import type { Pane } from "../pane";
import { addressOn, parseAddress, parseBlock } from "../workbook/address";
import type { FormulaCell, Traits } from "../workbook/workbook";
import { ArgumentForm } from "./argument-form";
import { type Draft, emptyDraft, formulaOf, givenOf } from "./draft";
import { ExplainCard } from "./explain";
import type { Field } from "./field";
import { functionChoice, oldExcelNote } from "./function-choice";
import { insert } from "./insert";
import { fault, gives, hint, Outcome } from "./outcome";
import { pickSelection } from "./pick";
import { cellsInUse, freePlace, PAST_THE_END, placeOf, type ResultPlace } from "./place";
import { PlaceBox } from "./place-box";
import { type Preview, preview } from "./preview";
import { Questions } from "./questions";
import { seenFromElsewhere, suggestTarget, type Target } from "./target";

const DELAY = 200;

/** Builds a formula field by field, shows what it gives, and puts it into the sheet. */
export class BuildView {
  readonly element = make("div", { class: "build" });
  readonly #catalogue: Catalogue;
  readonly #pane: Pane;
  readonly #choice: HTMLSelectElement;
  readonly #explain: ExplainCard;
  readonly #body = make("div", { class: "build-form" });
  readonly #form = new ArgumentForm(() => this.#changed());
  readonly #outcome = new Outcome();
  readonly #placeBox = new PlaceBox(
    () => this.#changed(),
    () => void this.#pane.attempt(() => this.#pickTarget()),
  );
  readonly #questions = new Questions();
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
    this.element.append(
      make("h2", { tabindex: "-1" }, "Build a formula"),
      this.#explain.element,
      make("label", { for: choiceId, class: "label" }, "Function"),
      this.#choice,
      this.#body,
    );
    pane.onForget(() => this.start(undefined));
    pane.onConnect(async (workbook) => {
      this.#traits = await workbook.getTraits();
      // Drawn before there was a sheet, the form has no buttons for it yet.
      if (this.#form.draft) this.#fill(this.#form.draft);
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
    this.#form.focus();
  }

  /** When the view comes into sight. */
  async opened(): Promise<void> {
    await this.#explain.update();
    this.#changed();
  }

  focus(): void {
    if (!this.#form.focus()) this.#choice.focus();
  }

  #named = (id: string) => this.#catalogue.functions.find((each) => each.id === id);

  #fill(draft: Draft | undefined): void {
    this.#choice.value = draft?.found.id ?? "";
    this.#questions.clear();
    this.#shown = undefined;
    this.#target = undefined;
    this.#placeBox.typed = "";
    if (!draft) {
      this.#form.clear();
      this.#body.replaceChildren(hint("Choose a function, or select a cell that holds one of its formulas."));
      return;
    }
    const { canReach } = this.#pane;
    const { spills } = this.#traits;
    const copy = button("Copy formula", () => void this.#pane.attempt(() => this.#copy()));
    const go = button("Insert formula", () => void this.#pane.attempt(() => this.#insert()), "primary");
    const onUseSelection = (field: Field) => void this.#pane.attempt(() => this.#pick(field));
    this.#body.replaceChildren(
      ...(this.#own ? [] : [make("p", { class: "sentence" }, draft.found.description)]),
      ...this.#form.fill(draft, { spills, canReach, onUseSelection }),
      this.#outcome.element,
      ...(canReach ? [this.#placeBox.element] : []),
      this.#questions.element,
      make("div", { class: "pane-buttons" }, ...(canReach ? [go] : []), copy),
      ...(spills ? [] : [oldExcelNote()]),
    );
    this.#changed();
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
    this.#placeBox.typed = addressOn(sheet ?? "", range.split(":")[0] ?? "");
    this.#changed();
  }

  #onSheetChange(): void {
    if (this.element.hidden) return;
    void this.#explain.update();
    this.#changed();
  }

  /** Shows anew what the fields give, a moment after the last change. */
  #changed(): void {
    this.#questions.clear();
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => void this.#refresh(), DELAY);
  }

  async #refresh(): Promise<void> {
    const { draft, lacking } = this.#form;
    if (!draft || this.element.hidden) return;
    const turn = ++this.#turn;
    const { namespace } = this.#catalogue;
    const given = givenOf(draft);
    this.#form.adaptTo(given);
    const formula = formulaOf(draft, namespace, given);
    const show = (below: HTMLElement) =>
      this.#outcome.showFormula(formula, localForm(formula, this.#traits), below);
    if (lacking) {
      this.#shown = undefined;
      show(hint(lacking));
      this.#placeBox.clear();
      return;
    }
    try {
      const seen = seenFromElsewhere(given, this.#home);
      const shown = await preview(draft.found, seen, namespace, this.#pane.reachable);
      if (turn !== this.#turn) return;
      this.#shown = "onlyTheSheet" in shown ? undefined : shown;
      show(gives(draft.found, given, this.#shown));
      if (this.#pane.canReach) await this.#showPlace(given, turn);
    } catch (failure) {
      if (turn === this.#turn) show(fault(this.#pane.sentence(failure)));
    }
  }

  async #findTarget(given: readonly string[]): Promise<Target> {
    const { typed } = this.#placeBox;
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
    this.#placeBox.suggest(target);
    const place = await this.#placeAt(target);
    if (turn === this.#turn) this.#placeBox.show(place);
  }

  #placeAt(target: Target): Promise<ResultPlace | undefined> {
    const own = this.#own && target.why === "its own cell" ? parseAddress(this.#own.range).range : undefined;
    // One cell while there is no preview.
    const shape = this.#shown?.shape ?? { rows: 1, columns: 1 };
    return placeOf(this.#pane.workbook, target, shape, own, this.#form.form);
  }

  async #insert(consent = false): Promise<void> {
    const wrong = this.#form.goToFault();
    if (wrong) return this.#questions.ask(wrong);
    clearTimeout(this.#timer);
    await this.#refresh();
    const { draft, form } = this.#form;
    if (!draft) return;
    const workbook = this.#pane.workbook;
    const given = givenOf(draft);
    const target = this.#target ?? (await this.#findTarget(given));
    const place = await this.#placeAt(target);
    if (!place) return this.#questions.ask(PAST_THE_END);
    const { area, shape, occupiedCount, occupied, hindrance } = place;
    if (hindrance) {
      const byRow = isCellwise(draft.found) && form === "spill" && !hindrance.includes("protected");
      const answers = [...(byRow ? [this.#byRowButton()] : []), this.#elsewhereButton(target)];
      return this.#questions.ask(hindrance, ...answers);
    }
    if (occupiedCount > 0 && !consent) {
      const some = `${occupied.slice(0, 3).join(", ")}${occupiedCount > 3 ? ", …" : ""}`;
      return this.#questions.ask(
        `${area} is not free: ${cellsInUse(occupiedCount)} (${some}).`,
        this.#elsewhereButton(target),
        button("Overwrite them", () => void this.#pane.attempt(() => this.#insert(true))),
      );
    }
    await insert(workbook, this.#pane.history, {
      draft,
      given: target.sheet === this.#home ? given : seenFromElsewhere(given, this.#home),
      namespace: this.#catalogue.namespace,
      target,
      area,
      shape,
      form,
      cells: this.#shown?.cells ?? [],
      clears: occupiedCount > 0,
    });
    rememberUse(draft.found.id);
    this.#questions.clear();
    this.#placeBox.typed = "";
    this.#own = await workbook.getFormula(addressOn(target.sheet, target.cell));
    this.#pane.say(`Inserted in ${target.cell}${area.includes(":") ? `; it fills ${area}` : ""}.`);
  }

  #byRowButton(): HTMLElement {
    return button("Write one formula in each row", () => {
      this.#form.writePerRow();
      void this.#pane.attempt(() => this.#insert());
    });
  }

  #elsewhereButton(target: Target): HTMLElement {
    const beside = async () => {
      const free = await freePlace(this.#pane.workbook, target);
      this.#own = undefined;
      this.#placeBox.typed = addressOn(target.sheet, free);
      await this.#insert();
    };
    return button("Put it beside the data", () => void this.#pane.attempt(beside));
  }

  async #copy(): Promise<void> {
    const { draft } = this.#form;
    if (!draft) return;
    await this.#pane.copy(
      localForm(formulaOf(draft, this.#catalogue.namespace, givenOf(draft)), this.#traits),
    );
    rememberUse(draft.found.id);
  }
}
