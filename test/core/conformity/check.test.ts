import { describe, expect, it } from "vitest";
import { type Refusal, temperatureUnits } from "../../../src/core";
import {
  type CheckRow,
  checkTable,
  classMet,
  type DecisionRule,
  decisionRule,
  type Statement,
  statement,
  type ToleranceClass,
  toleranceClass,
} from "../../../src/core/conformity";

const rule = (name: string): DecisionRule => decisionRule(name) as DecisionRule;
const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F");
const message = (found: unknown): string => (found as Refusal).message();
const class2 = toleranceClass("K", "2") as ToleranceClass;

describe("classMet", () => {
  it("is the tightest class that covers and passes every point", () => {
    expect(classMet([100, 400, 900], [1.5, 1.6, -3.6], "K")).toBe("1");
    expect(classMet([100, 400, 900], [1.6, 1.6, -3.6], "K")).toBe("2");
    expect(classMet([100, 400, 900], [2.6, 1.6, -3.6], "K")).toBe("none");
  });

  it("leaves out a class that does not cover a point", () => {
    expect(classMet([100, 1100], [0.1, 0.1], "K")).toBe("2");
    expect(classMet([-100, 20], [0.1, 0.1], "K")).toBe("3");
    expect(classMet([-100, 100], [0.1, 0.1], "K")).toBe("none");
  });

  it("goes by the limits, not by the number of the class", () => {
    // Class 2 of type B is tighter than class 3.
    expect(classMet([700], [3], "B")).toBe("3");
    expect(classMet([700], [1.7], "B")).toBe("2");
    expect(classMet([500], [1], "K", "ASTM")).toBe("special");
    expect(classMet([500], [3], "K", "ASTM")).toBe("standard");
    expect(classMet([20], [0.16], "Pt")).toBe("A");
  });

  it("passes at the limit", () => {
    expect(classMet([900, 20], [903.6 - 900, 0], "K")).toBe("1");
  });

  it("refuses what it cannot judge", () => {
    expect(message(classMet([1, 2], [1], "K"))).toBe("2 temperatures for 1 errors");
    expect(message(classMet([], [], "K"))).toBe("no points to judge");
    expect(message(classMet([1], [1], "A", "ASTM"))).toBe("ASTM has no tolerance class for type A");
    expect(message(classMet([1], [1], "Au/Pt"))).toBe("IEC has no tolerance class for Au/Pt");
  });
});

