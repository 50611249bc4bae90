import type { Catalogue } from "../../catalogue/catalogue";
import { button, freshId, make } from "../dom";
import { findCall } from "../formula/syntax";
import type { Pane } from "../pane";
import { addressOn, cellName, columnsOf, parseAddress, parseBlock, rowsOf } from "../workbook/address";
import { Trouble } from "../workbook/trouble";
import type { FormulaCell, Workbook } from "../workbook/workbook";
import { freeze, type TracePlace } from "./freeze";

/** Turns the result at the selected cell into values with a trace. */
export class FreezeView {
  readonly element = make("div", { class: "freeze" });
  readonly #catalogue: Catalogue;
  readonly #pane: Pane;
  readonly #what = make("p", { class: "freeze-what", role: "status" });
  readonly #formula = make("code", { class: "formula" });
  readonly #button: HTMLButtonElement;
  readonly #places: HTMLInputElement[];

  constructor(catalogue: Catalogue, pane: Pane) {
    this.#catalogue = catalogue;
    this.#pane = pane;
    this.#button = button("Freeze these results", () => void pane.attempt(() => this.#freeze()), "primary");
    const group = freshId("trace");
    const choices: readonly [TracePlace, string][] = [
      ["sheet", "on a sheet of its own"],
      ["beside", "beside the results"],
    ];
    this.#places = choices.map(([value], index) =>
      make("input", { type: "radio", name: group, id: freshId("place"), value, checked: index === 0 }),
    );
    this.element.append(
      make("h2", { tabindex: "-1" }, "Freeze a record"),
      make(
        "p",
        { class: "sentence" },
        "Results become values that no longer change, with a trace: formula, arguments, version, publications and date. The whole result is taken, and Undo brings the formula back.",
      ),
      this.#what,
      make("p", {}, this.#formula),
      make(
        "fieldset",
        { class: "plain" },
        make("legend", {}, "Write the trace"),
        ...choices.map(([, words], index) =>
          make(
            "div",
            { class: "tick" },
            this.#places[index]!,
            make("label", { for: this.#places[index]!.id }, words),
          ),
        ),
      ),
      this.#button,
    );
    pane.onConnect(async (workbook) => {
      workbook.onChange(() => {
        if (!this.element.hidden) void this.opened();
      });
    });
  }

  focus(): void {
    this.#button.focus();
  }

  async opened(): Promise<void> {
    const workbook = this.#pane.reachable;
    const found = workbook && (await this.#selected(workbook).catch(() => undefined));
    const words = !workbook
      ? "There is no sheet beside the pane."
      : found
        ? sizeOf(found)
        : "Select a cell with a result of one of the functions.";
    if (this.#what.textContent !== words) this.#what.textContent = words;
    this.#formula.textContent = found?.formula ?? "";
  }

  async #selected(workbook: Workbook): Promise<FormulaCell | undefined> {
    const { sheet = "", range } = parseAddress(await workbook.getSelection());
    const { row, column } = parseBlock(range);
    const found = await workbook.getFormula(addressOn(sheet, cellName(row, column)));
    return found && findCall(found.formula, this.#catalogue.namespace) ? found : undefined;
  }

  async #freeze(): Promise<void> {
    const { workbook, history } = this.#pane;
    const found = await this.#selected(workbook);
    if (!found) throw new Trouble("Select a cell with a result of one of the functions first.");
    const place = this.#places.find(({ checked }) => checked)?.value as TracePlace;
    const where = await freeze(workbook, history, this.#catalogue, found, place);
    this.#pane.say(`Frozen: ${parseAddress(found.range).range}. The trace stands ${where}.`);
  }
}

function sizeOf({ range, anchor }: FormulaCell): string {
  const { sheet, range: cells } = parseAddress(range);
  const block = parseBlock(cells);
  const size = rowsOf(block) * columnsOf(block);
  return size === 1
    ? `${parseAddress(anchor).range} of the sheet ${sheet}`
    : `${cells} of the sheet ${sheet}, ${size} cells from one formula`;
}
