/** Uncertainties as a sheet hands them over: the GUM's and EA-4/02's numbers through the worksheet functions. */
import { describe, expect, it } from "vitest";
import {
  BUDGET,
  COMBINEDU,
  COVERAGE,
  EFFECTIVEDOF,
  REPORTVALUE,
  SIMULATEU,
  STANDARDU,
  TEMPERATUREU,
  TYPEA,
} from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const none = undefined;
const text = (cells: unknown[][]): unknown => readable(cells)[0]?.[0];
const number = (cells: unknown[][]): number => cells[0]?.[0] as number;

describe("TYPEA", () => {
  it("takes any range; blanks and errors are missing readings", () => {
    const readings = [
      [9, ""],
      [10, errorCell("#N/A")],
      [11, ""],
    ];
    expect(TYPEA(readings)).toEqual([
      ["metric", "value"],
      ["mean", 10],
      ["sd", 1],
      ["u", expect.closeTo(1 / Math.sqrt(3), 14)],
      ["dof", 2],
    ]);
    expect(TYPEA(readings, one("dof"))).toEqual(one(2));
  });

  it("drops no text in silence, and says what one reading cannot tell", () => {
    expect(text(TYPEA(columnOf(1, 2, "20,1")))).toBe(
      '#VALUE! readings: "20,1" is text, not a number (row 3)',
    );
    expect(text(TYPEA([[1, 2], [3, true]]))).toBe("#VALUE! readings: TRUE, not a number (row 2, column 2)"); // biome-ignore format: a block
    expect(readable(TYPEA(one(5))).slice(1)).toEqual([
      ["mean", 5],
      ["sd", "#N/A one reading has no standard deviation"],
      ["u", "#N/A one reading has no standard deviation"],
      ["dof", 0],
    ]);
    expect(text(TYPEA(columnOf("", "")))).toBe("#N/A no readings");
  });
});

describe("STANDARDU", () => {
  it("divides by the distribution's own divisor where none is given or its cell is blank", () => {
    expect(STANDARDU(columnOf(3, 3, 3), one("Normal"), columnOf("", 3, 1))).toEqual(columnOf(1.5, 1, 3));
    expect(number(STANDARDU(one(1), one("U shaped")))).toBeCloseTo(1 / Math.SQRT2, 14);
    expect(number(STANDARDU(one(1), one("resolution")))).toBeCloseTo(1 / Math.sqrt(12), 14);
    expect(number(STANDARDU(one(1), one("trapezoidal"), one(1)))).toBeCloseTo(1 / Math.sqrt(3), 14);
    expect(STANDARDU(rowOf(1, 2), columnOf("standard", "normal"))).toEqual([
      [1, 2],
      [0.5, 1],
    ]);
  });

  it.each([
    [1, "normal", 0, "#N/A divisor is 0 or an empty cell"],
    [0, "normal", "", "#N/A expanded uncertainty is 0 or an empty cell"],
    [-1, "uniform", "", "#N/A value -1 is below 0: give the half-width without sign"],
    [1, 0, "", "#N/A distribution is 0 or an empty cell"],
    [1, "", "", "#N/A distribution missing"],
    [1, "trapezoidal", "", "#N/A trapezoidal needs the ratio of its top to its bottom as divisor"],
    ["", "normal", 2, ""],
    [1, "normal", "two", '#VALUE! divisor: "two" is text, not a number'],
  ])("%s, %s, %s: %s", (value, distribution, divisor, result) => {
    expect(text(STANDARDU(one(value), one(distribution), one(divisor)))).toBe(result);
  });
});

