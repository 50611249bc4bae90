/** What an argument may be: one cell, a row or column, a block, lines as people type them, the times of a log. */
import { describe, expect, it } from "vitest";
import {
  BUDGET,
  CALDRIFT,
  CALFIT,
  CHECKTABLE,
  CLASSMET,
  COMBINEDU,
  CORRECTED,
  CORRECTION,
  CORRECTIONU,
  DESPIKE,
  EMF,
  EMFTABLE,
  NTCTEMPERATURE,
  RAMPRATE,
  SEEBECK,
  SOAK,
  STANDARDU,
  TEMPERATURE,
  TEMPERATUREU,
  TIMEABOVE,
  TYPEINFO,
  VERDICT,
} from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const none = undefined;
const missing = undefined as unknown as unknown[][];
const block = (...rows: unknown[][]): unknown[][] => rows;
const said = (cells: unknown[][]): unknown => {
  expect(cells).toHaveLength(1);
  expect(cells[0]).toHaveLength(1);
  return readable(cells)[0]?.[0];
};

describe("what is no range at all", () => {
  it("is one cell, or one row of cells", () => {
    const zero = 0 as unknown as unknown[][];
    const k = "K" as unknown as unknown[][];
    expect(EMF(zero, k)).toEqual(one(0));
    expect(TYPEINFO(k, "low" as unknown as unknown[][])).toEqual(one(-270));
    expect(EMF([0, 0, 0] as unknown as unknown[][], k)).toEqual(rowOf(0, 0, 0));
    // A mixture is a row: its parts are cells.
    const mixed = EMF([[5], 0, 0] as unknown as unknown[][], k);
    expect(mixed.map((row) => row.length)).toEqual([3]);
    expect(mixed[0]?.slice(1)).toEqual([0, 0]);
  });
});

describe("an empty range", () => {
  it("is refused by its argument's name", () => {
    for (const empty of [[], [[]], [[], []]]) {
      expect(said(TYPEINFO(empty))).toBe("#VALUE! type: the range is empty");
      expect(said(EMF(one(1), empty))).toBe("#VALUE! type: the range is empty");
      expect(said(CORRECTIONU(one(1), empty, one(1)))).toBe("#VALUE! points: the range is empty");
    }
  });
});

describe("the unit of the call", () => {
  it("is read before every other argument", () => {
    const unknown = '#VALUE! unit: "X" is none of C, F, K, R';
    expect(said(TEMPERATURE(one(1), one("K"), missing, one("X")))).toBe(unknown);
    expect(said(EMFTABLE(missing, one(0), one(1), none, none, one("X")))).toBe(unknown);
    expect(said(EMFTABLE(one("K"), one(""), one(1), none, none, one(errorCell("#NUM!"))))).toBe("#NUM!");
  });
});

describe("an argument's name in a message", () => {
  it.each([
    ["lower limit", VERDICT(one(1), one(2), none, none, one("x")), '#VALUE! lower limit: "x" is neither a number nor none'],
    ["uncertainty of the EMF", TEMPERATUREU(one(100), one("K"), one("x"), one(0), one(0)), '#VALUE! uncertainty of the EMF: "x" is text, not a number'],
    ["uncertainty of the reference temperature", TEMPERATUREU(one(100), one("K"), one(1), one("x"), one(0)), '#VALUE! uncertainty of the reference temperature: "x" is text, not a number'],
    ["other uncertainty", TEMPERATUREU(one(100), one("K"), one(1), one(0), one(0), one("x")), '#VALUE! other uncertainty: "x" is text, not a number'],
    ["expanded uncertainties", CORRECTIONU(one(1), columnOf(0, 1), columnOf(1, "x")), '#VALUE! expanded uncertainties, row 2: "x" is text, not a number'],
    ["EMF", TEMPERATURE(one("x"), one("K"), one(0)), '#VALUE! EMF: "x" is text, not a number'],
  ])("%s is in words", (_, cells, message) => {
    expect(said(cells)).toBe(message);
  }); // biome-ignore format: one call a line
});

