import type { Catalogue } from "../../catalogue/catalogue";
import { button, make } from "../dom";
import { callText } from "../formula/arguments";
import { evaluate, isFault } from "../live/evaluate";
import type { Pane } from "../pane";
import { addressOn, blockName, parseAddress, parseBlock } from "../workbook/address";
import type { FormulaCell, Workbook } from "../workbook/workbook";
import { type Draft, givenOf, readDraft } from "./draft";

/** What the selected cell does, its error in words, and the way to change it. */
export class ExplainCard {
  readonly element = make("section", { class: "explain", "aria-label": "Selected cell", hidden: true });
  readonly #catalogue: Catalogue;
  readonly #pane: Pane;
  readonly #edit: (draft: Draft, cell: FormulaCell) => void;
  #turn = 0;

  constructor(catalogue: Catalogue, pane: Pane, edit: (draft: Draft, cell: FormulaCell) => void) {
    this.#catalogue = catalogue;
    this.#pane = pane;
    this.#edit = edit;
  }

  async update(): Promise<void> {
    const workbook = this.#pane.reachable;
    const turn = ++this.#turn;
    const parts = workbook ? await this.#parts(workbook).catch(() => undefined) : undefined;
    if (turn !== this.#turn) return;
    this.element.hidden = parts === undefined;
    const words = parts?.map(({ textContent }) => textContent).join("");
    if (parts && words !== this.element.textContent) this.element.replaceChildren(...parts);
  }

  async #parts(workbook: Workbook): Promise<HTMLElement[] | undefined> {
    const { sheet = "", range } = parseAddress(await workbook.getSelection());
    const { row, column } = parseBlock(range);
    const cell = blockName({ row, column, lastRow: row, lastColumn: column });
    const found = await workbook.getFormula(addressOn(sheet, cell));
    const draft = found && readDraft(found.formula, this.#catalogue);
    if (!found || !draft) return undefined;
    const anchor = parseAddress(found.anchor).range;
    const isPart = anchor !== cell;
    return [
      make("h3", {}, isPart ? `${cell}, from the formula in ${anchor}` : `${cell}`),
      make("p", {}, make("code", { class: "formula" }, found.formula)),
      make("p", { class: "sentence" }, draft.found.description),
      ...(await this.#fault(workbook, addressOn(sheet, cell), found, draft)),
      button(isPart ? `Edit the formula in ${anchor}` : "Edit this formula", () => this.#edit(draft, found)),
    ];
  }

  async #fault(workbook: Workbook, cell: string, found: FormulaCell, draft: Draft): Promise<HTMLElement[]> {
    const code = (await workbook.getValues(cell))[0]?.[0];
    if (typeof code !== "string" || !code.startsWith("#")) return [];
    const message =
      (await workbook.getErrorMessage(cell)) ?? (await this.#messageFromHere(workbook, cell, found, draft));
    const words = message ?? SHEET_ERRORS[code] ?? "the sheet gives no reason.";
    return [make("p", { class: "fault" }, make("strong", {}, `${code}: `), words)];
  }

  /** Excel keeps a function's message to itself; the same function in this page says it again. */
  async #messageFromHere(
    workbook: Workbook,
    cell: string,
    found: FormulaCell,
    draft: Draft,
  ): Promise<string | undefined> {
    const { sheet } = parseAddress(found.anchor);
    const read = (address: string) =>
      workbook.getValues(address.includes("!") ? address : addressOn(sheet ?? "", address));
    try {
      const call = callText(this.#catalogue.namespace, draft.found.id, givenOf(draft));
      const result = await evaluate(call, this.#catalogue.namespace, read);
      const [at, from] = [parseBlock(parseAddress(cell).range), parseBlock(parseAddress(found.anchor).range)];
      const own = result[at.row - from.row]?.[at.column - from.column];
      return isFault(own) ? own.message : undefined;
    } catch {
      return undefined;
    }
  }
}

/** Errors that the sheet gives by itself. */
const SHEET_ERRORS: Readonly<Record<string, string>> = {
  "#SPILL!": "the result needs more cells than are free. Clear the cells below and to the right.",
  "#NAME?": "the sheet does not know the function. Is the add-in loaded?",
  "#REF!": "the formula points to a cell that is not there.",
  "#BUSY!": "the sheet is still calculating.",
};
