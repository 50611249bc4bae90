/** Where only numbers vary, blocks of rows go through the column routine at once, and only bad cells are worked out one by one. */
import { describe, expect, it } from "vitest";
import { each, ifGiven, ifGivenOrBlank, once, orElse, unit } from "../../src/functions/arguments";
import { cellwise } from "../../src/functions/cellwise";
import { couple } from "../../src/functions/kinds/couple";
import type { Kind } from "../../src/functions/kinds/kind";
import { name } from "../../src/functions/kinds/name";
import { number } from "../../src/functions/kinds/numbers";
import { temperature, temperatureDifference } from "../../src/functions/kinds/temperature";
import {
  differenceResult,
  emfResult,
  numberResult,
  type ResultKind,
  temperatureResult,
} from "../../src/functions/results";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

/** Cells that were worked out by themselves, and calls of the column routine, in the last call. */
let alone: string[] = [];
let blocks: { count: number; names: string[] }[] = [];

type Given = Partial<Record<"reading" | "type" | "step" | "note" | "word" | "added" | "unit", unknown[][]>>;

/** An invented function, reading + 2·step + added, that keeps count of how it was asked. */
const invented = (result: ResultKind) => {
  const call = cellwise(() => [], {
    arguments: {
      reading: each(temperature),
      type: each(couple),
      step: orElse(each(temperatureDifference), 1000, "1000"),
      note: ifGiven(each(number)),
      word: ifGiven(each(name)),
      added: orElse(once(number), 0, "0"),
      unit,
    },
    result,
    cell({ reading, step, added }, _, { row, column }) {
      alone.push(`${row},${column}`);
      return reading + 2 * step + added;
    },
    column({ added }, { reading, step, ...more }, answers, count) {
      blocks.push({ count, names: ["reading", "step", ...Object.keys(more)] });
      for (let i = 0; i < count; i++) {
        const sum = (reading[i] as number) + 2 * (step[i] as number) + added;
        answers[i] = Number.isFinite(sum) ? sum : Number.NaN;
      }
    },
  });
  return (given: Given) => {
    alone = [];
    blocks = [];
    return call({
      reading: one(0),
      type: k,
      step: none,
      note: none,
      word: none,
      added: none,
      unit: none,
      ...given,
    });
  };
};
const k = one("K");
const none = undefined;
const plain = invented(emfResult);

const range = (rows: number, columns: number): number[][] =>
  Array.from({ length: rows }, (_, row) => Array.from({ length: columns }, (_, column) => row + column / 4));
const counts = () => blocks.map(({ count }) => count);

describe("a block of good numbers", () => {
  it("goes through in blocks of 2048 rows, column by column, and no cell by itself", () => {
    const readings = range(4196, 2);
    const steps = readings.map((_, row) => [row % 3]);
    const result = plain({ reading: readings, step: steps, added: one(0.5) });
    expect(result).toEqual(readings.map((cells, row) => cells.map((t) => t + 2 * (row % 3) + 0.5)));
    expect(alone).toEqual([]);
    expect(counts()).toEqual([2048, 2048, 2048, 2048, 100, 100]);
  });

  it.each([1, 2047, 2048, 2049, 4096, 4097])(
    "of %d rows comes back with as many, and no block is empty",
    (rows) => {
      const readings = range(rows, 1);
      expect(plain({ reading: readings, step: one(1) })).toEqual(readings.map(([t]) => [(t as number) + 2]));
      expect(counts().reduce((sum, count) => sum + count)).toBe(rows);
      expect(Math.min(...counts())).toBeGreaterThan(0);
    },
  );

  it("has the stand-in of an argument that was left out, in every row", () => {
    expect(plain({ reading: columnOf(1, 2, 3) })).toEqual(columnOf(2001, 2002, 2003));
    expect(alone).toEqual([]);
  });

  it("is stretched along a row and along a column", () => {
    const expected = [11, 12, 13].map((t) => [t + 20, t + 40]);
    expect(plain({ reading: columnOf(11, 12, 13), step: rowOf(10, 20) })).toEqual(expected);
    expect(alone).toEqual([]);
    expect(counts()).toEqual([3, 3]);
    expect(plain({ reading: rowOf(1, 2), step: columnOf(10, 20) })).toEqual([
      [21, 22],
      [41, 42],
    ]);
    expect(alone).toEqual([]);
    expect(counts()).toEqual([2, 2]);
  });

  it("is given to the routine as the numbers that vary and nothing else", () => {
    plain({ reading: columnOf(1, 2), added: one(3), unit: one("F") });
    expect(blocks.map(({ names }) => names)).toEqual([["reading", "step", "note"]]);
  });
});