describe("COMBINEDU and EFFECTIVEDOF", () => {
  it("reproduce GUM H.1 and H.3", () => {
    expect(number(COMBINEDU(columnOf(5.8, 3.9, 6.7)))).toBeCloseTo(9.7, 1);
    const r = -0.9304296;
    const correlated = COMBINEDU(columnOf(0.00287759784, 0.00066793877), columnOf("", 10), [
      [1, r],
      [r, 1],
    ]);
    expect(number(correlated)).toBeCloseTo(0.0041, 4);
    expect(number(EFFECTIVEDOF(rowOf(5.8, 3.9, 6.7), rowOf(24, 5, 8)))).toBeCloseTo(25.4, 1);
  });

  it("take a blank sensitivity for 1 and blank degrees of freedom for infinite, and pass over blank rows", () => {
    expect(number(COMBINEDU(columnOf(3, "", 2), columnOf("", "", 2)))).toBeCloseTo(5, 14);
    expect(number(EFFECTIVEDOF(columnOf(3, "", 4), columnOf(9, "", "")))).toBeCloseTo(625 / 9, 10);
    expect(EFFECTIVEDOF(columnOf(3, 4), columnOf("", 1e99))).toEqual(one(1e99));
    expect(number(EFFECTIVEDOF(columnOf(3, 2), columnOf(9, ""), columnOf("", 2)))).toBeCloseTo(625 / 9, 10);
  });

  it.each([
    [COMBINEDU(columnOf(3, "", 4), columnOf("", "", 0)), "#N/A row 3: sensitivity is 0 or an empty cell"],
    [COMBINEDU(columnOf(3, ""), columnOf(1, 1)), "#N/A row 2: uncertainty missing"],
    [COMBINEDU(columnOf(3, -4)), "#N/A row 2: uncertainty -4 is below 0"],
    [COMBINEDU(columnOf("", "")), "#N/A no uncertainties"],
    [COMBINEDU(columnOf(1, "x")), '#VALUE! uncertainties, row 2: "x" is text, not a number'],
    [COMBINEDU(columnOf(1, errorCell("#NUM!"))), "#NUM!"],
    [COMBINEDU(columnOf(1, 2), none, columnOf(1, 1)), "#VALUE! correlations: 2 × 1 for 2 uncertainties"],
    [
      COMBINEDU(columnOf(1, 2), columnOf(1)),
      "#VALUE! uncertainties and sensitivities differ in number, 2 and 1",
    ],
    [EFFECTIVEDOF(columnOf(3, 4), columnOf(9, 0)), "#N/A row 2: degrees of freedom is 0 or an empty cell"],
    [
      EFFECTIVEDOF(columnOf(3, 4), columnOf("∞", 1)),
      '#VALUE! degrees of freedom, row 1: "∞" is text, not a number: 1E+99 stands for infinite',
    ],
    [EFFECTIVEDOF(columnOf(0, 0), columnOf(1, 1)), "#N/A every contribution is 0"],
  ])("%# is refused", (cells, message) => {
    expect(text(cells)).toBe(message);
  });
});

describe("COVERAGE", () => {
  it("is GUM table G.2, truncates, and is 2 exactly for infinite degrees of freedom", () => {
    expect(COVERAGE(columnOf(1e99, "", 1e300))).toEqual(columnOf(2, "", 2));
    expect(number(COVERAGE(one(16.7), one(0.99)))).toBeCloseTo(2.92, 2);
    expect(COVERAGE(one(9.9999999))).toEqual(COVERAGE(one(10)));
  });

  it("has none below one degree of freedom; a probability that is none spoils the call", () => {
    expect(readable(COVERAGE(columnOf(0.5, 0)))).toEqual(
      columnOf("#N/A degrees of freedom 0.5 is below 1", "#N/A degrees of freedom is 0 or an empty cell"),
    );
    expect(readable(COVERAGE(columnOf(5, 6), one(95)))).toEqual(
      one("#N/A probability 95 is not between 0 and 1 (95 % is 0.95)"),
    );
  });
});

/** EA-4/02 M:2013, supplement 1, S5, as it is typed: blank divisors, sensitivities and degrees of freedom. */
const furnace = [
  ["temperature of reference thermometers", 0.1, "standard", "", "", 9],
  ["voltmeter calibration", 2, "normal", "", 0.077, ""],
  ["voltmeter resolution", 0.5, "rectangular", "", 0.077, ""],
  ["reversing switch", 2, "Rectangular", "", 0.077, ""],
  ["reference point", 0.1, "rectangular", "", -0.407, ""],
  ["", "", "", "", "", ""],
  ["reference thermocouples", 0.3, "NORMAL", 2, "", ""],
  ["drift of references", 0.3, " rectangular ", "", "", 1e99],
  ["furnace non-uniformity", 1, "rectangular", "", "", ""],
];
const emf = [
  ["voltmeter indication", 1.6, "standard", "", "", 9],
  ["voltmeter calibration", 2, "normal", "", "", ""],
  ["voltmeter resolution", 0.5, "rectangular", "", "", ""],
  ["reversing switch", 2, "rectangular", "", "", ""],
  ["compensating cables", 5, "rectangular", "", "", ""],
  ["furnace", 0.641, "standard", "", 1 / 0.026, 50],
  ["reference point", 0.1, "rectangular", "", -1 / 0.039, ""],
];

