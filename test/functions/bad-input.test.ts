/** Each kind of bad cell, first, in the middle and alone: the right error there, and nothing else changes. */
import { describe, expect, it } from "vitest";
import { EMF, EMFTABLE, SEEBECK, TEMPERATURE, TOITS90, TYPEINFO } from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const GOOD = [4.096, 8.138, 12.209];
const converted = readable(TEMPERATURE(columnOf(...GOOD), one("K"), one(20))).map(([cell]) => cell);

const BAD_READINGS: readonly (readonly [what: string, cell: unknown, result: unknown])[] = [
  ["text", "open", '#VALUE! EMF: "open" is text, not a number'],
  ["text like a number", "4.096", '#VALUE! EMF: "4.096" is text, not a number'],
  ["a decimal comma", "4,096", '#VALUE! EMF: "4,096" is text, not a number'],
  ["text like NaN", "NaN", '#VALUE! EMF: "NaN" is text, not a number'],
  ["a space", " ", '#VALUE! EMF: " " is text, not a number'],
  ["long text", "x".repeat(32767), `#VALUE! EMF: "${"x".repeat(23)}…" is text, not a number`],
  ["TRUE", true, "#VALUE! EMF: TRUE, not a number"],
  ["FALSE", false, "#VALUE! EMF: FALSE, not a number"],
  ["NaN", Number.NaN, "#VALUE! EMF: not a finite number"],
  ["infinity", Number.POSITIVE_INFINITY, "#VALUE! EMF: not a finite number"],
  ["a blank", "", ""],
  ["null", null, ""],
  ["#N/A", errorCell("#N/A"), "#N/A"],
  ["#DIV/0!", errorCell("#DIV/0!"), "#DIV/0!"],
  ["#REF!", errorCell("#REF!"), "#VALUE! input is #REF!"],
  ["#NAME?", errorCell("#NAME?"), "#VALUE! input is #NAME?"],
  ["an error as a data type", { type: "Error", basicType: "Error", basicValue: "#N/A" }, "#N/A"],
  [
    "an open sensor",
    99.999,
    "#N/A EMF 99.999 mV with the reference junction at 20 °C makes 100.7971 mV, above the limit of type K, 54.8864 mV (1372 °C)",
  ],
  [
    "an EMF below the range",
    -9,
    "#N/A EMF -9 mV with the reference junction at 20 °C makes -8.2019 mV, below the limit of type K, -6.4577 mV (-270 °C)",
  ],
];

describe.each(BAD_READINGS)("a reading that is %s", (_, cell, result) => {
  it.each([0, 1, 2])("spoils its own result only, in row %d of three", (row) => {
    const readings: unknown[] = [...GOOD];
    readings[row] = cell;
    const expected: unknown[] = [...converted];
    expected[row] = result;
    const types = columnOf("K", "K", "K");
    expect(readable(TEMPERATURE(columnOf(...readings), one("K"), one(20)))).toEqual(
      expected.map((value) => [value]),
    );
    // The same with a type in each row, which takes another way through the code.
    expect(readable(TEMPERATURE(columnOf(...readings), types, one(20)))).toEqual(
      expected.map((value) => [value]),
    );
    expect(readable(TEMPERATURE(rowOf(...readings), one("K"), one(20)))).toEqual([expected]);
  });

  it("is answered alone and as a whole range", () => {
    expect(readable(TEMPERATURE(one(cell), one("K"), one(20)))).toEqual([[result]]);
    expect(readable(TEMPERATURE(columnOf(cell, cell), one("K"), one(20)))).toEqual([[result], [result]]);
  });
});

