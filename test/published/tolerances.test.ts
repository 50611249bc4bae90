import { describe, expect, it } from "vitest";
import { Refusal } from "../../src/core";
import {
  cableToleranceDegrees,
  cableToleranceUv,
  tolerance,
  toleranceClassesOf,
} from "../../src/core/conformity";
import {
  type PrintedRow,
  printedAstm,
  printedAstmCables,
  printedAstmMicrovolts,
  printedIec,
  printedIecCables,
  printedPlatinum,
} from "./tolerances";

const printed = ({ constant, proportion }: PrintedRow, t: number): number =>
  constant ?? (proportion as number) * Math.abs(t);

describe("IEC 60584-1:2013, tolerance classes", () => {
  it.each(printedIec)("type $type, class $name, $from °C to $to °C", (row) => {
    const { type, name, from, to } = row;
    for (const t of [from, to]) {
      expect(Math.abs((tolerance(type, name, t) as number) - printed(row, t))).toBeLessThan(0.006);
    }
    const middle = (from + to) / 2;
    expect(tolerance(type, name, middle)).toBeCloseTo(printed(row, middle), 12);
  });

  it.each(["R", "S"])(
    "type %s, class 1, rises by 0.3 % from 1100 °C, not from 1000 °C as some copies print",
    (type) => {
      expect(tolerance(type, "1", 1000)).toBe(1);
      expect(tolerance(type, "1", 1100)).toBe(1);
      expect(tolerance(type, "1", 1200)).toBeCloseTo(1.3, 12);
      expect(tolerance(type, "1", 1600)).toBeCloseTo(2.5, 12);
    },
  );

  it("stops at both ends of every class", () => {
    for (const type of ["B", "C", "E", "J", "K", "N", "R", "S", "T", "A"]) {
      const rows = printedIec.filter((row) => row.type === type);
      for (const name of new Set(rows.map((row) => row.name))) {
        const ofClass = rows.filter((row) => row.name === name);
        const low = Math.min(...ofClass.map(({ from }) => from));
        const high = Math.max(...ofClass.map(({ to }) => to));
        // Class 1 of R and S goes on to 1600 °C in a form of its own.
        const end = name === "1" && high === 1100 ? 1600 : high;
        expect(tolerance(type, name, low)).toBeTypeOf("number");
        expect(tolerance(type, name, end)).toBeTypeOf("number");
        expect(tolerance(type, name, low - 0.001)).toBeInstanceOf(Refusal);
        expect(tolerance(type, name, end + 0.001)).toBeInstanceOf(Refusal);
      }
    }
  });

  it("has exactly the classes of the printed table", () => {
    const names = (type: string): string[] =>
      toleranceClassesOf(type)
        .filter(({ standard }) => standard === "iec60584_1")
        .map(({ name }) => name);
    for (const type of ["B", "C", "E", "J", "K", "N", "R", "S", "T", "A"]) {
      const rows = printedIec.filter((row) => row.type === type).map((row) => row.name);
      expect(names(type)).toEqual([...new Set(rows)].sort());
    }
  });
});

describe("ASTM E230/E230M, tolerances on initial values", () => {
  it.each(printedAstm)("type %s, %s, at %d °C: ±%d °C", (type, name, t, limit) => {
    expect(tolerance(type, name, t)).toBeCloseTo(limit, 12);
  });

  it("allows type K 2 % below 0 °C, not 1 % as some copies print", () => {
    expect(tolerance("K", "standard", -200)).toBeCloseTo(4, 12);
    expect(tolerance("K", "standard", -110)).toBeCloseTo(2.2, 12);
    expect(tolerance("K", "standard", -50)).toBe(2.2);
  });

  it("gives type C a floor of 4.4 °C, which some copies leave out", () => {
    expect(tolerance("C", "standard", 100)).toBe(4.4);
    expect(tolerance("C", "standard", 440)).toBeCloseTo(4.4, 12);
    expect(tolerance("C", "standard", 441)).toBeCloseTo(4.41, 12);
  });

  it("has a guide for special T and E below 0 °C (from memory), none for K", () => {
    expect(tolerance("T", "special", -100)).toBeCloseTo(0.8, 12);
    expect(tolerance("E", "special", -200)).toBeCloseTo(1, 12);
    expect(tolerance("K", "special", -1)).toBeInstanceOf(Refusal);
  });
});

describe("IEC 60751:2008, wire-wound sensors", () => {
  it.each(printedPlatinum)("class %s at %d °C: ±%d °C", (name, t, limit) => {
    expect(Math.abs((tolerance("Pt", name, t) as number) - limit)).toBeLessThan(1e-9);
  });

  it.each([
    ["AA", -50, 250],
    ["A", -100, 450],
    ["B", -196, 600],
    ["C", -196, 600],
  ])("class %s holds from %d °C to %d °C", (name, low, high) => {
    expect(tolerance("Pt", name, low)).toBeTypeOf("number");
    expect(tolerance("Pt", name, high)).toBeTypeOf("number");
    expect(tolerance("Pt", name, low - 0.1)).toBeInstanceOf(Refusal);
    expect(tolerance("Pt", name, high + 0.1)).toBeInstanceOf(Refusal);
  });
});

describe("IEC 60584-3, extension and compensating cables (an instrument maker's manual, two further pages)", () => {
  it.each(printedIecCables)("%s class %s: %d µV, ±%d °C at %d °C", (cable, name, uv, printedDegrees, at) => {
    expect(cableToleranceUv(cable, name)).toBe(uv);
    expect(cableToleranceDegrees(cable, name)).toBe(printedDegrees);
    // The printed degrees are the µV over the Seebeck coefficient, rounded; 2.27 is printed as 2.5 for type R.
    const exact = cableToleranceDegrees(cable, name, at) as number;
    expect(Math.abs(exact / printedDegrees - 1)).toBeLessThan(cable.startsWith("R") ? 0.1 : 0.041);
  });
});

describe("ASTM E230/E230M, extension wires (three makers' tables)", () => {
  it.each(printedAstmCables)("%s: standard ±%d °C, special ±%d °C", (cable, standard, special) => {
    expect(cableToleranceDegrees(cable, "standard")).toBe(standard);
    expect(cableToleranceDegrees(cable, "special")).toBe(special);
  });

  it.each(printedAstmMicrovolts)("%s: ±%d °C; ±%d µV from memory", (cable, printedDegrees, uv) => {
    expect(cableToleranceDegrees(cable, "standard")).toBe(printedDegrees);
    expect(cableToleranceUv(cable, "standard")).toBe(uv);
  });
});
