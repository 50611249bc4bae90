import type { Catalogue } from "../../catalogue/catalogue";
import { givenOf, readDraft } from "../build/draft";
import { button, freshId, make } from "../dom";
import { rangeOf } from "../formula/shape";
import { serialText, shownValue } from "../live/show-value";
import type { Pane } from "../pane";
import { addressOn, blockName, cellName, columnName, parseAddress, parseBlock } from "../workbook/address";
import { Trouble } from "../workbook/trouble";
import type { Workbook } from "../workbook/workbook";
import { SURVEY_ARGUMENTS } from "./drawn-functions";
import type { Figure } from "./figure";
import { PictureCard } from "./picture-card";
import { type SensorLine, surveyFigure } from "./survey";

type Argument = (typeof SURVEY_ARGUMENTS)[number];

const WORDS: Readonly<Record<Argument, string>> = {
  times: "Times",
  readings: "Readings, °C",
  setpoint: "Set point, °C",
  tolerance: "Tolerance ±, °C",
  corrections: "Corrections, °C (a row, or empty)",
};

/** The survey block that is selected, or that the selected formula uses, as a picture over time. */
export class SurveyPart {
  readonly element = make("section", { class: "part survey" });
  readonly #catalogue: Catalogue;
  readonly #pane: Pane;
  readonly #card: PictureCard;
  readonly #whole = make("input", { type: "checkbox", id: freshId("whole") });
  readonly #fields: Readonly<Record<Argument, HTMLInputElement>>;