describe("beside a good reading", () => {
  it.each([
    ["a blank reference temperature is missing, never 0 °C", "", "#N/A reference temperature missing"],
    ["a text is refused", "20 °C", '#VALUE! reference temperature: "20 °C" is text, not a number'],
    ["an error passes through", errorCell("#NUM!"), "#NUM!"],
    [
      "a reference temperature outside the range is refused",
      2000,
      "#N/A reference temperature 2000 °C is outside the range of type K, -270 °C to 1372 °C",
    ],
  ])("%s", (_, reference, result) => {
    const cells = TEMPERATURE(columnOf(...GOOD), one("K"), columnOf(20, reference, 20));
    expect(readable(cells)).toEqual([[converted[0]], [result], [converted[2]]]);
    expect(readable(TEMPERATURE(columnOf(...GOOD), one("K"), one(reference)))).toEqual([
      [result],
      [result],
      [result],
    ]);
  });

  it.each([
    ["X", '#VALUE! type "X" is unknown: B C E J K N R S T A, or conductors such as Au/Pt'],
    [
      "constructor",
      '#VALUE! type "constructor" is unknown: B C E J K N R S T A, or conductors such as Au/Pt',
    ],
    ["__proto__", '#VALUE! type "__proto__" is unknown: B C E J K N R S T A, or conductors such as Au/Pt'],
    [5, '#VALUE! type "5" is unknown: B C E J K N R S T A, or conductors such as Au/Pt'],
    [
      "L",
      '#VALUE! type "L" means different couples in different standards: write "Chromel/Copel" for that of GOST R 8.585',
    ],
    ["", "#N/A type missing"],
  ])("the type %s is refused in its row", (type, result) => {
    expect(readable(TEMPERATURE(columnOf(...GOOD), columnOf("K", type, "k"), one(20)))).toEqual([
      [converted[0]],
      [result],
      [converted[2]],
    ]);
    expect(readable(TEMPERATURE(columnOf(...GOOD), one(type), one(20)))).toEqual([
      [result],
      [result],
      [result],
    ]);
  });
});

describe("an EMF of type B", () => {
  it("below its zero crossing belongs to two temperatures", () => {
    expect(readable(TEMPERATURE(one(-0.001), one("B"), one(0)))).toEqual([
      ["#N/A EMF -0.001 mV is below 0 mV: under 42.1321 °C an EMF of type B belongs to two temperatures"],
    ]);
  });
});

describe("ranges of different shapes", () => {
  it("broadcast: a block of channels, a row of types and a column of terminals", () => {
    const cells = TEMPERATURE([[1, 2], [3, 4], [5, 6]], rowOf("K", "J"), columnOf(10, 20, 30)); // biome-ignore format: a block
    expect(cells).toHaveLength(3);
    for (const [i, row] of cells.entries()) {
      for (const [j, cell] of row.entries()) {
        const alone = TEMPERATURE(one(i * 2 + j + 1), one(j === 0 ? "K" : "J"), one(10 * (i + 1)));
        expect(cell).toBe(alone[0]?.[0]);
      }
    }
  });

  it("give #N/A where one does not reach", () => {
    const cells = readable(TEMPERATURE(columnOf(...GOOD), one("K"), columnOf(20, 20)));
    expect(cells).toEqual([
      [converted[0]],
      [converted[1]],
      ["#N/A no value here: the ranges differ in size"],
    ]);
    expect(readable(TEMPERATURE(columnOf(1, 2), rowOf("K", "K"), rowOf(20, 20, 20)))[1]?.[2]).toBe(
      "#N/A no value here: the ranges differ in size",
    );
  });

  it("are refused when they are empty", () => {
    expect(readable(TEMPERATURE([], one("K"), one(20)))).toEqual([["#VALUE! EMF: the range is empty"]]);
    expect(readable(TEMPERATURE([[]], one("K"), one(20)))).toEqual([["#VALUE! EMF: the range is empty"]]);
    expect(readable(TEMPERATURE(columnOf(1), [], one(20)))).toEqual([["#VALUE! type: the range is empty"]]);
  });

  it("are refused when their product is larger than any sheet", () => {
    const column = Array.from({ length: 1_048_576 }, () => [1]);
    const row = [Array.from({ length: 16_384 }, () => 20)];
    expect(readable(TEMPERATURE(column, one("K"), row))).toEqual([
      ["#VALUE! a result of 1048576 × 16384 cells is too large"],
    ]);
  });
});

