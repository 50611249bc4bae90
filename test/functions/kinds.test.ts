/** How a cell of each kind is read: which words count, and what is said of the others. */
import { describe, expect, it } from "vitest";
import {
  BUDGET,
  CALFIT,
  CONFORMITY,
  COVERAGE,
  EMF,
  LEADERROR,
  RAMPRATE,
  SEEBECK,
  STANDARDU,
  SURVEYSENSORS,
  TOLERANCE,
  TYPEINFO,
} from "../../src/functions";
import { columnOf, one, readable, rowOf } from "./call";

const none = undefined;
const said = (cells: unknown[][]): unknown => readable(cells)[0]?.[0];
const unknown = (type: string): string =>
  `type "${type}" is unknown: B C E J K N R S T A, or conductors such as Au/Pt`;

describe("a text in a message", () => {
  it("is whole up to 24 characters and cut above", () => {
    expect(said(EMF(one("x".repeat(24)), one("K")))).toBe(
      `#VALUE! temperature: "${"x".repeat(24)}" is text, not a number`,
    );
    expect(said(EMF(one("x".repeat(25)), one("K")))).toBe(
      `#VALUE! temperature: "${"x".repeat(23)}…" is text, not a number`,
    );
  });
});

describe("an option", () => {
  it("is a word in upper or lower case with spaces around it", () => {
    const low = TYPEINFO(one("K"), one("low"));
    for (const word of ["LOW", " low ", "Low\t"]) expect(TYPEINFO(one("K"), one(word))).toEqual(low);
  });

  it("is named with all the words when it is none of them", () => {
    const ramp = (timeUnit: unknown) => said(RAMPRATE(columnOf(0, 1), columnOf(0, 1), none, one(timeUnit)));
    expect(ramp("days")).toBe('#VALUE! time unit: "days" is none of h, min, s');
    expect(ramp(60)).toBe('#VALUE! time unit: "60" is none of h, min, s');
    expect(ramp("m".repeat(25))).toBe(`#VALUE! time unit: "${"m".repeat(23)}…" is none of h, min, s`);
  });
});

describe("a time unit", () => {
  it.each([
    ["h", 60],
    ["min", 1],
    ["s", 1 / 60],
    [undefined, 1440],
  ])("%s is %d minutes", (word, minutes) => {
    // One degree per unit of time.
    const rate = RAMPRATE(columnOf(0, 1), columnOf(0, 1), none, word === undefined ? none : one(word));
    expect(rate[1]?.[0]).toBeCloseTo(1 / minutes, 12);
  });
});

describe("a unit of temperature", () => {
  it.each([
    ["F", 32],
    [" f ", 32],
    ["K", 273.15],
    ["k", 273.15],
    ["R", 491.67],
    [" c", 0],
  ])('"%s" has the ice point at %d', (symbol, zero) => {
    expect(EMF(one(zero), one("K"), none, one(symbol))).toEqual(one(0));
  });

  it("is refused when it is another", () => {
    expect(said(SEEBECK(one(1), one("K"), one("celsius")))).toBe(
      '#VALUE! unit: "celsius" is none of C, F, K, R',
    );
    expect(said(SEEBECK(one(1), one("K"), one(0)))).toBe('#VALUE! unit: "0" is none of C, F, K, R');
  });
});

describe("a thermocouple type", () => {
  it.each([" L ", "l"])('that differs between standards, "%s", is not guessed', (letter) => {
    expect(said(EMF(one(1), one(letter)))).toBe(
      `#VALUE! type "${letter.trim()}" means different couples in different standards: write "Chromel/Copel" for that of GOST R 8.585`,
    );
    expect(said(EMF(one(1), one("M")))).toContain('write "Cu/Copel" for that of GOST R 8.585');
  });

  it("that is unknown is named as it stands", () => {
    expect(said(EMF(one(1), one(" Q ")))).toBe(`#VALUE! ${unknown(" Q ")}`);
    expect(said(EMF(one(1), one(true)))).toBe(`#VALUE! ${unknown("true")}`);
  });
});

describe("a sensor", () => {
  it.each(["Pt", " pt ", "type PT", "TypePt"])('"%s" is the platinum sensor', (word) => {
    // IEC 60751: class B is ±(0.3 + 0.005·|t|).
    expect(TOLERANCE(one(100), one(word), one("B"))[0]?.[0]).toBeCloseTo(0.8, 12);
  });

  it.each(["Pt100", "x Pt", "type"])('"%s" is none', (word) => {
    expect(said(TOLERANCE(one(100), one(word), one(1)))).toBe(`#VALUE! ${unknown(word)}, or Pt`);
  });
});

