/** JCGM 100:2008 (GUM), annexes G and H. Inputs found in libraries' documentation; what is from memory says so. */
import { describe, expect, it } from "vitest";
import {
  type Budget,
  budget,
  combinedUncertainty,
  coverageFactor,
  effectiveDof,
  standardUncertainty,
  type TypeA,
  typeA,
} from "../../src/core/uncertainty";

describe("H.1, end-gauge calibration", () => {
  it("the difference of the gauges: u 9.7 nm with 25.6 degrees of freedom (from memory, recomputed)", () => {
    expect(combinedUncertainty([5.8, 3.9, 6.7])).toBeCloseTo(9.7, 1);
    const dof = effectiveDof([5.8, 3.9, 6.7], [24, 5, 8]) as number;
    // The GUM puts its rounded 9.7 into the formula; the unrounded 9.68 gives 25.4.
    const unrounded = Math.hypot(5.8, 3.9, 6.7);
    expect(dof * (9.7 / unrounded) ** 4).toBeCloseTo(25.6, 1);
    expect(dof).toBeCloseTo(25.4, 1);
  });

  it("the gauge: u = 32 nm, 16 degrees of freedom, t99 = 2.92, U99 = 93 nm", () => {
    // Sensitivities: l_S·θ̄ and l_S·α_S in nm, with l_S = 50 000 623 nm, θ = 0.1 °C, α_S = 11.5E-6 /°C.
    const length = 50000623;
    const found = budget(
      [
        { name: "standard", value: 25, distribution: "standard", dof: 18 },
        { name: "difference", value: 9.7, distribution: "standard", dof: 25.6 },
        { name: "expansion", value: 1e-6, distribution: "rectangular", sensitivity: 0.1 * length, dof: 50 },
        {
          name: "temperature",
          value: 0.05,
          distribution: "rectangular",
          sensitivity: 1.15e-5 * length,
          dof: 2,
        },
      ],
      0.99,
    ) as Budget;
    expect(found.rows.map(({ contribution }) => Number(contribution.toFixed(1)))).toEqual([
      25, 9.7, 2.9, 16.6,
    ]);
    expect(found.combined).toBeCloseTo(31.67, 1);
    expect(found.dof).toBeCloseTo(16.7, 0);
    expect(found.k).toBeCloseTo(2.92, 2);
    expect(Math.abs(found.expanded - 93)).toBeLessThan(1);
  });

  it("the arcsine distribution of a cyclic temperature, half-width 0.5 °C: u 0.35 °C", () => {
    expect(standardUncertainty(0.5, "u-shaped")).toBeCloseTo(0.35, 2);
  });
});