describe("one cell for the whole call", () => {
  it("is not a row, not a column and not a blank", () => {
    expect(said(SEEBECK(one(100), one("K"), columnOf("C", "F", "K")))).toBe(
      "#VALUE! unit: one cell, not 3 × 1",
    );
    expect(said(SEEBECK(one(100), one("K"), rowOf("C", "F")))).toBe("#VALUE! unit: one cell, not 1 × 2");
    expect(said(TYPEINFO(one(null)))).toBe("#VALUE! type: the cell is blank");
  });

  it("may be blank where the declaration says so, and then stays one cell", () => {
    const check = (toleranceClass: unknown[][], limits?: unknown[][]) =>
      CHECKTABLE(columnOf(400, 900), columnOf(401, 903), one("K"), toleranceClass, none, none, none, limits, one("verdict"));
    expect(check(one(""), one(2))).toEqual(columnOf("Pass", "Fail"));
    expect(said(check(one("")))).toBe("#VALUE! tolerance class: the cell is blank, and no limits are given");
    expect(said(check(columnOf("", 1), one(2)))).toBe("#VALUE! tolerance class: one cell, not 2 × 1");
    expect(said(check(rowOf("", 1), one(2)))).toBe("#VALUE! tolerance class: one cell, not 1 × 2");
    expect(said(check(one(errorCell("#NUM!")), one(2)))).toBe("#NUM!");
  }); // biome-ignore format: one call a line
});

describe("a row or column", () => {
  const rectangle = block([0, 500], [1000, 1100]);

  it("is not a rectangle", () => {
    expect(said(CORRECTIONU(one(1), rectangle, one(1)))).toBe(
      "#VALUE! points: one row or one column, not 2 × 2",
    );
    expect(said(CORRECTION(one(1), rectangle, one(1)))).toBe(
      "#VALUE! points: one row or one column, not 2 × 2",
    );
    expect(said(CALFIT(rectangle, rectangle, one(1)))).toBe(
      "#VALUE! temperatures: one row or one column, not 2 × 2",
    );
    const log = [columnOf(0, 1, 2), columnOf(900, 900, 900)] as const;
    expect(said(SOAK(...log, one(900), rectangle))).toBe(
      "#VALUE! tolerance: one row or one column, not 2 × 2",
    );
  });

  it("names the cell that is bad, by its row or its column", () => {
    expect(said(NTCTEMPERATURE(one(1e4), columnOf("x", 3950)))).toBe(
      '#VALUE! coefficients, row 1: "x" is text, not a number',
    );
    expect(said(NTCTEMPERATURE(one(1e4), rowOf(1e4, "x")))).toBe(
      '#VALUE! coefficients, column 2: "x" is text, not a number',
    );
    expect(said(CALFIT(columnOf(0, 1), columnOf(0, true), one(1)))).toBe(
      "#VALUE! deviations, row 2: TRUE, not a number",
    );
    expect(said(CORRECTION(one(1), columnOf(0, errorCell("#NUM!")), columnOf(0, 1)))).toBe("#NUM!");
  });

  it("has no blank where each cell counts", () => {
    expect(said(CORRECTIONU(one(1), columnOf("", 500), columnOf(1, 1)))).toBe(
      "#VALUE! points, row 1: the cell is blank",
    );
    expect(said(CORRECTIONU(one(1), rowOf(0, null), rowOf(1, 1)))).toBe(
      "#VALUE! points, column 2: the cell is blank",
    );
    expect(said(CORRECTION(one(1), columnOf(0, ""), columnOf(1, 1)))).toBe(
      "#VALUE! points, row 2: the cell is blank",
    );
  });

  it("may have blanks where rows may be empty, and must be given all the same", () => {
    expect(CALFIT(columnOf(0, "", 10), columnOf(1, 5, 2), one(1), none, none, one("coefficients"))).toEqual(
      columnOf(expect.closeTo(1, 12), expect.closeTo(0.1, 12)),
    );
    expect(said(CLASSMET(one(100), missing, one("K")))).toBe("#VALUE! argument missing: errors");
  });
});