describe("a lead", () => {
  const lead = (word: unknown) => LEADERROR(one(500), one("K"), one(word), one(60), one(20));

  it("of the couple's own alloys makes no error", () => {
    for (const word of ["K", "KX", " kx ", "type k"]) expect(lead(word)[0]?.[0]).toBeCloseTo(0, 9);
  });

  it("of copper leaves out what the run should have added", () => {
    // The head then is the reference junction: E(ind) = E(500) − E(60) + E(20).
    const emf = (t: number) => EMF(one(t), one("K"))[0]?.[0] as number;
    const error = lead("copper")[0]?.[0] as number;
    expect(emf(500 + error)).toBeCloseTo(emf(500) - emf(60) + emf(20), 9);
    for (const word of ["COPPER", " Copper "]) expect(lead(word)).toEqual([[error]]);
  });

  it("of another couple's extension cable is that couple", () => {
    expect(lead("JX")).toEqual(lead("J"));
    expect(lead("JX")[0]?.[0]).toBeGreaterThan(0);
  });

  it.each([
    ["KC", "KC"],
    [" kca ", "KCA"],
    ["KCB", "KCB"],
    ["NC", "NC"],
    ["RCA", "RCA"],
    ["SCB", "SCB"],
    ["BC", "BC"],
  ])('that is a compensating cable, "%s", is refused', (word, name) => {
    expect(said(lead(word))).toBe(
      `#VALUE! lead "${name}" is a compensating cable: it has no reference function, only a tolerance (CABLETOLERANCE)`,
    );
  });

  it.each(["KCC", "XKC", "KCAB", "AX", "KXX", "coppers", "TC"])(
    'that is unknown, "%s", is refused',
    (word) => {
      expect(said(lead(word))).toBe(`#VALUE! ${unknown(word)}, or copper`);
    },
  );
});

describe("degrees of freedom", () => {
  it("that are typed as infinite are told how", () => {
    for (const word of ["∞", " inf", "Infinite"]) {
      expect(said(COVERAGE(one(word)))).toBe(
        `#VALUE! degrees of freedom: "${word}" is text, not a number: 1E+99 stands for infinite`,
      );
    }
  });

  it("that are other texts or no number are refused as any number", () => {
    expect(said(COVERAGE(one("about ∞")))).toBe(
      '#VALUE! degrees of freedom: "about ∞" is text, not a number',
    );
    expect(said(COVERAGE(one("many")))).toBe('#VALUE! degrees of freedom: "many" is text, not a number');
    expect(said(COVERAGE(one(Number.POSITIVE_INFINITY)))).toBe(
      "#VALUE! degrees of freedom: not a finite number",
    );
  });

  it("beyond 1E+99 are infinite too", () => {
    const table = BUDGET([["drift", 1, "standard", "", "", 1e200]]);
    expect(table.flat()).toContain("∞");
    expect(table.flat()).not.toContain(1e200);
    const finite = BUDGET([["drift", 1, "standard", "", "", 8]]);
    expect(finite.flat()).toContain(8);
    expect(finite.flat()).not.toContain("∞");
  });
});

describe("a distribution", () => {
  it("of 0 may be an empty cell", () => {
    expect(said(STANDARDU(one(1), one(0)))).toBe("#N/A distribution is 0 or an empty cell");
  });
});

describe("a lower limit", () => {
  it("is a number, or none in any case and with spaces", () => {
    const above = (lower: unknown) => CONFORMITY(one(1), one(1), one(0.5), one(lower));
    // At the upper limit half of the probability lies below it.
    for (const word of ["none", " None ", "NONE"]) expect(above(word)[0]?.[0]).toBeCloseTo(0.5, 12);
    expect(above(1)[0]?.[0]).not.toBeCloseTo(0.5, 3);
    expect(said(above(true))).toBe("#VALUE! lower limit: TRUE, not a number");
    expect(said(above("no"))).toBe('#VALUE! lower limit: "no" is neither a number nor none');
  });
});

describe("a name", () => {
  it("is a text or a number, but not TRUE or FALSE", () => {
    const sensors = (...names: unknown[]) =>
      SURVEYSENSORS(columnOf(0, 60), [[900, 900], [900, 900]], one(900), one(5), none, rowOf(...names), none, none, one("min"), one("sensor")); // biome-ignore format: one call
    expect(sensors("top", 7)).toEqual(columnOf("top", 7));
    expect(said(sensors("top", false))).toBe("#VALUE! names, column 2: FALSE, not a name");
    expect(said(sensors(true, 7))).toBe("#VALUE! names, column 1: TRUE, not a name");
  });
});

describe("TRUE or FALSE", () => {
  const fitted = (throughZero: unknown) =>
    CALFIT(columnOf(0, 100, 200), columnOf(1, 2, 3), one(1), none, one(throughZero), one("coefficients"));

  it("is a boolean or its word, in any case and with spaces", () => {
    const whole = fitted(false);
    // 1 + t/100 has a constant; without one the points give (2·100 + 3·200) / (100² + 200²).
    expect(whole).toEqual(columnOf(expect.closeTo(1, 12), expect.closeTo(0.01, 12)));
    const through = fitted(true);
    expect(through.flat().at(-1)).toBeCloseTo(0.016, 12);
    for (const word of ["TRUE", " true "]) expect(fitted(word)).toEqual(through);
    for (const word of ["FALSE", "false "]) expect(fitted(word)).toEqual(whole);
  });

  it("is not a number, which may be an empty cell, nor another word", () => {
    expect(said(fitted(0))).toBe("#VALUE! through zero: 0 is neither TRUE nor FALSE");
    expect(said(fitted(1))).toBe("#VALUE! through zero: 1 is neither TRUE nor FALSE");
    expect(said(fitted(" yes "))).toBe('#VALUE! through zero: "YES" is neither TRUE nor FALSE');
    expect(said(fitted(Number.NaN))).toBe("#VALUE! through zero: not a finite number");
  });
});