describe("H.2, resistance and reactance, correlated (observations from memory; they reproduce every printed value)", () => {
  const V = [5.007, 4.994, 5.005, 4.99, 4.999];
  const I = [19.663, 19.639, 19.64, 19.685, 19.678].map((mA) => mA / 1000);
  const phi = [1.0456, 1.0438, 1.0468, 1.0428, 1.0433];
  const [v, i, p] = [V, I, phi].map((readings) => typeA(readings) as { mean: number; u: number });
  const mean = [v?.mean, i?.mean, p?.mean] as [number, number, number];
  const u = [v?.u, i?.u, p?.u] as [number, number, number];
  const r = (a: number[], b: number[]): number => {
    const centred = (x: number[]): number[] => x.map((one) => one - x.reduce((s, y) => s + y, 0) / x.length);
    const product = (x: number[], y: number[]): number =>
      x.reduce((sum, one, k) => sum + one * (y[k] as number), 0);
    const [ca, cb] = [centred(a), centred(b)];
    return product(ca, cb) / Math.sqrt(product(ca, ca) * product(cb, cb));
  };
  const correlations = [V, I, phi].map((a) => [V, I, phi].map((b) => (a === b ? 1 : r(a, b))));

  it("means, standard uncertainties and correlations are those printed", () => {
    expect(mean[0]).toBeCloseTo(4.999, 6);
    expect(mean[1]).toBeCloseTo(0.019661, 9);
    expect(mean[2]).toBeCloseTo(1.04446, 8);
    expect(u[0]).toBeCloseTo(0.0032, 4);
    expect(u[1]).toBeCloseTo(0.0000095, 7);
    expect(u[2]).toBeCloseTo(0.00075, 5);
    expect(correlations[0]?.[1]).toBeCloseTo(-0.36, 2);
    expect(correlations[0]?.[2]).toBeCloseTo(0.86, 2);
    expect(correlations[1]?.[2]).toBeCloseTo(-0.65, 2);
  });

  const z = mean[0] / mean[1];
  const [cos, sin] = [Math.cos(mean[2]), Math.sin(mean[2])];

  it.each([
    ["R", 127.732, 0.07107, 0.071, [cos / mean[1], (-z * cos) / mean[1], -z * sin], z * cos],
    ["X", 219.847, 0.29558, 0.295, [sin / mean[1], (-z * sin) / mean[1], z * cos], z * sin],
    ["Z", 254.26, 0.23634, 0.236, [1 / mean[1], -z / mean[1], undefined], z],
  ])("%s = %d Ω, u = %d Ω", (_, value, recomputed, printed, sensitivities, found) => {
    expect(found).toBeCloseTo(value, 2);
    const used = sensitivities.filter((c) => c !== undefined).length;
    const combined = combinedUncertainty(
      u.slice(0, used),
      sensitivities.slice(0, used),
      correlations.slice(0, used).map((row) => row.slice(0, used)),
    ) as number;
    expect(combined).toBeCloseTo(recomputed, 5);
    expect(Math.abs(combined - printed)).toBeLessThan(0.0006);
  });
});

describe("H.3, calibration curve of a thermometer", () => {
  it("a correction predicted at 30 °C: u 0.0041 °C with r = −0.930, 0.00727 °C without it", () => {
    const u = [0.00287759784, 0.00066793877];
    const sensitivities = [undefined, 30 - 20];
    const r = -0.9304296;
    const correlated = combinedUncertainty(u, sensitivities, [
      [1, r],
      [r, 1],
    ]);
    expect(correlated).toBeCloseTo(0.00413859575, 7);
    expect(combinedUncertainty(u, sensitivities)).toBeCloseTo(0.00727, 5);
  });
});

describe("G.4.1, product of three quantities (from memory, recomputed)", () => {
  const u = [0.25, 0.57, 0.82];

  it("u 1.03 %, 19.0 effective degrees of freedom, t95 = 2.09, U95 = 2.2 %", () => {
    const combined = combinedUncertainty(u) as number;
    const dof = effectiveDof(u, [9, 4, 14]) as number;
    expect(combined).toBeCloseTo(1.03, 2);
    expect(dof).toBeCloseTo(19, 1);
    // Unrounded it is 18.9993, which truncates to 18; the GUM's rounded 1.03 % makes it 19.04.
    expect(coverageFactor(dof, 0.95)).toBeCloseTo(2.1, 2);
    const k = coverageFactor(dof * (1.03 / combined) ** 4, 0.95) as number;
    expect(k).toBeCloseTo(2.09, 2);
    expect(k * combined).toBeCloseTo(2.2, 1);
  });
});

describe("4.4.3, twenty readings of a temperature (from memory)", () => {
  // biome-ignore format: as printed, bin after bin
  const readings = [
    96.9, 98.18, 98.25, 98.61, 99.03, 99.49, 99.56, 99.74, 99.89, 100.07, 100.33, 100.42,
    100.68, 100.95, 101.11, 101.2, 101.57, 101.84, 102.36, 102.72,
  ];

  it("mean 100.145 °C, standard deviation 1.489 °C, u 0.333 °C", () => {
    const { mean, sd, u } = typeA(readings) as TypeA;
    expect(mean).toBeCloseTo(100.145, 3);
    expect(sd).toBeCloseTo(1.489, 3);
    expect(u).toBeCloseTo(0.333, 3);
  });
});
