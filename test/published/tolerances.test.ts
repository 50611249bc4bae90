import { describe, expect, it } from "vitest";
import { Refusal } from "../../src/core";
import { cableToleranceDegrees, tolerance, toleranceClassesOf } from "../../src/core/conformity";
import { eachAgrees } from "./agrees";
import { toleranceSets } from "./tolerance-sets";
import { iecFromMemory, printedIec, printedIecCables, printedPlatinumRanges } from "./tolerances";

const iec = [...printedIec, ...iecFromMemory];

eachAgrees(toleranceSets);

describe("IEC 60584-1:2013, tolerance classes", () => {
  it("stops at both ends of every class", () => {
    for (const type of ["B", "C", "E", "J", "K", "N", "R", "S", "T", "A"]) {
      const rows = iec.filter((row) => row.type === type);
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
      const rows = iec.filter((row) => row.type === type).map((row) => row.name);
      expect(names(type)).toEqual([...new Set(rows)].sort());
    }
  });
});

describe("ASTM E230/E230M, tolerances on initial values", () => {
  it("has no guide for special K below 0 °C", () => {
    expect(tolerance("K", "special", -1)).toBeInstanceOf(Refusal);
  });
});

describe("IEC 60751:2008, wire-wound sensors", () => {
  it.each(printedPlatinumRanges)("class %s stops at %d °C and at %d °C", (name, low, high) => {
    expect(tolerance("Pt", name, low)).toBeTypeOf("number");
    expect(tolerance("Pt", name, high)).toBeTypeOf("number");
    expect(tolerance("Pt", name, low - 0.1)).toBeInstanceOf(Refusal);
    expect(tolerance("Pt", name, high + 0.1)).toBeInstanceOf(Refusal);
  });
});

describe("IEC 60584-3, extension and compensating cables", () => {
  it.each(printedIecCables)("%s class %s: %d µV are about ±%d °C at %d °C", (cable, name, _, degrees, at) => {
    // The printed degrees are the µV over the Seebeck coefficient, rounded; 2.27 is printed as 2.5 for type R.
    const exact = cableToleranceDegrees(cable, name, at) as number;
    expect(Math.abs(exact / degrees - 1)).toBeLessThan(cable.startsWith("R") ? 0.1 : 0.041);
  });
});