describe("checkTable", () => {
  const rows = (found: unknown): CheckRow[] => found as CheckRow[];

  it("has a row a reading, couple after couple", () => {
    const table = rows(
      checkTable({
        references: [400, 900],
        readings: [
          [401, 902.2],
          [403.5, 897],
        ],
        limits: class2,
        names: ["TC-01", "TC-02"],
      }),
    );
    expect(
      table.map(({ couple, reference, reading, verdict }) => [couple, reference, reading, verdict]),
    ).toEqual([
      ["TC-01", 400, 401, "Pass"],
      ["TC-01", 900, 902.2, "Pass"],
      ["TC-02", 400, 403.5, "Fail"],
      ["TC-02", 900, 897, "Pass"],
    ]);
    expect(table[1]?.error).toBeCloseTo(2.2, 9);
    expect(table[1]?.limit).toBe(6.75);
    expect(table[1]?.used).toBeCloseTo(2.2 / 6.75, 9);
    expect(table[3]?.used).toBeCloseTo(3 / 6.75, 9);
  });

  it("takes limits of a drawing, and an uncertainty, for all points or one a point", () => {
    const readings = [[101, 201]];
    const verdicts = (limits: number | number[], uncertainty: number | number[]): unknown[] =>
      rows(checkTable({ references: [100, 200], readings, limits, uncertainty })).map(
        ({ verdict }) => verdict,
      );
    expect(verdicts(1.2, 0.2)).toEqual(["Pass", "Pass"]);
    expect(verdicts([1.2, 1.1], 0.2)).toEqual(["Pass", "Fail"]);
    expect(verdicts(1.2, [0.2, 0.3])).toEqual(["Pass", "Fail"]);
  });

  it("uses the rule's words", () => {
    const [row] = rows(
      checkTable({
        references: [100],
        readings: [[101]],
        limits: 1,
        uncertainty: 0.2,
        rule: rule("conditional"),
      }),
    );
    expect(row?.verdict).toBe("Conditional pass");
  });

  it("numbers couples without names", () => {
    const table = rows(checkTable({ references: [100], readings: [[100], [100]], limits: 1 }));
    expect(table.map(({ couple }) => couple)).toEqual(["1", "2"]);
  });

  it("leaves the cells of a missing reading blank and goes on", () => {
    const table = rows(checkTable({ references: [100, 200], readings: [[Number.NaN, 200]], limits: 1 }));
    expect(table[0]).toEqual({
      couple: "1",
      reference: 100,
      reading: "",
      error: "",
      limit: 1,
      used: "",
      verdict: "",
    });
    expect(table[1]?.verdict).toBe("Pass");
  });

  it("refuses a reading without reference temperature", () => {
    const table = rows(
      checkTable({ references: [Number.NaN, Number.NaN], readings: [[100, Number.NaN]], limits: class2 }),
    );
    expect(message(table[0]?.verdict)).toBe("reference temperature missing");
    expect(table[0]?.reference).toBe("");
    expect(Object.values(table[1] as CheckRow)).toEqual(["1", "", "", "", "", "", ""]);
  });

  it("spoils only the rows outside the class", () => {
    const table = rows(checkTable({ references: [1300, 900], readings: [[1301, 901]], limits: class2 }));
    expect(table[0]?.error).toBe(1);
    expect(message(table[0]?.limit)).toBe(
      "temperature 1300 °C is outside class 2 of type K, -40 °C to 1200 °C",
    );
    expect(table[0]?.verdict).toBe(table[0]?.limit);
    expect(table[1]?.verdict).toBe("Pass");
  });

  it("refuses columns that do not fit each other", () => {
    expect(message(checkTable({ references: [1, 2], readings: [[1]], limits: 1 }))).toBe(
      "rows of readings: 1 for 2 reference temperatures",
    );
    expect(message(checkTable({ references: [1, 2], readings: [[1, 2]], limits: [1] }))).toBe(
      "limits: 1 for 2 reference temperatures",
    );
    expect(message(checkTable({ references: [1], readings: [[1]], limits: 1, names: ["a", "b"] }))).toBe(
      "names: 2 for 1 couples",
    );
    expect(message(checkTable({ references: [1], readings: [[1]], limits: 1, uncertainty: [] }))).toBe(
      "expanded uncertainties: 0 for 1 reference temperatures",
    );
    for (const [references, readings] of [
      [[], []],
      [[], [[]]],
      [[1], []],
    ] as const) {
      expect(message(checkTable({ references, readings, limits: 1 }))).toBe("no readings to check");
    }
  });

  it("refuses an error or a share of the limit that is no number", () => {
    const [far] = rows(checkTable({ references: [-1e308], readings: [[1e308]], limits: 1 }));
    expect(message(far?.error)).toBe("error is too large for a number");
    const [fine] = rows(checkTable({ references: [0], readings: [[1e300]], limits: 1e-300 }));
    expect(message(fine?.used)).toBe("used share is too large for a number");
    expect(fine?.verdict).toBe("Fail");
  });

  it("refuses a limit or an uncertainty of 0 in its row", () => {
    const [row] = rows(checkTable({ references: [1], readings: [[1]], limits: 0 }));
    expect(message(row?.verdict)).toBe("limit is 0 or an empty cell");
    const [other] = rows(checkTable({ references: [1], readings: [[1]], limits: 1, uncertainty: -0.9 }));
    const refused = other?.verdict as Refusal;
    expect(refused.message(fahrenheit)).toBe("expanded uncertainty -1.62 °F is below 0");
  });
});

