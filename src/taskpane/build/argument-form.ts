import type { CatalogueFunction } from "../../catalogue/catalogue";
import { make } from "../dom";
import { isManyCells } from "../formula/arguments";
import { isCellwise, rangeOf } from "../formula/shape";
import type { Draft } from "./draft";
import { Field } from "./field";
import type { Form } from "./insert";
import { Tick } from "./tick";

/** What the sheet and the pane allow. */
interface Circumstances {
  /** Whether a formula can fill a block. */
  readonly spills: boolean;
  /** Whether there is a sheet to write into. */
  readonly canReach: boolean;
  readonly onUseSelection: (field: Field) => void;
}

/** The arguments of one function as fields, with the two choices about how the formula is written. */
export class ArgumentForm {
  readonly #onChange: () => void;
  readonly #keepBlanks: Tick;
  readonly #perRow: Tick;
  #found: CatalogueFunction | undefined;
  #fields: readonly Field[] = [];
  #around: Pick<Draft, "before" | "after"> = { before: "=", after: "" };

  constructor(onChange: () => void) {
    this.#onChange = onChange;
    this.#keepBlanks = new Tick(
      "Keep empty cells empty",
      "Excel hands an empty cell of a range to a function as 0, a reading like any other. IF(ISBLANK(…)) keeps it blank.",
      onChange,
    );
    this.#perRow = new Tick(
      "One formula in each row",
      "For tables, merged cells and Excel before 2021, where one formula cannot fill a column.",
      onChange,
    );
  }

  get found(): CatalogueFunction | undefined {
    return this.#found;
  }

  get form(): Form {
    return this.#found && isCellwise(this.#found) && this.#perRow.isSet ? "per row" : "spill";
  }

  get draft(): Draft | undefined {
    return (
      this.#found && {
        found: this.#found,
        fields: this.#fields.map(({ text }) => text),
        keepBlanks: this.#keepBlanks.isSet,
        ...this.#around,
      }
    );
  }

  /** Takes over a draft and gives back the elements that show it. */
  fill(draft: Draft, { spills, canReach, onUseSelection }: Circumstances): HTMLElement[] {
    const { found, fields, keepBlanks, before, after } = draft;
    this.#found = found;
    this.#around = { before, after };
    this.#keepBlanks.isSet = keepBlanks;
    this.#perRow.isSet = !spills && isCellwise(found);
    this.#fields = found.parameters.map(
      (parameter) => new Field(parameter, this.#onChange, canReach ? onUseSelection : undefined),
    );
    fields.forEach((text, index) => {
      if (text !== "") this.#fields[index]!.text = text;
    });
    const rest = this.#fields.filter(({ parameter }) => parameter.optional);
    return [
      ...this.#fields.filter(({ parameter }) => !parameter.optional).map(({ element }) => element),
      ...(rest.length > 0 ? [further(rest)] : []),
      this.#keepBlanks.element,
      ...(isCellwise(found) && canReach ? [this.#perRow.element] : []),
    ];
  }

  clear(): void {
    this.#found = undefined;
    this.#fields = [];
  }

  /** One formula in each row from now on. */
  writePerRow(): void {
    this.#perRow.isSet = true;
  }

  /** Empty cells matter where a range is given. */
  adaptTo(given: readonly string[]): void {
    this.#keepBlanks.element.hidden = !given.some((each) => {
      const range = rangeOf(each);
      return range !== undefined && isManyCells(range);
    });
  }

  /** What is missing or wrong, in a sentence; undefined when the formula is complete. */
  get lacking(): string | undefined {
    const missing = this.#fields.filter((field) => field.fault !== undefined);
    if (missing.length === 0) return undefined;
    const wrong = missing.find((field) => field.text.trim() !== "");
    return wrong
      ? faultOf(wrong)
      : `Still to fill in: ${missing.map(({ parameter }) => parameter.name).join(", ")}.`;
  }

  /** Goes to the first field with a fault, and says which fault. */
  goToFault(): string | undefined {
    const wrong = this.#fields.find((field) => field.fault !== undefined);
    wrong?.focus();
    return wrong && faultOf(wrong);
  }

  /** Whether there was a field to go to. */
  focus(): boolean {
    this.#fields[0]?.focus();
    return this.#fields.length > 0;
  }
}

const faultOf = (field: Field): string => `${field.parameter.name}: ${field.fault}`;

const further = (rest: readonly Field[]) =>
  make(
    "details",
    { class: "more", open: rest.some(({ text }) => text !== "") },
    make("summary", {}, `Further arguments (${rest.length})`),
    ...rest.map(({ element }) => element),
  );
