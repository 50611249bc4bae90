/** Certificates, deviation functions and drift as a sheet hands them over. */
import { describe, expect, it } from "vitest";
import {
  CALDRIFT,
  CALEMF,
  CALFIT,
  CALTEMPERATURE,
  CORRECTED,
  CORRECTION,
  CORRECTIONU,
  DEVIATION,
} from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const none = undefined;

describe("a certificate", () => {
  const points = columnOf(0, 400, 800);
  const values = columnOf(-0.5, -1.5, -3.5);

  it("corrects a block and leaves blanks, texts and errors where they are", () => {
    const readings = [
      [200, 600],
      ["", 900],
      ["open", errorCell("#N/A")],
    ];
    expect(readable(CORRECTED(readings, points, values))).toEqual([
      [199, 597.5],
      ["", "#N/A reading 900 °C is outside the certificate's points, 0 °C to 800 °C"],
      ['#VALUE! reading: "open" is text, not a number', "#N/A"],
    ]);
  });

  it("may fall, lie in a row, and give errors instead of corrections", () => {
    const falling = CORRECTION(one(200), rowOf(800, 400, 0), rowOf(3.5, 1.5, 0.5), one("error"));
    expect(falling).toEqual(CORRECTION(one(200), points, values));
  });

  it("may differ by column, with the sensors in columns or, where the points lie in a row, in rows", () => {
    const bySensor = [
      [-0.5, 1],
      [-1.5, 2],
      [-3.5, 3],
    ];
    const readings = rowOf(200, 200);
    expect(CORRECTION(readings, points, bySensor)).toEqual([[-1, 1.5]]);
    const across = [
      [-0.5, -1.5, -3.5],
      [1, 2, 3],
    ];
    expect(CORRECTION(readings, rowOf(0, 400, 800), across)).toEqual([[-1, 1.5]]);
    expect(readable(CORRECTION(rowOf(200, 200, 200), points, bySensor))[0]?.[2]).toBe(
      "#N/A column 3 has no certificate: values has 2 columns",
    );
  });

  it("catches an empty row at its end, which arrives as 0", () => {
    expect(readable(CORRECTION(one(200), columnOf(0, 400, 800, 0), columnOf(-0.5, -1.5, -3.5, 0)))).toEqual([
      [expect.stringMatching(/^#VALUE! .*point 4 is 0 °C \(0 or an empty cell\) after 800 °C/)],
    ]);
    expect(readable(CORRECTION(one(200), columnOf(0, 400, ""), columnOf(1, 2, 3)))).toEqual([
      ["#VALUE! points, row 3: the cell is blank"],
    ]);
  });

  it("passes an error among its points on as the result of the whole call", () => {
    expect(readable(CORRECTION(columnOf(1, 2), columnOf(0, errorCell("#DIV/0!")), columnOf(1, 2)))).toEqual([
      ["#DIV/0!"],
    ]);
  });

  it("says so when points and values differ in number", () => {
    expect(readable(CORRECTION(one(1), columnOf(0, 10), columnOf(1, 2, 3)))).toEqual([
      ["#VALUE! points and values differ in number, 2 and 3"],
    ]);
  });

  it("takes the correction at the set point of a survey when told to", () => {
    expect(CORRECTED(columnOf(410, 390), points, values, none, none, none, one(400))).toEqual(
      columnOf(408.5, 388.5),
    );
    expect(readable(CORRECTED(one(410), points, values, none, none, none, one(900)))).toEqual([
      ["#N/A temperature of the correction 900 °C is outside the certificate's points, 0 °C to 800 °C"],
    ]);
  });

  it("moves points that are true temperatures by their own errors", () => {
    // Reads 802 at a true 800: its correction of −2 belongs to a reading of 802.
    const cells = CORRECTED(one(802), columnOf(400, 800), columnOf(-1, -2), none, none, one("true"));
    expect(cells[0]?.[0]).toBeCloseTo(800, 9);
  });

  it("means degrees of the call's unit, corrections without the offset", () => {
    const inFahrenheit = CORRECTED(
      one(212),
      columnOf(32, 392),
      columnOf(1.8, 3.6),
      none,
      none,
      none,
      none,
      one("F"),
    );
    expect(inFahrenheit[0]?.[0]).toBeCloseTo(212 + 2.7, 9);
  });

  it("refuses too few points for a fit", () => {
    expect(readable(CORRECTION(one(1), points, values, none, one("fit2")))).toEqual([
      ["#N/A a fit of order 2 needs at least 4 points; the certificate has 3"],
    ]);
  });

  it("has the larger of two uncertainties between its points, and a drift allowance over √3", () => {
    const u = CORRECTIONU(columnOf(0, 200), points, columnOf(0.6, 0.8, 1.0), none, one(0.3));
    expect(u[0]?.[0]).toBeCloseTo(Math.sqrt(0.3 ** 2 + 0.3 ** 2 / 3), 12);
    expect(u[1]?.[0]).toBeCloseTo(Math.sqrt(0.4 ** 2 + 0.3 ** 2 / 3), 12);
    expect(readable(CORRECTIONU(one(200), points, columnOf(0.6, 0, 1)))[0]?.[0]).toMatch(
      /point 2 is 0 or an empty cell/,
    );
  });
});

describe("CALFIT", () => {
  const temperatures = columnOf(100, 200, "", 300, 400);
  const deviations = columnOf(3, 5, 99, 7, 9);

  it("drops blank rows, counts them, and spills a header, the coefficients and the quality of the fit", () => {
    const cells = CALFIT(temperatures, deviations, one(1));
    expect(cells[0]).toEqual(["quantity", "value", "standard uncertainty"]);
    expect(cells.map(([quantity]) => quantity)).toEqual([
      "quantity",
      "c0",
      "c1",
      "residual_sd",
      "dof",
      "reduced_chi2",
      "largest_residual",
      "dropped rows",
    ]);
    expect(cells[1]?.[1]).toBeCloseTo(1, 9);
    expect(cells[2]?.[1]).toBeCloseTo(0.02, 12);
    expect(cells[4]?.[1]).toBe(2);
    expect(cells[7]?.[1]).toBe(1);
  });

  it("gives a square covariance matrix, and its coefficients to CALTEMPERATURE", () => {
    const covariance = CALFIT(
      temperatures,
      deviations,
      one(1),
      one(1).concat(columnOf(1, 1, 1, 1)),
      none,
      one("covariance"),
    );
    expect(covariance.map((row) => row.length)).toEqual([2, 2]);
    expect(covariance[0]?.[1]).toBe(covariance[1]?.[0]);
    const coefficients = CALFIT(temperatures, deviations, one(1), none, none, one("coefficients"));
    const emf = CALEMF(one(250), one("K"), coefficients, one(100), one(400));
    const t = CALTEMPERATURE(emf, one("K"), coefficients, one(100), one(400), one(0));
    expect(t[0]?.[0]).toBeCloseTo(250, 9);
  });

  it("goes through zero on request, and takes no number for TRUE", () => {
    const through = CALFIT(
      columnOf(100, 200, 300),
      columnOf(2, 4, 6),
      one(1),
      none,
      one(true),
      one("coefficients"),
    );
    expect(through[0]?.[0]).toBe(0);
    expect(through[1]?.[0]).toBeCloseTo(0.02, 12);
    expect(readable(CALFIT(columnOf(100, 200), columnOf(2, 4), one(1), none, one(1)))).toEqual([
      ["#VALUE! through zero: 1 is neither TRUE nor FALSE"],
    ]);
  });

  it("names a missing uncertainty and a mismatch", () => {
    expect(readable(CALFIT(columnOf(1, 2), columnOf(1, 2), one(0), columnOf(1, "")))).toEqual([
      ["#VALUE! uncertainties, row 2: the cell is blank beside a point"],
    ]);
    expect(readable(CALFIT(columnOf(1, 2, 3), columnOf(1, 2), one(0)))).toEqual([
      ["#VALUE! temperatures and deviations differ in number, 3 and 2"],
    ]);
  });
});

describe("a calibrated couple", () => {
  it("is refused where its function turns back, and outside its calibration", () => {
    const turning = columnOf(0, 0, -0.2);
    expect(readable(CALTEMPERATURE(one(4), one("K"), turning, one(0), one(1000), one(0)))[0]?.[0]).toMatch(
      /^#N\/A with these coefficients the EMF turns back at /,
    );
    expect(readable(CALTEMPERATURE(one(40), one("K"), one(10), one(0), one(500), one(0)))[0]?.[0]).toMatch(
      /^#N\/A the EMF comes to 40 mV, outside the calibrated range/,
    );
    expect(readable(CALEMF(one(600), one("K"), one(10), one(0), one(500)))).toEqual([
      ["#N/A temperature 600 °C is outside the calibrated range, 0 °C to 500 °C"],
    ]);
  });

  it("adds its own deviation at the reference junction when its wires reach it", () => {
    const own = CALEMF(
      one(100),
      one("K"),
      columnOf(5, 0.1),
      one(0),
      one(500),
      one(20),
      one("individual"),
    )[0]?.[0];
    const standard = CALEMF(one(100), one("K"), columnOf(5, 0.1), one(0), one(500), one(20))[0]?.[0];
    expect((standard as number) - (own as number)).toBeCloseTo((5 + 0.1 * 20) / 1000, 12);
  });
});

describe("DEVIATION", () => {
  it("in degrees is the indicated less the true temperature", () => {
    expect(DEVIATION(one(0), one("K"), one(25), one(25), one("degrees"))[0]?.[0]).toBeCloseTo(0, 9);
    const fahrenheit = DEVIATION(
      one(1),
      one("K"),
      one(77),
      one(77),
      one("degrees"),
      one("F"),
    )[0]?.[0] as number;
    const celsius = DEVIATION(one(1), one("K"), one(25), one(25), one("degrees"))[0]?.[0] as number;
    expect(fahrenheit).toBeCloseTo(celsius * 1.8, 9);
  });
});

describe("CALDRIFT", () => {
  it("spills points, drift, drift per year and the day it leaves its limit", () => {
    const cells = readable(
      CALDRIFT(
        columnOf(500, 900),
        columnOf(1, 1),
        columnOf(1.5, 1),
        one(40000),
        one(40365.25),
        columnOf(2, 2),
      ),
    );
    expect(cells[0]).toEqual(["point", "drift", "per_year", "leaves_limit_on"]);
    expect(cells[1]?.[2]).toBeCloseTo(0.5, 12);
    expect(cells[1]?.[3]).toBeCloseTo(40730.5, 6);
    expect(cells[2]?.[3]).toMatch(/^#N\/A/);
  });
});