describe("BUDGET", () => {
  it("EA-4/02 S5, furnace: u = 0.641 °C, U = 1.3 °C, and the report says 1000.5 ± 1.3", () => {
    expect(number(BUDGET(furnace, none, one("combined")))).toBeCloseTo(0.641, 3);
    expect(number(BUDGET(furnace, none, one("k")))).toBeCloseTo(2, 2);
    const expanded = BUDGET(furnace, none, one("expanded"));
    expect(number(expanded)).toBeCloseTo(1.3, 1);
    expect(REPORTVALUE(one(1000.5), expanded)).toEqual(one("1000.5 ± 1.3"));
  });

  it("EA-4/02 S5, EMF: u = 25.0 µV, U = 50 µV, and the report says 36229 ± 50", () => {
    const combined = number(BUDGET(emf, none, one("combined")));
    expect(combined).toBeCloseTo(25, 1);
    expect(REPORTVALUE(one(36228.77), one(2 * combined))).toEqual(one("36229 ± 50"));
  });

  it("spills a header, the lines as they are worked out, and the sums under the contributions", () => {
    const cells = BUDGET(furnace);
    expect(cells[0]).toEqual([
      "quantity",
      "value",
      "distribution",
      "divisor",
      "standard uncertainty",
      "sensitivity",
      "contribution",
      "degrees of freedom",
      "share",
    ]);
    expect(cells[1]).toEqual([
      "temperature of reference thermometers",
      0.1,
      "standard",
      1,
      0.1,
      1,
      0.1,
      9,
      expect.closeTo((0.1 / 0.641) ** 2, 4),
    ]);
    expect(cells[6]).toEqual([
      "reference thermocouples",
      0.3,
      "normal",
      2,
      0.15,
      1,
      0.15,
      "∞",
      expect.closeTo((0.15 / 0.641) ** 2, 4),
    ]);
    expect(cells.slice(9).map((row) => row[0])).toEqual([
      "combined standard uncertainty",
      "effective degrees of freedom",
      "coverage probability",
      "coverage factor k",
      "expanded uncertainty U",
    ]);
    for (const [at, metric] of [
      [9, "combined"],
      [10, "dof"],
      [12, "k"],
      [13, "expanded"],
    ] as const) {
      expect(cells[at]?.[6]).toBe(number(BUDGET(furnace, none, one(metric))));
    }
    expect(new Set(cells.map((row) => row.length))).toEqual(new Set([9]));
  });

  it("gives contributions and shares beside the lines, blank where they are; the shares add to one", () => {
    const shares = BUDGET(furnace, none, one("shares")).map(([share]) => share);
    expect(shares).toHaveLength(furnace.length);
    expect(shares[5]).toBe("");
    expect(
      shares.reduce((sum: number, share) => sum + (share === "" ? 0 : (share as number)), 0),
    ).toBeCloseTo(1, 12);
    expect(BUDGET(furnace, none, one("contributions"))[6]).toEqual([0.15]);
  });

  it("does with three, four or five columns, a given probability, and infinite degrees of freedom", () => {
    const two = [
      ["certificate", 0.6, "normal"],
      ["repeatability", 0.4, "standard"],
    ];
    expect(number(BUDGET(two, none, one("expanded")))).toBeCloseTo(1, 14);
    expect(BUDGET(two, none, one("dof"))).toEqual(one(1e99));
    expect(BUDGET(two)[4]?.[6]).toBe("∞");
    // 1.960 for 95 % of a normal distribution.
    expect(number(BUDGET(two, one(0.95), one("k")))).toBeCloseTo(1.96, 3);
    expect(number(BUDGET([["a", 0.6, "normal", 3, -2]], none, one("combined")))).toBeCloseTo(0.4, 14);
  });

  const before = ["certificate", 0.6, "normal", "", "", ""];
  it.each([
    [
      ["Drift", 0.5, "squarish", "", "", ""],
      /^#VALUE! row 3 \(Drift\): distribution "squarish" is unknown: normal, /,
    ],
    [
      ["Drift", "± 0.5", "normal", "", "", ""],
      '#VALUE! row 3 (Drift), value: "± 0.5" is text, type the number without ±',
    ],
    [
      ["Drift", "+/- 0.5", "normal", "", "", ""],
      '#VALUE! row 3 (Drift), value: "+/- 0.5" is text, type the number without ±',
    ],
    [["Drift", "0,5", "normal", "", "", ""], '#VALUE! row 3 (Drift), value: "0,5" is text, not a number'],
    [
      ["Drift", -0.5, "uniform", "", "", ""],
      "#N/A row 3 (Drift): value -0.5 is below 0: give the half-width without sign",
    ],
    [["Drift", "", "normal", "", "", ""], "#N/A row 3 (Drift): value missing"],
    [["Drift", 0.5, "", "", "", ""], "#N/A row 3 (Drift): distribution missing"],
    [["Drift", 0.5, "normal", 0, "", ""], "#N/A row 3 (Drift): divisor is 0 or an empty cell"],
    [["Drift", 0.5, "normal", "", 0, ""], "#N/A row 3 (Drift): sensitivity is 0 or an empty cell"],
    [["Drift", 0.5, "normal", "", "", 0], "#N/A row 3 (Drift): degrees of freedom is 0 or an empty cell"],
    [
      ["Drift", 0.5, "trapezoidal", "", "", ""],
      "#N/A row 3 (Drift): trapezoidal needs the ratio of its top to its bottom as divisor",
    ],
    [["", 0.5, "boxy", "", "", ""], /^#VALUE! row 3: distribution "boxy" is unknown/],
    // An empty row of the desktop.
    [[0, 0, 0, 0, 0, 0], "#N/A row 3, distribution: 0 or an empty cell"],
    [["Drift", errorCell("#DIV/0!"), "normal", "", "", ""], "#DIV/0!"],
    [
      ["Drift", 0.5, "normal", "", "", "∞"],
      '#VALUE! row 3 (Drift), degrees of freedom: "∞" is text, not a number: 1E+99 stands for infinite',
    ],
  ])("names the row of %j as it was typed", (row, message) => {
    const cell = text(BUDGET([before, ["", "", "", "", "", ""], row]));
    if (message instanceof RegExp) expect(cell).toMatch(message);
    else expect(cell).toBe(message);
  });

  it("wants no header row, three to six columns, and at least one line that counts", () => {
    expect(
      text(
        BUDGET([
          ["Quantity", "Value", "Distribution"],
          ["a", 1, "normal"],
        ]),
      ),
    ).toBe('#VALUE! row 1 (Quantity), value: "Value" is text, not a number; leave the header row out');
    expect(text(BUDGET([["a", 1]]))).toBe(
      "#VALUE! lines: 3 to 6 columns (name, value, distribution, divisor, sensitivity, degrees of freedom), not 2",
    );
    expect(text(BUDGET([["", "", ""]]))).toBe("#N/A the budget has no lines");
    expect(text(BUDGET([["a", 0, "standard"]]))).toBe("#N/A every contribution is 0");
    expect(text(BUDGET([["a", 1, "normal"]], one(95)))).toBe(
      "#N/A probability 95 is not between 0 and 1 (95 % is 0.95)",
    );
  });
});

describe("TEMPERATUREU", () => {
  it("works cell by cell and scales with the degree of the call", () => {
    const inCelsius = TEMPERATUREU(
      columnOf(100, 500),
      one("K"),
      one(5),
      one(0.3),
      one(20),
      one(0.1),
      one(0.001),
    );
    const inFahrenheit = TEMPERATUREU(
      columnOf(212, 932),
      one("K"),
      one(5),
      one(0.54),
      one(68),
      one(0.18),
      one(0.001),
      one("F"),
    );
    for (const row of [0, 1])
      expect(inFahrenheit[row]?.[0]).toBeCloseTo(1.8 * (inCelsius[row]?.[0] as number), 12);
    // 39.45 µV/°C at 0 °C.
    expect(number(TEMPERATUREU(one(0), one("K"), one(39.45), one(0), one(0)))).toBeCloseTo(1, 4);
  });

  it("names what is missing or negative in words", () => {
    expect(readable(TEMPERATUREU(one(100), one("K"), columnOf("", "a", 1), one(0), one(20)))).toEqual([
      ["#N/A uncertainty of the EMF missing"],
      ['#VALUE! uncertainty of the EMF: "a" is text, not a number'],
      [expect.any(Number)],
    ]);
    expect(text(TEMPERATUREU(one(212), one("K"), one(1), one(-1.8), one(68), none, none, one("F")))).toBe(
      "#N/A uncertainty of the reference temperature -1.8 °F is below 0",
    );
  });
});

describe("SIMULATEU", () => {
  const simulated = (...more: (unknown[][] | undefined)[]): unknown[][] =>
    readable(SIMULATEU(one(41.276), one("K"), one(0), one(5), one(0.2), none, one(20000), ...more));

  it("agrees with the first-order result, and gives each metric alone", () => {
    const cells = simulated();
    expect(cells.map(([metric]) => metric)).toEqual([
      "metric",
      "mean",
      "standard",
      "low",
      "high",
      "shortest_low",
      "shortest_high",
      "validated",
    ]);
    const u = number(TEMPERATUREU(one(1000), one("K"), one(5), one(0.2), one(0)));
    expect(Math.abs((cells[2]?.[1] as number) / u - 1)).toBeLessThan(0.03);
    for (const [metric, value] of cells.slice(1)) expect(simulated(none, one(metric))).toEqual(one(value));
  });

  it("repeats with the same seed, and scales with the unit", () => {
    expect(simulated()).toEqual(simulated(one(1)));
    expect(simulated()).not.toEqual(simulated(one(2)));
    const standard = (...call: Parameters<typeof SIMULATEU>): number => number(SIMULATEU(...call));
    const inCelsius = standard(
      one(4),
      one("K"),
      one(20),
      one(5),
      one(0.2),
      none,
      one(2000),
      none,
      one("standard"),
    );
    const inFahrenheit = standard(
      one(4),
      one("K"),
      one(68),
      one(5),
      one(0.36),
      none,
      one(2000),
      none,
      one("standard"),
      one("F"),
    );
    expect(inFahrenheit).toBeCloseTo(1.8 * inCelsius, 9);
  });

  it.each([
    [[54.8, 50, 0.2, 1000], /^#N\/A \d+ of 1000 trials are outside the range of type K$/],
    [[41, 0, 0, 1000], /^#N\/A every uncertainty is 0$/],
    [[41, 1, 0.1, 10], /^#N\/A trials 10: a whole number from 1000 to 10000000$/],
    [[90, 1, 0.1, 1000], /^#N\/A EMF 90 mV .* type K/],
  ])("%j is refused", ([mv, uEmf, uReference, trials], message) => {
    expect(text(SIMULATEU(one(mv), one("K"), one(0), one(uEmf), one(uReference), none, one(trials)))).toMatch(
      message,
    );
  });
});

describe("REPORTVALUE", () => {
  it("rounds value and U together, cell by cell", () => {
    expect(readable(REPORTVALUE(columnOf(20, "", 1, 1), columnOf(0.123, 1, 0, "")))).toEqual(
      columnOf(
        "20.00 ± 0.12",
        "",
        "#N/A expanded uncertainty is 0 or an empty cell",
        "#N/A expanded uncertainty missing",
      ),
    );
    expect(REPORTVALUE(one(1), one(1.4), one(1))).toEqual(one("1 ± 2"));
    expect(readable(REPORTVALUE(columnOf(1, 2), one(1), one(0.5)))).toEqual(
      one("#VALUE! digits 0.5: a whole number from 1 to 4"),
    );
  });
});