describe("a bad cell in a long block", () => {
  it("is worked out by itself, at its own place, and no other is", () => {
    const readings: unknown[][] = range(2100, 2);
    const bad: readonly (readonly [number, number, unknown, unknown])[] = [
      [0, 0, "open", '#VALUE! reading: "open" is text, not a number'],
      [3, 1, "", ""],
      [2047, 0, errorCell("#DIV/0!"), "#DIV/0!"],
      [2048, 1, true, "#VALUE! reading: TRUE, not a number"],
      [2099, 1, Number.POSITIVE_INFINITY, "#VALUE! reading: not a finite number"],
    ];
    for (const [row, column, cell] of bad) (readings[row] as unknown[])[column] = cell;
    const result = readable(plain({ reading: readings, step: one(0) }));
    for (const [row, column, , shown] of bad) expect(result[row]?.[column]).toBe(shown);
    expect(result.flat().filter((cell) => typeof cell === "number")).toHaveLength(4200 - bad.length);
    expect(result[2098]).toEqual([2098, 2098.25]);
    expect(alone).toEqual([]);
  });

  it("that holds a number as a data type is worked out by itself", () => {
    const formatted = { type: "FormattedNumber", basicType: "Double", basicValue: 5, numberFormat: "0.0" };
    expect(plain({ reading: [[1, 2], [3, formatted]], step: one(0) })).toEqual([[1, 2], [3, 5]]); // biome-ignore format: a block
    expect(alone).toEqual(["1,1"]);
  });

  it("is where a shorter range does not reach", () => {
    const outside = "#N/A no value here: the ranges differ in size";
    expect(readable(plain({ reading: range(3, 3), step: [[1, 1], [1, 1]] }))).toEqual([
      [2, 2.25, outside],
      [3, 3.25, outside],
      [outside, outside, outside],
    ]); // biome-ignore format: a block
  });
});

describe("cells are worked out one by one", () => {
  it.each<[string, Given]>([
    ["types vary down a column", { type: columnOf("K", "J") }],
    ["types vary along a row", { type: rowOf("K", "J") }],
    ["the type is unknown", { type: one("X") }],
    ["the type is blank", { type: one("") }],
    ["a word is blank that may be any", { word: one("") }],
    ["the type is an error", { type: one(errorCell("#N/A")) }],
  ])("where %s", (_, varied) => {
    const result = plain({ reading: columnOf(1, 2), step: one(0), ...varied });
    expect(blocks).toEqual([]);
    expect(result).toHaveLength(2);
  });
});