  constructor(catalogue: Catalogue, pane: Pane) {
    this.#catalogue = catalogue;
    this.#pane = pane;
    this.#card = new PictureCard(pane);
    const field = (name: Argument) =>
      make("input", {
        class: "field",
        type: "text",
        id: freshId(name),
        name,
        autocomplete: "off",
        spellcheck: "false",
      });
    this.#fields = {
      times: field("times"),
      readings: field("readings"),
      setpoint: field("setpoint"),
      tolerance: field("tolerance"),
      corrections: field("corrections"),
    };
    const rows = SURVEY_ARGUMENTS.map((name) => {
      const pick = button("Use selection", () => void pane.attempt(() => this.#pick(name)));
      pick.setAttribute("aria-label", `Use selection for ${WORDS[name]}`);
      const input = this.#fields[name];
      return make(
        "div",
        { class: "argument" },
        make("label", { for: input.id }, WORDS[name]),
        make("div", { class: "control-row" }, input, pick),
      );
    });
    this.element.append(
      make("h3", {}, "A survey over time"),
      make(
        "p",
        { class: "hint" },
        "Select a cell with a survey formula, or name the cells: one column of times, one column of readings for each sensor.",
      ),
      button("Take from the selected formula", () => void pane.attempt(() => this.#fromFormula())),
      ...rows,
      button("Draw the survey", () => void pane.attempt(() => this.#draw()), "primary"),
      make(
        "div",
        { class: "tick" },
        this.#whole,
        make("label", { for: this.#whole.id }, "Show the whole log, not only what is near the band"),
      ),
      this.#card.element,
    );
    this.#whole.addEventListener("change", () => void pane.attempt(() => this.#draw()));
    pane.onForget(() => this.#forget());
    this.element.hidden = !pane.canReach;
  }

  get figure(): Figure | undefined {
    return this.#card.figure;
  }

  /** Its cells were those of a workbook that is no longer open. */
  #forget(): void {
    this.#card.hide();
    for (const field of Object.values(this.#fields)) field.value = "";
  }

  async #pick(name: Argument): Promise<void> {
    this.#fields[name].value = await this.#pane.workbook.getSelection();
  }

  async #fromFormula(): Promise<void> {
    const { workbook } = this.#pane;
    const { sheet = "", range } = parseAddress(await workbook.getSelection());
    const { row, column } = parseBlock(range);
    const found = await workbook.getFormula(addressOn(sheet, cellName(row, column)));
    const draft = found && readDraft(found.formula, this.#catalogue);
    const names = draft?.found.parameters.map(({ name }) => name) ?? [];
    if (!draft || !SURVEY_ARGUMENTS.every((name) => names.includes(name))) {
      throw new Trouble("The selected cell holds no survey formula. Select one, or fill in the fields.");
    }
    const given = givenOf(draft);
    for (const name of SURVEY_ARGUMENTS) {
      const argument = given[names.indexOf(name)] ?? "";
      const own = rangeOf(argument);
      this.#fields[name].value =
        own === undefined || own.includes("!") ? (own ?? argument) : addressOn(sheet, own);
    }
    await this.#draw();
  }

  async #draw(): Promise<void> {
    const { workbook } = this.#pane;
    const [times, readings] = await Promise.all([
      this.#cells(workbook, "times"),
      this.#cells(workbook, "readings"),
    ]);
    const [setpoint, tolerance] = await Promise.all([
      this.#number(workbook, "setpoint"),
      this.#number(workbook, "tolerance"),
    ]);
    const names = await this.#names(workbook);
    const corrections = await this.#corrections(workbook, names.length);
    const { figure, sensors } = surveyFigure({
      times,
      readings,
      names,
      setpoint,
      tolerance,
      ...(corrections === undefined ? {} : { corrections }),
      whole: this.#whole.checked,
    });
    await this.#card.show(figure, sensorTable(sensors));
  }

  /** Blank rows at the end of a prepared range hold nothing to draw. */
  async #cells(workbook: Workbook, name: Argument) {
    const address = this.#fields[name].value.trim();
    if (address === "") throw new Trouble(`${WORDS[name]}: name the cells first.`);
    const { sheet } = parseAddress(address);
    const used = await workbook.getUsedRange(address);
    const block = parseBlock(parseAddress(address).range);
    const lastRow = used ? Math.min(block.lastRow, parseBlock(used).lastRow) : block.lastRow;
    const range = blockName({ ...block, lastRow: Math.max(lastRow, block.row) });
    return workbook.getValues(sheet === undefined ? range : addressOn(sheet, range));
  }

  async #number(workbook: Workbook, name: Argument): Promise<number> {
    const text = this.#fields[name].value.trim();
    const value =
      text === "" || !Number.isNaN(Number(text))
        ? Number(text || Number.NaN)
        : (await workbook.getValues(text)).flat()[0];
    if (typeof value !== "number" || Number.isNaN(value))
      throw new Trouble(`${WORDS[name]}: a number is needed.`);
    return value;
  }

  /** One number for each sensor; undefined where the field is empty. */
  async #corrections(workbook: Workbook, sensors: number): Promise<number[] | undefined> {
    const address = this.#fields.corrections.value.trim();
    if (address === "") return undefined;
    const values = (await workbook.getValues(address)).flat();
    if (values.length !== sensors || !values.every((value) => typeof value === "number")) {
      throw new Trouble(`${WORDS.corrections}: a number for each of the ${sensors} sensors is needed.`);
    }
    return values;
  }

  /** The titles above the readings, or their columns. */
  async #names(workbook: Workbook): Promise<string[]> {
    const { sheet, range } = parseAddress(this.#fields.readings.value.trim());
    const { row, column, lastColumn } = parseBlock(range);
    const letters = Array.from(
      { length: lastColumn - column + 1 },
      (_, index) => `column ${columnName(column + index)}`,
    );
    if (row === 0) return letters;
    const above = blockName({ row: row - 1, column, lastRow: row - 1, lastColumn });
    const titles = (await workbook.getValues(sheet === undefined ? above : addressOn(sheet, above)))[0] ?? [];
    return letters.map((letter, index) =>
      typeof titles[index] === "string" && titles[index] !== ""
        ? titles[index].replace(/\s*°C$/, "")
        : letter,
    );
  }
}

function sensorTable(sensors: readonly SensorLine[]): HTMLElement {
  const heads = ["sensor", "lowest °C", "highest °C", "worst in soak °C", "at"];
  const degrees = (value: number | null | undefined) =>
    value == null ? "" : value.toFixed(1).replace("-", "−");
  const rows = sensors.map(({ name, lowest, highest, worst }) =>
    make(
      "tr",
      {},
      make("th", { scope: "row" }, name),
      make("td", { class: "number" }, degrees(lowest)),
      make("td", { class: "number" }, degrees(highest)),
      make("td", { class: "number" }, degrees(worst?.deviation)),
      make(
        "td",
        { class: "number" },
        worst
          ? worst.time > 20_000
            ? serialText(worst.time, true).slice(11, 16)
            : shownValue(worst.time)
          : "",
      ),
    ),
  );
  return make(
    "div",
    { class: "block-scroll", tabindex: "0", role: "region", "aria-label": "Sensors" },
    make(
      "table",
      { class: "block" },
      make(
        "thead",
        {},
        make(
          "tr",
          {},
          ...heads.map((head, index) =>
            make("th", { scope: "col", class: index > 0 ? "number" : "words" }, head),
          ),
        ),
      ),
      make("tbody", {}, ...rows),
    ),
  );
}
