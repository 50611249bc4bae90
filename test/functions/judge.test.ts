/** Tolerances, verdicts and the table of a lot as a sheet hands them over. */
import { describe, expect, it } from "vitest";
import {
  ACCEPTANCE,
  CABLETOLERANCE,
  CHECKTABLE,
  CLASSMET,
  CONFORMITY,
  ENSCORE,
  STATEMENT,
  TOLERANCE,
  VERDICT,
} from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const none = undefined;
const text = (cells: unknown[][]): unknown => readable(cells)[0]?.[0];

describe("TOLERANCE", () => {
  it("takes classes as numbers and as words, and broadcasts", () => {
    // 0.004·900 = 3.6, 0.0075·900 = 6.75; the floors are 1.5 °C and 2.5 °C.
    expect(TOLERANCE(columnOf(100, 900), one("k"), rowOf(1, "class 2"))).toEqual([
      [1.5, 2.5],
      [3.6, 6.75],
    ]);
    expect(TOLERANCE(columnOf(1000, 1000, 1200), one("K"), columnOf("special", "Standard", 2))).toEqual(
      columnOf(4, 7.5, 9),
    );
    // 2 % of 100 °C below zero.
    expect(TOLERANCE(one(-100), one("K"), one("standard"))).toEqual(one(2.2));
    expect(TOLERANCE(one(-150), one("K"), one("standard"))).toEqual(one(3));
  });

  it("knows the platinum sensor of the reference junction", () => {
    expect(TOLERANCE(one(100), columnOf("Pt", "type pt"), one("AA"))[1]?.[0]).toBeCloseTo(0.27, 12);
    expect(text(TOLERANCE(one(20), one("Pt"), one("A"), one("uV")))).toBe(
      "#VALUE! Pt is a resistance sensor and has no EMF: leave uV out",
    );
  });

  it("gives degrees of the call's unit without the offset, and µV by the slope", () => {
    expect(TOLERANCE(one(1652), one("K"), one(1), none, one("F"))[0]?.[0]).toBeCloseTo(6.48, 9);
    // 39.45 µV/°C at 0 °C.
    expect(TOLERANCE(one(0), one("K"), one(1), one("uV"))[0]?.[0]).toBeCloseTo(1.5 * 39.45, 2);
  });

  it.each([
    [1100, "K", 1, "#N/A temperature 1100 °C is outside class 1 of type K, -40 °C to 1000 °C"],
    [
      100,
      "J",
      3,
      "#N/A type J has no class 3: it has class 1 from -40 °C to 750 °C, class 2 from -40 °C to 750 °C",
    ],
    [100, "K", 4, '#VALUE! tolerance class "4" is unknown: 1, 2, 3, standard, special, AA, A, B, C'],
    [100, "Q", 1, '#VALUE! type "Q" is unknown: B C E J K N R S T A, or conductors such as Au/Pt, or Pt'],
    [100, "K", "", "#N/A tolerance class missing"],
    ["", "K", 1, ""],
    ["9,5", "K", 1, '#VALUE! temperature: "9,5" is text, not a number'],
  ])("%s of %s in class %s: %s", (temperature, type, className, result) => {
    expect(text(TOLERANCE(one(temperature), one(type), one(className)))).toBe(result);
  });
});

