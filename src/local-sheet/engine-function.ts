import { BaseFunction, type BaseValueObject } from "@univerjs/engine-formula";
import { WorksheetError, type WorksheetFunction } from "../catalogue/functions-runtime";
import { toArgument, toEngineValue } from "./cell-values";
import type { ErrorMessages } from "./error-messages";
import type { FunctionMetadata } from "./function-metadata";
import type { ResultFormat } from "./result-format";

/**
 * One built worksheet function as a function of the grid engine. It overrides `calculate` rather than the engine's
 * `calculateCustom`, which hands blanks as 0 beside arguments left out and reads texts in results as dates.
 */
export class EngineFunction extends BaseFunction {
  readonly #metadata: FunctionMetadata;
  readonly #implementation: WorksheetFunction;
  readonly #messages: ErrorMessages;
  readonly #format: ResultFormat;

  constructor(
    name: string,
    metadata: FunctionMetadata,
    implementation: WorksheetFunction,
    messages: ErrorMessages,
    format: ResultFormat,
  ) {
    super(name);
    this.#metadata = metadata;
    this.#implementation = implementation;
    this.#messages = messages;
    this.#format = format;
  }

  override calculate(...values: BaseValueObject[]) {
    const errors = new Map<string, WorksheetError>();
    const result = this.#call(values);
    const onError = (row: number, column: number, error: WorksheetError) =>
      errors.set(`${row},${column}`, error);
    const value = toEngineValue(result, onError, this.#format);
    const caller = { sheetId: this.subUnitId ?? "", row: this.row, column: this.column };
    const shape = Array.isArray(result)
      ? { rows: result.length, columns: Array.isArray(result[0]) ? result[0].length : 0 }
      : { rows: 1, columns: 1 };
    this.#messages.record(caller, String(this.name), shape, errors);
    return value;
  }

  /** A throw would end the engine's whole calculation, so it becomes the error that Excel would show. */
  #call(values: BaseValueObject[]): unknown {
    const { parameters } = this.#metadata;
    if (values.length > parameters.length) {
      return new WorksheetError(
        "#VALUE!",
        `too many arguments: ${values.length}, at most ${parameters.length}`,
      );
    }
    try {
      return this.#implementation(
        ...parameters.map((parameter, index) =>
          toArgument(values[index], parameter.dimensionality ?? "scalar"),
        ),
      );
    } catch (failure) {
      if (failure instanceof WorksheetError) return failure;
      return new WorksheetError("#VALUE!", failure instanceof Error ? failure.message : String(failure));
    }
  }
}