describe("the points and the values of a certificate", () => {
  it("lie both in columns or both in rows, a sensor each", () => {
    const two = block([1, 10], [3, 30]);
    expect(CORRECTION(rowOf(50, 50), columnOf(0, 100), two)).toEqual(rowOf(2, 20));
    expect(CORRECTION(rowOf(50, 50), rowOf(0, 100), block([1, 3], [10, 30]))).toEqual(rowOf(2, 20));
  });

  it("that are a single point do not take a column of values for a sensor each", () => {
    expect(said(CORRECTION(one(100), one(100), columnOf(1, 2, 3)))).toBe(
      "#VALUE! points and values differ in number, 1 and 3",
    );
  });

  it("are judged only when the result is not too large for any sheet", () => {
    // 20 000 000 cells are still taken, and the certificate is then what is wrong; one row more is too large.
    const wide = [Array.from({ length: 1000 }, () => 1)];
    const call = (rows: number) =>
      CORRECTED(Array.from({ length: rows }, () => [1]), columnOf(0, 100), one(1), none, none, none, wide); // biome-ignore format: one call
    expect(said(call(20_000))).toBe("#VALUE! points and values differ in number, 2 and 1");
    expect(said(call(20_001))).toBe("#VALUE! a result of 20001 × 1000 cells is too large");
  });
});

describe("a block without blanks", () => {
  const correlations = (...rows: unknown[][]) => COMBINEDU(columnOf(3, 4), none, rows);

  it("is taken row by row", () => {
    expect(correlations([1, 0], [0, 1])).toEqual(one(5));
    expect(correlations([1, 1], [1, 1])).toEqual(one(7));
  });

  it("names the cell that is bad", () => {
    expect(said(correlations([1, 0], ["x", 1]))).toBe(
      '#VALUE! correlations, row 2, column 1: "x" is text, not a number',
    );
    expect(said(correlations([1, true], [0, 1]))).toBe(
      "#VALUE! correlations, row 1, column 2: TRUE, not a number",
    );
    expect(said(correlations(["", 0], [0, 1]))).toBe(
      "#VALUE! correlations, row 1, column 1: the cell is blank",
    );
    expect(said(correlations([1, 0], [0, null]))).toBe(
      "#VALUE! correlations, row 2, column 2: the cell is blank",
    );
    expect(said(correlations([1, errorCell("#DIV/0!")], [0, 1]))).toBe("#DIV/0!");
  });
});

describe("the tolerance of a survey", () => {
  const soak = (tolerance: unknown[][]) =>
    SOAK(
      columnOf(0, 1, 2),
      columnOf(896, 900, 903),
      one(900),
      tolerance,
      none,
      none,
      one("min"),
      one("minutes"),
    );

  it("is the same above and below, or below and above in two cells", () => {
    expect(soak(one(4))).toEqual(one(2));
    expect(soak(one(3))).toEqual(one(1));
    expect(soak(rowOf(4, 2))).toEqual(one(1));
    expect(soak(columnOf(4, 3))).toEqual(one(2));
  });

  it("is not more than two numbers, and no blank", () => {
    expect(said(soak(rowOf(1, 2, 3)))).toBe(
      "#VALUE! tolerance: one number, or two cells (below, above), not 3",
    );
    expect(said(soak(rowOf(1, "")))).toBe("#VALUE! tolerance, column 2: the cell is blank");
    expect(said(soak(one("±3")))).toBe('#VALUE! tolerance, row 1: "±3" is text, not a number');
  });
});

describe("the times of a log", () => {
  const minutes = one("min");
  const above = (...times: unknown[]) =>
    TIMEABOVE(columnOf(...times), columnOf(...times.map(() => 100)), one(50), one(60), minutes);

  it("are one column", () => {
    expect(said(TIMEABOVE(rowOf(0, 1), columnOf(100, 100), one(50)))).toBe(
      "#VALUE! times: one column, not 2",
    );
  });

  it("may be numbers of a data type", () => {
    const typed = (basicValue: number) => ({ type: "FormattedNumber", basicType: "Double", basicValue });
    expect(above(typed(10), 20, typed(30))).toEqual(one(20));
  });

  it("that are bad are named by their row", () => {
    expect(said(above(0, "12:00", 2))).toBe('#VALUE! times, row 2: "12:00" is text, not a number');
    expect(said(above(0, 1, Number.NaN))).toBe("#VALUE! times, row 3: not a finite number");
    expect(said(above(true, 1))).toBe("#VALUE! times, row 1: TRUE, not a number");
    expect(said(above(0, errorCell("#REF!"), 2))).toBe("#VALUE! input is #REF!");
  });

  it("may begin with two of the same, 0 and 0 as well", () => {
    expect(above(0, 0, 10)).toEqual(one(10));
  });

  it("that fall to 0 are empty cells or midnight", () => {
    expect(said(above(5, 6, 0))).toBe(
      '#VALUE! time in row 3: 0 or an empty cell; IF(ISBLANK(range),"",range) tells them apart, TIMELINE repairs midnight',
    );
  });
});