describe("CABLETOLERANCE", () => {
  it("is in µV as specified, or in degrees at the standard's temperature or another", () => {
    expect(CABLETOLERANCE(columnOf("KX", " kca", "RCB"), columnOf(1, 2, 2))).toEqual(columnOf(60, 100, 60));
    expect(CABLETOLERANCE(one("KX"), one(1), one("degrees"))).toEqual(one(1.5));
    expect(CABLETOLERANCE(one("KX"), one(1), one("degrees"), one(0))[0]?.[0]).toBeCloseTo(60 / 39.45, 3);
    expect(CABLETOLERANCE(one("KX"), one(1), one("degrees"), none, one("F"))[0]?.[0]).toBeCloseTo(2.7, 12);
  });

  it("asks for the temperature of the head where ASTM specifies degrees", () => {
    expect(text(CABLETOLERANCE(one("KX"), one("special")))).toBe(
      "#N/A KX is specified in degrees of its own junctions: for µV give the temperature of the head, 0 °C to 200 °C",
    );
    expect(CABLETOLERANCE(one("KX"), one("special"), none, one(0))[0]?.[0]).toBeCloseTo(1.1 * 39.45, 2);
  });

  it("says which cables and classes there are", () => {
    expect(text(CABLETOLERANCE(one("KCA"), one(1)))).toBe("#N/A KCA has no class 1: it has class 2");
    expect(text(CABLETOLERANCE(one("ZX"), one(1)))).toMatch(/^#VALUE! cable "ZX" is unknown: JX TX EX KX/);
    expect(text(CABLETOLERANCE(one(""), one(1)))).toBe("");
  });
});

describe("ACCEPTANCE", () => {
  it("takes the guard band off, cell by cell", () => {
    expect(readable(ACCEPTANCE(columnOf(1, 1, ""), columnOf(0.2, 2, 1)))).toEqual(
      columnOf(0.8, "#N/A U exceeds the limit: 2 is more than 1", ""),
    );
    expect(ACCEPTANCE(one(1), one(0.2), one("simple"))).toEqual(one(1));
    expect(text(ACCEPTANCE(one(1), one(0)))).toBe("#N/A expanded uncertainty is 0 or an empty cell");
    expect(text(ACCEPTANCE(one(1), one(1), one("strict")))).toBe(
      '#VALUE! rule "strict" is unknown: simple, guarded, conditional, or such as guarded 0.83',
    );
  });
});

describe("VERDICT", () => {
  it("is simple without U and guarded with it, and passes at the limit", () => {
    expect(VERDICT(columnOf(902.2 - 900, -2.2, 2.21), one(2.2))).toEqual(columnOf("Pass", "Pass", "Fail"));
    expect(VERDICT(columnOf(0.8, 0.81), one(1), one(0.2))).toEqual(columnOf("Pass", "Fail"));
    expect(VERDICT(one(0.81), one(1), one(0.2), one("Guarded  0.83"))).toEqual(one("Pass"));
  });

  it("takes unequal and one-sided limits", () => {
    expect(VERDICT(columnOf(-1, -3), one(2), none, none, one(-2.5))).toEqual(columnOf("Pass", "Fail"));
    expect(VERDICT(columnOf(-99, 3), one(2), none, none, columnOf("none", "NONE"))).toEqual(
      columnOf("Pass", "Fail"),
    );
    expect(VERDICT(one(1), rowOf(2, 0.5), none, none, rowOf(-2, "none"))).toEqual(rowOf("Pass", "Fail"));
  });

  it("says what is missing, and never takes a blank for a default", () => {
    expect(readable(VERDICT(columnOf(1, 1, "", errorCell("#N/A")), one(2), columnOf("", 0, 1, 1)))).toEqual(
      columnOf(
        "#N/A expanded uncertainty missing",
        "#N/A expanded uncertainty is 0 or an empty cell",
        "",
        "#N/A",
      ),
    );
    expect(text(VERDICT(one(1), one(2), none, one("guarded")))).toBe(
      "#N/A rule guarded needs the expanded uncertainty",
    );
    expect(text(VERDICT(one(1), one(2), none, none, one("")))).toBe("#N/A lower limit missing");
    expect(text(VERDICT(one(1), one(2), none, none, one("never")))).toBe(
      '#VALUE! lower limit: "never" is neither a number nor none',
    );
    expect(text(VERDICT(one(1), one(0)))).toBe(
      '#N/A limit is 0 or an empty cell: give the lower limit as well, or "none"',
    );
  });
});

describe("CONFORMITY and ENSCORE", () => {
  it("reproduce JCGM 106 and a sum done by hand", () => {
    expect(CONFORMITY(one(13.6), one(16.3), one(1.8), one(12.5))[0]?.[0]).toBeCloseTo(0.66, 2);
    // 490 kPa at least: a lower limit alone is an upper one of the opposite sign.
    expect(CONFORMITY(one(-509.7), one(-490), one(8.6), one("none"))[0]?.[0]).toBeCloseTo(0.99, 2);
    expect(ENSCORE(columnOf(100.5, ""), one(0.3), one(100.1), one(0.4))[0]?.[0]).toBeCloseTo(0.8, 12);
    expect(text(ENSCORE(one(1), one(1), one(1), one("")))).toBe("#N/A reference uncertainty missing");
    expect(text(CONFORMITY(one(1), one(2), one(0)))).toBe("#N/A standard uncertainty is 0 or an empty cell");
  });
});

describe("STATEMENT", () => {
  it("prints in the call's unit", () => {
    expect(text(STATEMENT(one(1.8), one(3.6), one(0.9), one("guarded 0.83"), none, one("F")))).toBe(
      "Pass: the error of 1.8 °F lies within the acceptance limit of ±2.853 °F, the limit of ±3.6 °F less the guard band. " +
        "Decision rule: acceptance with a guard band (ILAC-G8:09/2019, 4.2.2), guard band 0.747 °F = 0.83 × U, k = 2. " +
        "Largest specific risk of a wrong Pass by this rule: at most 4.9 %.",
    );
    expect(text(STATEMENT(one(1), one(2), one("")))).toBe("#VALUE! expanded uncertainty: the cell is blank");
  });
});

describe("CLASSMET", () => {
  it("gives a number where the class has one, a word otherwise", () => {
    expect(CLASSMET(columnOf(100, "", 400), columnOf(1, "", 2), one("K"))).toEqual(one(2));
    expect(CLASSMET(columnOf(100), columnOf(9), one("K"))).toEqual(one("none"));
    expect(CLASSMET(one(20), one(0.1), one("Pt"))).toEqual(one("AA"));
    expect(CLASSMET(rowOf(932, 212), rowOf(3.6, 0), one("K"), one("astm"), one("F"))).toEqual(one("special"));
  });

  it("does not judge half a point", () => {
    expect(text(CLASSMET(columnOf(100, 200), columnOf(1, ""), one("K")))).toBe("#N/A point 2: error missing");
    expect(text(CLASSMET(columnOf("", 200), columnOf(1, 1), one("K")))).toBe(
      "#N/A point 1: temperature missing",
    );
    expect(text(CLASSMET(columnOf(100, 200), columnOf(1), one("K")))).toBe(
      "#VALUE! temperatures and errors differ in number, 2 and 1",
    );
    expect(text(CLASSMET(columnOf("", ""), columnOf("", ""), one("K")))).toBe("#N/A no points to judge");
  });
});

describe("CHECKTABLE", () => {
  const HEADER = ["couple", "reference", "reading", "error", "limit", "used", "verdict"];
  const reference = columnOf(400, 900);
  const readings = [
    [401, 400.5, ""],
    [903.75, "open", errorCell("#N/A")],
  ];

  it("spills a row a reading, couple after couple; a bad cell spoils its own row", () => {
    const open = '#VALUE! readings: "open" is text, not a number';
    const cells = readable(
      CHECKTABLE(reference, readings, one("K"), one(1), none, none, rowOf("TC-1", 7, "")),
    );
    // Class 1 of type K: 1.6 °C at 400 °C, 3.6 °C at 900 °C.
    expect(cells).toEqual([
      HEADER,
      ["TC-1", 400, 401, 1, 1.6, 0.625, "Pass"],
      ["TC-1", 900, 903.75, 3.75, 3.6, expect.closeTo(3.75 / 3.6, 12), "Fail"],
      [7, 400, 400.5, 0.5, 1.6, 0.3125, "Pass"],
      [7, 900, open, open, 3.6, open, open],
      ["", 400, "", "", 1.6, "", ""],
      ["", 900, "#N/A", "#N/A", 3.6, "#N/A", "#N/A"],
    ]);
  });

  it("numbers the couples, and gives each of its columns alone", () => {
    const cells = CHECKTABLE(reference, readings, one("K"), one(1));
    expect(cells.map(([couple]) => couple)).toEqual(["couple", 1, 1, 2, 2, 3, 3]);
    for (const [at, column] of HEADER.entries()) {
      expect(CHECKTABLE(reference, readings, one("K"), one(1), none, none, none, none, one(column))).toEqual(
        cells.slice(1).map((row) => [row[at]]),
      );
    }
  });

  it("takes rows of readings where the reference temperatures lie in a row", () => {
    const across = [
      [401, 903.75],
      [400.5, "open"],
      ["", errorCell("#N/A")],
    ];
    expect(readable(CHECKTABLE(rowOf(400, 900), across, one("K"), one(1)))).toEqual(
      readable(CHECKTABLE(reference, readings, one("K"), one(1))),
    );
  });

  const verdicts = (...given: Parameters<typeof CHECKTABLE>): unknown[] =>
    readable(CHECKTABLE(...given))
      .slice(1)
      .map((row) => row[6]);
  const good = columnOf(401.5, 902);

  it("is guarded where U is given, one for all or one a point", () => {
    expect(verdicts(reference, good, one("K"), one(1), one(0.2))).toEqual(["Fail", "Pass"]);
    expect(verdicts(reference, good, one("K"), one(1), one(0.2), one("conditional"))).toEqual([
      "Conditional pass",
      "Pass",
    ]);
    expect(verdicts(reference, good, one("K"), one(1), columnOf(0.05, ""))).toEqual([
      "Pass",
      "#N/A expanded uncertainty missing",
    ]);
    expect(verdicts(reference, good, one("K"), one(1), columnOf(0.05, 0))).toEqual([
      "Pass",
      "#N/A expanded uncertainty is 0 or an empty cell",
    ]);
    expect(text(CHECKTABLE(reference, good, one("K"), one(1), none, one("guarded")))).toBe(
      "#N/A rule guarded needs the expanded uncertainty",
    );
  });

  it("takes limits in place of the class, and then a blank class", () => {
    expect(verdicts(reference, good, one("K"), one(""), none, none, none, one(1.5))).toEqual([
      "Pass",
      "Fail",
    ]);
    const cells = readable(CHECKTABLE(reference, good, one("K"), one(1), none, none, none, columnOf(1, "")));
    expect(cells.slice(1).map((row) => row.slice(3))).toEqual([
      [1.5, 1, 1.5, "Fail"],
      [2, "#N/A limit missing", "#N/A limit missing", "#N/A limit missing"],
    ]);
    expect(text(CHECKTABLE(reference, good, one("K"), one("")))).toBe(
      "#VALUE! tolerance class: the cell is blank, and no limits are given",
    );
  });

  it("does not judge beside a bad reference temperature", () => {
    const missing = "#N/A reference temperature missing";
    expect(readable(CHECKTABLE(columnOf(400, ""), good, one("K"), one(1)))[2]).toEqual([
      1,
      "",
      902,
      missing,
      missing,
      missing,
      missing,
    ]);
    const outside = "#N/A temperature 1300 °C is outside class 1 of type K, -40 °C to 1000 °C";
    expect(readable(CHECKTABLE(columnOf(400, 1300), good, one("K"), one(1)))[2]).toEqual([
      1,
      1300,
      902,
      -398,
      outside,
      outside,
      outside,
    ]);
    expect(readable(CHECKTABLE(columnOf(400, errorCell("#DIV/0!")), good, one("K"), one(1)))[2]).toEqual([
      1,
      "#DIV/0!",
      902,
      "#DIV/0!",
      "#DIV/0!",
      "#DIV/0!",
      "#DIV/0!",
    ]);
  });

  it("means degrees of the call's unit", () => {
    const cells = CHECKTABLE(one(752), one(753.8), one("K"), one(1), none, none, none, none, none, one("F"));
    expect(cells[1]).toEqual([
      1,
      expect.closeTo(752, 9),
      expect.closeTo(753.8, 9),
      expect.closeTo(1.8, 9),
      expect.closeTo(2.88, 9),
      expect.closeTo(0.625, 9),
      "Pass",
    ]);
  });

  it.each([
    [columnOf(400), one("J"), one(3), /^#N\/A type J has no class 3: it has class 1 from/],
    [
      columnOf(400, 900, 1000),
      one("K"),
      one(1),
      /^#VALUE! rows of readings: 2 for 3 reference temperatures$/,
    ],
    [
      rowOf(400, 900),
      one("K"),
      one(1),
      /^#VALUE! columns of readings: 1 for 2 reference temperatures in a row$/,
    ],
    [[[1, 2], [3, 4]], one("K"), one(1), /^#VALUE! reference: one row or one column, not 2 × 2$/], // biome-ignore format: a block
  ])("refuses %j of type %j in class %j", (points, type, className, message) => {
    expect(text(CHECKTABLE(points, good, type, className))).toMatch(message);
  });
});