describe("a word that repeats down a column", () => {
  /** What was read by each kind, in order. */
  const read: unknown[] = [];
  const counted = <T>(kind: Kind<T>): Kind<T> => ({
    ...kind,
    read(cell, ...rest) {
      read.push(cell);
      return kind.read(cell, ...rest);
    },
  });
  const paired = cellwise(() => [], {
    arguments: {
      value: each(counted(number)),
      word: each(counted(name)),
      note: ifGivenOrBlank(each(counted(name))),
    },
    result: numberResult,
    cell: ({ value, word, note }) => `${value} ${word} ${note}`,
  });
  const shown = (values: unknown[][], words: unknown[][], notes?: unknown[][]) => {
    read.length = 0;
    return readable(paired({ value: values, word: words, note: notes })).flat();
  };

  it("is read once, and a good number not at all after the first row", () => {
    expect(shown(columnOf(1, 2, 3, 4), columnOf("a", "a", "b", "b"), one("n"))).toEqual([
      "1 a n",
      "2 a n",
      "3 b n",
      "4 b n",
    ]);
    expect(read).toEqual([1, "a", "n", 3, "b", "n"]);
  });

  it("holds again after a blank, a bad cell and another word", () => {
    expect(shown(columnOf(1, 2, 3, 4, 5), columnOf("a", "", "a", true, "a"))).toEqual([
      "1 a undefined",
      "#N/A word missing",
      "3 a undefined",
      "#VALUE! word: TRUE, not a name",
      "5 a undefined",
    ]);
    expect(shown(columnOf(1, 2, 3, 4), one("a"), columnOf("n", "", "n", "n"))).toEqual([
      "1 a n",
      "2 a undefined",
      "3 a n",
      "4 a n",
    ]);
  });

  it("is not met by a cell that holds nothing", () => {
    expect(shown(columnOf(1, 2), columnOf(undefined, "a"))).toEqual(["#N/A word missing", "2 a undefined"]);
    expect(shown(columnOf(1, 2), one("a"), columnOf(undefined, "n"))).toEqual(["1 a undefined", "2 a n"]);
  });
});

describe("a text as a result", () => {
  it("is written as it is, whatever numbers would be written in", () => {
    const word = cellwise(() => [], {
      arguments: { value: each(number), unit },
      result: temperatureResult,
      cell: ({ value }) => (value > 0 ? value : "none"),
    });
    expect(word({ value: columnOf(0, 100), unit: one("F") })).toEqual(
      columnOf("none", expect.closeTo(212, 12)),
    );
  });
});

describe("the call's unit", () => {
  it("holds for what goes in: temperatures with their zero, differences by the size of the degree alone", () => {
    // 212 °F is 100 °C; a step of 9 °F is 5 °C.
    const result = plain({ reading: columnOf(212, 32), step: columnOf(9, 18), unit: one("F") });
    expect(result[0]?.[0]).toBeCloseTo(110, 12);
    expect(result[1]?.[0]).toBeCloseTo(20, 12);
    expect(plain({ reading: columnOf(273.15), step: one(1), unit: one("K") })).toEqual(one(2));
    expect(alone).toEqual([]);
  });

  it("does not hold for a result that is written in a way of its own", () => {
    const mirrored = invented({ name: "mirrored", write: (value) => 5 - 4 * value });
    expect(mirrored({ reading: columnOf(1, 0, 10), step: one(0) })).toEqual(columnOf(1, 5, -35));
  });

  it("holds for what comes out", () => {
    const shown = (result: ResultKind, symbol: string) =>
      invented(result)({ reading: columnOf(0, 100).map(([t]) => [inUnit(t as number, symbol)]), step: one(0), unit: one(symbol) }); // biome-ignore format: one call
    expect(shown(temperatureResult, "F").map(([t]) => Number((t as number).toFixed(9)))).toEqual([32, 212]);
    expect(shown(temperatureResult, "K")).toEqual(columnOf(273.15, 373.15));
    expect(shown(temperatureResult, "C")).toEqual(columnOf(0, 100));
    expect(shown(differenceResult, "F").map(([t]) => Number((t as number).toFixed(9)))).toEqual([0, 180]);
    expect(shown(differenceResult, "K")).toEqual(columnOf(0, 100));
    expect(alone).toEqual([]);
  });
});

const inUnit = (t: number, symbol: string): number =>
  symbol === "F" ? t * 1.8 + 32 : symbol === "K" ? t + 273.15 : t;