describe("a block of readings", () => {
  it("has no reading that no thermometer gives, and says so in its own cell", () => {
    expect(readable(DESPIKE(columnOf(1, 1e100, 1, -1e101, 9e99)))).toEqual(
      columnOf(1, "#N/A readings: 1e+100 is no reading", 1, "#N/A readings: -1e+101 is no reading", 9e99),
    );
    const ramp = RAMPRATE(columnOf(0, 1, 2, 3), columnOf(0, 5, 1e100, 15), none, one("min"));
    expect(readable(ramp)[2]).toEqual(["#N/A temperatures: 1e+100 is no reading"]);
  });

  it("names such a reading as it stands in the sheet, whatever the call's unit", () => {
    const readings = CHECKTABLE(one(400), one(1e100), one("K"), one(1), none, none, none, none, one("reading"), one("F"));
    expect(said(readings)).toBe("#N/A readings: 1e+100 is no reading");
  }); // biome-ignore format: one call a line
});

describe("lines as people type them", () => {
  const good = ["drift", 1, "standard"];

  it("have as many columns as there are things to say", () => {
    const columns = "(name, value, distribution, divisor, sensitivity, degrees of freedom)";
    expect(said(BUDGET(rowOf("drift", 1)))).toBe(`#VALUE! lines: 3 to 6 columns ${columns}, not 2`);
    expect(said(BUDGET(rowOf("drift", 1, "normal", 1, 1, 9, "")))).toBe(
      `#VALUE! lines: 3 to 6 columns ${columns}, not 7`,
    );
    expect(BUDGET(block(good), none, one("combined"))).toEqual(one(1));
  });

  it("are named by their number and what stands first in them, without the spaces around it", () => {
    expect(said(BUDGET(block(good, ["  noise ", "x", "normal"])))).toBe(
      '#VALUE! row 2 (noise), value: "x" is text, not a number',
    );
    expect(said(BUDGET(block([" ", "x", "normal"])))).toMatch(/^#VALUE! row 1, value: /);
    expect(said(BUDGET(block([7, "x", "normal"])))).toMatch(/^#VALUE! row 1, value: /);
    expect(said(BUDGET(block(good, ["noise", "", "normal"])))).toBe("#N/A row 2 (noise): value missing");
    expect(said(BUDGET(block(good, ["noise", errorCell("#NUM!"), "normal"])))).toBe("#NUM!");
  });

  const text = '#VALUE! row 1 (source), value: "size" is text, not a number';
  it.each([
    ["words alone", ["source", "size", "distribution"], true],
    ["words and blanks of either kind", ["source", "size", "distribution", "", null, "dof"], true],
    ["a number beside the words", ["source", "size", "normal", 2], false],
    ["a word with a digit", ["source", "size", "fit2"], false],
    ["TRUE beside the words", ["source", "size", "normal", true], false],
  ])("are headed by %s: %j", (_, first, header) => {
    const rows = block(first, [...good, ...first.slice(3).map(() => "")]);
    expect(said(BUDGET(rows))).toBe(header ? `${text}; leave the header row out` : text);
  });

  it("have a header in the first row only", () => {
    expect(said(BUDGET(block(good, ["source", "size", "distribution"])))).toBe(
      '#VALUE! row 2 (source), value: "size" is text, not a number',
    );
  });
});

describe("a blank that means not given", () => {
  it("does so beside a value, after one that was given too", () => {
    // A full width of 6 by its own divisor, √3 of a rectangular distribution, and by 2.
    const cells = STANDARDU(columnOf(6, 6, 6), one("rectangular"), columnOf(2, "", 2));
    expect(cells).toEqual(columnOf(3, expect.closeTo(6 / Math.sqrt(3), 12), 3));
  });

  it("does not so elsewhere", () => {
    expect(said(VERDICT(one(1), one(2), one("")))).toBe("#N/A expanded uncertainty missing");
    const limits = CALDRIFT(columnOf(0, 1), columnOf(0, 1), columnOf(0, 1), one(1), one(2), columnOf(1, ""));
    expect(said(limits)).toBe("#VALUE! limits, row 2: the cell is blank");
  });
});
