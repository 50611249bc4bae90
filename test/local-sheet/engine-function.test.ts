import { type ArrayValueObject, NumberValueObject } from "@univerjs/engine-formula";
import { describe, expect, it } from "vitest";
import { WorksheetError, type WorksheetFunction } from "../../src/catalogue/functions-runtime";
import { EngineFunction } from "../../src/local-sheet/engine-function";
import { ErrorMessages } from "../../src/local-sheet/error-messages";

const parameters = ["a", "b"].map((name) => ({ name, description: "", dimensionality: "matrix" as const }));
const metadata = { id: "F", name: "F", description: "", parameters };

function register(implementation: WorksheetFunction) {
  const messages = new ErrorMessages();
  const registered = new EngineFunction("BEAD.F", metadata, implementation, messages, () => undefined);
  registered.setRefInfo("workbook", "sheet", 4, 2);
  const at = (row: number, column: number, code: string, formula = "=BEAD.F(1)") =>
    messages.find({ sheetId: "sheet", row: 4, column: 2, formula }, row, column, code);
  return { registered, at };
}

describe("a built function in the grid", () => {
  it("gets null for each argument left out at the end", () => {
    const calls: unknown[][] = [];
    const { registered } = register((...values) => {
      calls.push(values);
      return [[0]];
    });
    registered.calculate(NumberValueObject.create(7));
    expect(calls).toEqual([[[[7]], null]]);
  });

  it("becomes an error with its reason when it throws", () => {
    const { registered, at } = register(() => {
      throw new RangeError("no such row");
    });
    expect(registered.calculate().isError()).toBe(true);
    expect(at(0, 0, "#VALUE!")).toBe("no such row");
  });

  it("refuses more arguments than it declares", () => {
    const { registered, at } = register(() => [[0]]);
    const one = NumberValueObject.create(1);
    expect(registered.calculate(one, one, one).isError()).toBe(true);
    expect(at(0, 0, "#VALUE!")).toContain("too many arguments");
  });

  it("keeps the messages of its last result by cell, and forgets them with the next", () => {
    let result: unknown = [[1], [new WorksheetError("#N/A", "open sensor")]];
    const { registered, at } = register(() => result);
    expect((registered.calculate() as ArrayValueObject).toValue()).toEqual([[1], ["#N/A"]]);
    expect(at(1, 0, "#N/A")).toBe("open sensor");
    expect(at(0, 0, "#N/A")).toBeUndefined();
    expect(at(1, 0, "#VALUE!")).toBeUndefined();
    expect(at(1, 0, "#N/A", "=BEAD.OTHER(1)")).toBeUndefined();
    result = [[1], [2]];
    registered.calculate();
    expect(at(1, 0, "#N/A")).toBeUndefined();
  });
});