describe("an argument", () => {
  const leftOut = undefined as unknown as unknown[][];
  const omitted = null as unknown as unknown[][];

  it("that is required and missing is named", () => {
    expect(readable(TEMPERATURE(one(1), one("K"), leftOut))).toEqual([
      ["#VALUE! argument missing: referenceTemperature"],
    ]);
    expect(readable(TEMPERATURE(one(1), omitted, one(0)))).toEqual([["#VALUE! argument missing: type"]]);
    expect(readable(EMFTABLE(one("K"), leftOut, one(0)))).toEqual([["#VALUE! argument missing: start"]]);
  });

  it("that is left out has its default; a blank cell never stands for it", () => {
    expect(EMF(one(100), one("K"), omitted, omitted)).toEqual(EMF(one(100), one("K"), one(0), one("C")));
    expect(readable(EMF(one(100), one("K"), one("")))).toEqual([["#N/A reference temperature missing"]]);
    expect(readable(SEEBECK(one(100), one("K"), one("")))).toEqual([["#VALUE! unit: the cell is blank"]]);
  });

  it("for the whole call takes one cell", () => {
    expect(readable(SEEBECK(one(100), one("K"), rowOf("C", "F")))).toEqual([
      ["#VALUE! unit: one cell, not 1 × 2"],
    ]);
    expect(readable(TYPEINFO(columnOf("K", "J")))).toEqual([["#VALUE! type: one cell, not 2 × 1"]]);
  });

  it("with an unknown option is refused for the whole call", () => {
    expect(readable(TOITS90(columnOf(1, 2), one("X")))).toEqual([
      ['#VALUE! unit: "X" is none of C, F, K, R'],
    ]);
    expect(readable(EMFTABLE(one("K"), one(0), one(10), one(1), one("volts")))).toEqual([
      ['#VALUE! column: "volts" is none of temperature, emf, seebeck_uv'],
    ]);
    expect(readable(TYPEINFO(one("K"), one("hasOwnProperty")))[0]?.[0]).toMatch(
      /^#VALUE! metric: "hasOwnProperty" is none of/,
    );
  });

  it("that is an error is the result of the whole call", () => {
    expect(readable(TYPEINFO(one(errorCell("#NULL!"))))).toEqual([["#NULL!"]]);
  });
});

describe("EMFTABLE", () => {
  it("has a header row, counts down when it must, and one bad row spoils one row", () => {
    expect(readable(EMFTABLE(one("K"), one(1371), one(1373), one(1)))).toEqual([
      ["temperature", "emf", "seebeck_uv"],
      [1371, expect.any(Number), expect.any(Number)],
      [1372, expect.any(Number), expect.any(Number)],
      [
        1373,
        "#N/A temperature 1373 °C is outside the range of type K, -270 °C to 1372 °C",
        "#N/A temperature 1373 °C is outside the range of type K, -270 °C to 1372 °C",
      ],
    ]);
    expect(EMFTABLE(one("K"), one(2), one(0), one(1), one("temperature"))).toEqual(columnOf(2, 1, 0));
  });

  it("steps by one degree of the call's unit when no step is given", () => {
    expect(EMFTABLE(one("K"), one(32), one(35), undefined, one("temperature"), one("F"))).toEqual(
      columnOf(32, 33, 34, 35),
    );
  });

  it.each([0, -1])("refuses a step of %d", (step) => {
    expect(readable(EMFTABLE(one("K"), one(0), one(10), one(step)))).toEqual([
      [`#VALUE! step ${step} is not above 0`],
    ]);
  });

  it("refuses a table that no worksheet holds", () => {
    expect(readable(EMFTABLE(one("K"), one(0), one(1000), one(1e-9)))[0]?.[0]).toMatch(
      /longer than a worksheet/,
    );
  });
});

describe("units", () => {
  it("hold for every temperature of the call", () => {
    const inCelsius = TEMPERATURE(one(10), one("K"), one(25))[0]?.[0] as number;
    const scales = {
      F: (t: number) => t * 1.8 + 32,
      K: (t: number) => t + 273.15,
      R: (t: number) => (t + 273.15) * 1.8,
    };
    for (const [unit, from] of Object.entries(scales)) {
      const cell = TEMPERATURE(one(10), one("K"), one(from(25)), one(unit))[0]?.[0] as number;
      expect(cell).toBeCloseTo(from(inCelsius), 9);
    }
  });

  it("scale a Seebeck coefficient by the size of the degree alone", () => {
    const perCelsius = SEEBECK(one(100), one("K"))[0]?.[0] as number;
    expect(SEEBECK(one(212), one("K"), one("f"))[0]?.[0]).toBeCloseTo(perCelsius / 1.8, 9);
    expect(SEEBECK(one(373.15), one("K"), one("K"))[0]?.[0]).toBeCloseTo(perCelsius, 9);
  });

  it("print the limits of a refusal in the call's unit", () => {
    expect(readable(EMF(one(3000), one("K"), one(70), one("F")))).toEqual([
      ["#N/A temperature 3000 °F is outside the range of type K, -454 °F to 2501.6 °F"],
    ]);
  });
});
