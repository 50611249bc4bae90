/** Functions that answer once for the whole call: tables, named values, and what stands in their cells. */
import { describe, expect, it } from "vitest";
import { noAnswer, wrongKind } from "../../src/core";
import * as worksheet from "../../src/functions";
import { each, ifGiven, once, readings, unit } from "../../src/functions/arguments";
import { cellwise } from "../../src/functions/cellwise";
import { columnwise } from "../../src/functions/columnwise";
import { declarationOf } from "../../src/functions/declaration";
import { choice } from "../../src/functions/kinds/kind";
import { number } from "../../src/functions/kinds/numbers";
import { differenceResult, temperatureResult, wordResult } from "../../src/functions/results";
import { type Entry, metrics, table, whole } from "../../src/functions/whole";
import { columnOf, errorCell, one, readable } from "./call";

const none = undefined;

describe("a cell of a result", () => {
  const shown = (rows: readonly (readonly Entry[])[]) =>
    readable(
      whole(() => [], {
        arguments: { value: once(number) },
        result: wordResult,
        cells: () => rows,
      })({ value: one(1) }),
    );

  it("is a number, a text or an error, and never a number that is none", () => {
    const tooLarge = "#N/A the result is too large for a number";
    expect(shown([[1, Number.POSITIVE_INFINITY, Number.NaN, Number.NEGATIVE_INFINITY, "NaN", ""]])).toEqual([
      [1, tooLarge, tooLarge, tooLarge, "NaN", ""],
    ]);
    expect(shown([[noAnswer`nothing`, wrongKind`wrong`, errorCell("#NUM!")]])).toEqual([
      ["#N/A nothing", "#VALUE! wrong", "#NUM!"],
    ]);
  });

  it("is there even where there are no rows", () => {
    expect(shown([])).toEqual([["#N/A the result has no rows"]]);
  });
});

describe("a table", () => {
  const spilled = table(() => [], {
    arguments: { column: ifGiven(once(choice(["at", "change", "word"]))), unit },
    result: { at: temperatureResult, change: differenceResult, word: wordResult },
    rows: () => [
      { at: 0, change: 5, word: "first" },
      { at: 100, change: noAnswer`nothing`, word: "last" },
    ],
  });

  it("has a header row, and its numbers are in the call's unit", () => {
    expect(readable(spilled({ column: none, unit: none }))).toEqual([
      ["at", "change", "word"],
      [0, 5, "first"],
      [100, "#N/A nothing", "last"],
    ]);
    expect(readable(spilled({ column: none, unit: one("F") })).slice(1)).toEqual([
      [32, expect.closeTo(9, 12), "first"],
      [expect.closeTo(212, 12), "#N/A nothing", "last"],
    ]);
  });

  it("gives one column without its header", () => {
    expect(spilled({ column: one("WORD"), unit: none })).toEqual(columnOf("first", "last"));
    expect(spilled({ column: one("at"), unit: one("K") })).toEqual(columnOf(273.15, 373.15));
  });
});

describe("named values", () => {
  const named = metrics(() => [], {
    arguments: { metric: ifGiven(once(choice(["at", "change"]))), unit },
    result: { at: temperatureResult, change: differenceResult },
    metrics: () => ({ at: 100, change: 5 }),
  });

  it("stand beside their words under a header", () => {
    expect(named({ metric: none, unit: one("K") })).toEqual([
      ["metric", "value"],
      ["at", 373.15],
      ["change", 5],
    ]);
  });

  it("come alone when one is asked for", () => {
    expect(named({ metric: one("at"), unit: one("K") })).toEqual(one(373.15));
    expect(named({ metric: one("change"), unit: one("R") })[0]?.[0]).toBeCloseTo(9, 12);
  });
});

describe("answers column by column", () => {
  const answered = columnwise(() => [], {
    arguments: { block: readings(number), unit },
    result: temperatureResult,
    unanswered: noAnswer`no answer for it`,
    block: ({ block }) => block,
    answers: ({ block }) =>
      block.columns.map((column) => column.map((t) => (t > 5 ? Number.NaN : t)).subarray(0, 3)),
  });

  it("are written in the call's unit; a bad cell says what is wrong with it, a good one why it has no answer", () => {
    const cells = answered({
      block: [[0, 5], ["", "x"], [9, errorCell("#NUM!")], [1, ""]], // biome-ignore format: a block
      unit: one("K"),
    });
    expect(readable(cells)).toEqual([
      [273.15, 278.15],
      ["", '#VALUE! block: "x" is text, not a number'],
      ["#N/A no answer for it", "#NUM!"],
      ["#N/A time missing", ""],
    ]);
  });
});

describe("the declaration of a worksheet function", () => {
  it("is found by the function, with its arguments in order and its result", () => {
    const { arguments: declared, result } = declarationOf(worksheet.EMF);
    expect(Object.keys(declared)).toEqual(["temperature", "type", "referenceTemperature", "unit"]);
    expect(Object.values(declared).map(({ shape, optional }) => [shape, optional])).toEqual([
      ["each", false],
      ["each", false],
      ["each", true],
      ["once", true],
    ]);
    expect(result).toMatchObject({ name: "EMF", unit: "mV" });
  });

  it("is made where the function is, by whatever kind of function it is", () => {
    const one = () => [];
    const other = () => [];
    const cellular = { arguments: { value: each(number) }, result: wordResult, cell: () => 1 };
    const spec = { arguments: { value: once(number) }, result: wordResult, cells: () => [[1]] };
    cellwise(one, cellular);
    whole(other, spec);
    expect(declarationOf(one)).toBe(cellular);
    expect(declarationOf(other)).toBe(spec);
  });

  it("says in which shape an argument comes, and that it must be given", () => {
    expect(once(number)).toMatchObject({ shape: "once", optional: false });
    expect(readings(number)).toMatchObject({ shape: "block", optional: false });
  });

  it("is missed where there is none", () => {
    expect(() => declarationOf(() => [])).toThrow("a worksheet function without declared arguments");
  });
});