describe("statement", () => {
  const sentence = (...given: Parameters<typeof statement>): string =>
    (statement(...given) as Statement).sentence();

  it("states verdict, rule, guard band, k and risk", () => {
    expect(sentence(1.2, 2.2, 0.5)).toBe(
      "Pass: the error of 1.2 °C lies within the acceptance limit of ±1.7 °C, the limit of ±2.2 °C less the guard band. " +
        "Decision rule: acceptance with a guard band (ILAC-G8:09/2019, 4.2.2), guard band 0.5 °C = U, k = 2. " +
        "Largest specific risk of a wrong Pass by this rule: at most 2.3 %.",
    );
  });

  it("states the simple rule", () => {
    expect(sentence(2, 2.2, 0.5, rule("simple"))).toBe(
      "Pass: the error of 2 °C lies within the limit of ±2.2 °C. " +
        "Decision rule: simple acceptance (ILAC-G8:09/2019, 4.2.1), no guard band, U = 0.5 °C, k = 2. " +
        "Largest specific risk of a wrong Pass by this rule: at most 50 %.",
    );
  });

  it.each([
    [
      2,
      "guarded",
      "Fail: the error of 2 °C lies within the limit of ±2.2 °C, but not within the acceptance limit of ±1.7 °C.",
    ],
    [-3, "guarded", "Fail: the error of -3 °C exceeds the limit of ±2.2 °C."],
    [
      2,
      "conditional",
      "Conditional pass: the error of 2 °C lies within the limit of ±2.2 °C, but not within the acceptance limit of ±1.7 °C.",
    ],
    [
      2.5,
      "conditional",
      "Conditional fail: the error of 2.5 °C exceeds the limit of ±2.2 °C, by no more than the guard band.",
    ],
    [2.5, "simple", "Fail: the error of 2.5 °C exceeds the limit of ±2.2 °C."],
    [
      -2.2,
      "guarded",
      "Fail: the error of -2.2 °C lies within the limit of ±2.2 °C, but not within the acceptance limit of ±1.7 °C.",
    ],
    [
      -1.7,
      "guarded",
      "Pass: the error of -1.7 °C lies within the acceptance limit of ±1.7 °C, the limit of ±2.2 °C less the guard band.",
    ],
  ])("an error of %d under the rule %s", (error, name, start) => {
    expect(sentence(error, 2.2, 0.5, rule(name)).startsWith(start)).toBe(true);
  });

  it("says that nothing could pass", () => {
    const text = sentence(0, 1, 1.5);
    expect(text).toMatch(
      /^Fail: the error of 0 °C lies within the limit of ±1 °C, but the guard band of 1.5 °C exceeds it\./,
    );
    expect(text).toMatch(/No error could pass\.$/);
  });

  it("prints differences in the unit of the call", () => {
    expect((statement(1, 2, 0.5) as Statement).sentence(fahrenheit)).toContain("the error of 1.8 °F");
  });

  it("names another multiple of U, and its risk with k", () => {
    expect(sentence(1, 2.2, 0.5, rule("guarded 0.83"), 1.96)).toContain(
      "guard band 0.415 °C = 0.83 × U, k = 1.96",
    );
    expect(sentence(1, 2.2, 0.5, rule("guarded 0.83"), 1.96)).toContain("at most 5.2 %");
    expect(sentence(1, 9, 1, rule("guarded 3"))).toContain("below 0.0001 %");
  });

  it("refuses what cannot be stated", () => {
    expect(message(statement(1, 2, 0))).toBe("expanded uncertainty is 0 or an empty cell");
    expect(message(statement(1, 2, 1, rule("guarded"), 0))).toBe("coverage factor is 0 or an empty cell");
    const inFahrenheit = (...given: Parameters<typeof statement>): string =>
      (statement(...given) as Refusal).message(fahrenheit);
    expect(inFahrenheit(1, -2, 1)).toBe("limit -3.6 °F is below 0");
    expect(inFahrenheit(1, 2, -1)).toBe("expanded uncertainty -1.8 °F is below 0");
    expect(message(statement(1, 2, 1e308, rule("guarded 3")))).toBe("guard band is too large for a number");
  });
});
