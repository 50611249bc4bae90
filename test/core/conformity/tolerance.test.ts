import { describe, expect, it } from "vitest";
import {
  letterDesignations,
  publications,
  Refusal,
  type Thermocouple,
  temperatureUnits,
  thermocouple,
} from "../../../src/core";
import {
  cableClassNames,
  cableDesignations,
  cableToleranceDegrees,
  cableToleranceUv,
  ToleranceClass,
  tolerance,
  toleranceClass,
  toleranceClassesOf,
  toleranceClassNames,
  toleranceUv,
} from "../../../src/core/conformity";
import { astmE230Cables } from "../../../src/core/conformity/cables/astm-e230";
import { iec60584_3 } from "../../../src/core/conformity/cables/iec-60584-3";
import { astmE230 } from "../../../src/core/conformity/classes/astm-e230";
import { iec60584_1 } from "../../../src/core/conformity/classes/iec-60584-1";
import { iec60751 } from "../../../src/core/conformity/classes/iec-60751";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F");
const refusal = (found: unknown): Refusal => {
  expect(found).toBeInstanceOf(Refusal);
  return found as Refusal;
};

describe("the tolerance tables", () => {
  const tables = [iec60584_1, astmE230, iec60751];

  it("say where each row comes from", () => {
    for (const { standard, clause, sensors } of tables) {
      expect(publications[standard].citation).not.toBe("");
      expect(clause).not.toBe("");
      for (const { evidence } of Object.values(sensors)) expect(evidence).not.toBe("");
    }
    for (const { standard, clause, evidence } of [iec60584_3, astmE230Cables]) {
      expect(publications[standard].citation).not.toBe("");
      expect(clause).not.toBe("");
      expect(evidence).not.toBe("");
    }
  });

  it("have adjoining parts that agree where they meet", () => {
    for (const { sensors } of tables) {
      for (const { classes } of Object.values(sensors)) {
        for (const parts of Object.values(classes)) {
          parts.forEach(({ from, to, constant }, i) => {
            expect(from).toBeLessThan(to);
            if (i === 0) return;
            expect(from).toBe(parts[i - 1]?.to);
            expect(from).toBe(0);
            expect(constant).toBe(parts[i - 1]?.constant);
          });
        }
      }
    }
  });

  it("give every class to the sensors of one standard only", () => {
    for (const name of toleranceClassNames) {
      const homes = tables.filter(({ sensors }) =>
        Object.values(sensors).some(({ classes }) => classes[name] !== undefined),
      );
      expect(homes).toHaveLength(1);
    }
  });

  it("let every cable lie inside the reference function of its couple", () => {
    for (const { cables } of [iec60584_3, astmE230Cables]) {
      for (const cable of Object.values(cables)) {
        expect(cable.from).toBeGreaterThanOrEqual(couple(cable.couple).low);
        expect(cable.to).toBeLessThanOrEqual(couple(cable.couple).high);
        expect(couple(cable.couple).seebeck(cable.to)).toBeGreaterThan(0);
      }
    }
  });

  it("lie inside the couples' reference functions", () => {
    for (const name of letterDesignations) {
      for (const { from, to } of toleranceClassesOf(name)) {
        expect(from).toBeGreaterThanOrEqual(couple(name).low);
        expect(to).toBeLessThanOrEqual(couple(name).high);
      }
    }
  });
});

describe("tolerance", () => {
  it.each(["1", " 1 ", "class 1", "Class1", "CLASS  1"])('understands "%s"', (name) => {
    expect(tolerance("K", name, 500)).toBe(2);
  });

  it.each(["Standard", "STANDARD", " standard "])('understands "%s"', (name) => {
    expect(tolerance("K", name, 0)).toBe(2.2);
  });

  it("takes a temperature that binary arithmetic moved past the end as the end", () => {
    expect(tolerance("K", "1", 1000 + 1e-13)).toBeCloseTo(4, 9);
    expect(tolerance("K", "3", -200 - 1e-13)).toBeCloseTo(3, 9);
  });

  it("says which classes a type has, and over which range", () => {
    const lacking = refusal(tolerance("J", "3", 20));
    expect(lacking.kind).toBe("no answer");
    expect(lacking.message()).toBe(
      "type J has no class 3: it has class 1 from -40 °C to 750 °C, class 2 from -40 °C to 750 °C",
    );
    expect(refusal(tolerance("C", "special", 20)).message()).toBe(
      "type C has no class special: it has class standard from 0 °C to 2315 °C",
    );
    expect(refusal(tolerance("A", "standard", 1200)).message(fahrenheit)).toBe(
      "type A has no class standard: it has class 2 from 1832 °F to 4532 °F",
    );
    expect(refusal(tolerance("Pt", "1", 20)).message()).toMatch(
      /^Pt has no class 1: it has class AA from -50 °C to 250 °C, /,
    );
    expect(refusal(tolerance("Au/Pt", "1", 20)).message()).toBe("no tolerance class is published for Au/Pt");
  });

  it("says how far a class reaches", () => {
    const outside = refusal(tolerance("K", "1", 1050));
    expect(outside.kind).toBe("no answer");
    expect(outside.message()).toBe("temperature 1050 °C is outside class 1 of type K, -40 °C to 1000 °C");
  });

  it.each(["", "4", "class", "constructor", "standart", "A class A", "class class 1"])(
    'refuses the class "%s" as unknown',
    (name) => {
      const unknown = refusal(tolerance("K", name, 20));
      expect(unknown.kind).toBe("wrong kind");
      expect(unknown.message()).toBe(
        `tolerance class "${name}" is unknown: 1, 2, 3, standard, special, AA, A, B, C`,
      );
    },
  );

  it("repeats no more of an unknown class than a message can bear", () => {
    expect(refusal(tolerance("K", `  ${"x".repeat(40)} `, 20)).message()).toBe(
      `tolerance class "${"x".repeat(30)}" is unknown: 1, 2, 3, standard, special, AA, A, B, C`,
    );
  });

  it("calls a letter a type, with its number where it has one, and conductors by themselves", () => {
    for (const [name, words] of [
      ["A-2", "type A-2"],
      ["Mo/W", "Mo/W"],
      ["W/W26Re", "W/W26Re"],
    ] as const) {
      expect(refusal(tolerance(name, "1", 20)).message()).toBe(
        `no tolerance class is published for ${words}`,
      );
    }
  });

  it("gives the class itself, to be asked again and again", () => {
    const found = toleranceClass("K", "special");
    expect(found).toBeInstanceOf(ToleranceClass);
    expect((found as ToleranceClass).standard).toBe("astmE230");
    expect((found as ToleranceClass).limit(1000)).toBe(4);
  });
});

describe("toleranceUv", () => {
  it("takes a temperature past the end of class and function, by rounding, as that end", () => {
    const c = couple("C");
    expect(toleranceUv(c, "standard", 2315 + 4e-10)).toBeCloseTo(23.15 * 1000 * c.seebeck(2315), 6);
    expect(toleranceUv(c, "standard", -4e-10)).toBeCloseTo(4.4 * 1000 * c.seebeck(0), 6);
  });

  it("is the limit in degrees times the Seebeck coefficient", () => {
    // Type K at 1000 °C: 38.98 µV/°C by the published tables (41.276 mV at 1000 °C, 41.315 mV at 1001 °C).
    expect(toleranceUv(couple("K"), "1", 1000)).toBeCloseTo(4 * 38.98, 0);
  });

  it("lies between the EMF of the limit upwards and downwards", () => {
    for (const [name, t] of [
      ["K", 500],
      ["S", 1200],
      ["T", 100],
      ["B", 900],
    ] as const) {
      const c = couple(name);
      const limit = tolerance(name, "2", t) as number;
      const up = 1000 * (c.emf(t + limit) - c.emf(t));
      const down = 1000 * (c.emf(t) - c.emf(t - limit));
      const uv = toleranceUv(c, "2", t) as number;
      expect(uv).toBeGreaterThanOrEqual(Math.min(up, down) - 1e-9);
      expect(uv).toBeLessThanOrEqual(Math.max(up, down) + 1e-9);
    }
  });

  it("is refused where the class is", () => {
    refusal(toleranceUv(couple("K"), "1", 1050));
    refusal(toleranceUv(couple("K"), "9", 20));
  });
});

describe("cable tolerances", () => {
  it("are found by designation and class in any case", () => {
    expect(cableToleranceUv("kx", "Class 2")).toBe(100);
    expect(cableToleranceUv(" KC A ", "2")).toBe(100);
    expect(cableToleranceDegrees("kx", "STANDARD")).toBe(2.2);
  });

  it("in degrees depend on the measuring junction's temperature", () => {
    expect(cableToleranceDegrees("SCA", "2", 1000)).toBeCloseTo(30 / 11.54, 2);
    expect(cableToleranceDegrees("SCA", "2", 300)).toBeCloseTo(30 / 9.13, 2);
  });

  it("in µV need the temperature of the head where ASTM specifies degrees", () => {
    expect(refusal(cableToleranceUv("KX", "special")).message()).toBe(
      "KX is specified in degrees of its own junctions: for µV give the temperature of the head, 0 °C to 200 °C",
    );
    // Printed tables of type K: 2.023 mV at 50 °C, 2.064 mV at 51 °C.
    expect(cableToleranceUv("KX", "special", 50)).toBeCloseTo(1.1 * 41, 0);
    // ... 8.138 mV at 200 °C, 8.178 mV at 201 °C.
    expect(cableToleranceUv("KX", "special", 200)).toBeCloseTo(1.1 * 40, 0);
    for (const t of [201, -1]) {
      expect(refusal(cableToleranceUv("KX", "special", t)).message()).toBe(
        `temperature of the head ${t} °C is outside the range of KX, 0 °C to 200 °C`,
      );
    }
    expect(refusal(cableToleranceDegrees("KX", "special", 900)).message()).toBe(
      "KX is specified in degrees of its own junctions, not in µV: leave the temperature out",
    );
  });

  it("say what a cable has", () => {
    const lacking = refusal(cableToleranceUv("KCA", "1"));
    expect(lacking.kind).toBe("no answer");
    expect(lacking.message()).toBe("KCA has no class 1: it has class 2");
    expect(refusal(cableToleranceUv("SX", "special")).message()).toBe(
      "SX has no class special: it has class standard",
    );
    expect(refusal(cableToleranceUv("KCA", "special")).message()).toBe(
      "KCA has no class special: it has class 2",
    );
    expect(refusal(cableToleranceUv("KX", "C")).message()).toBe(
      'tolerance class "C" is unknown: 1, 2, standard, special',
    );
    expect(refusal(cableToleranceUv("BX", "1")).message()).toBe("BX has no class 1: it has class standard");
    expect(refusal(cableToleranceUv("JX", "AA")).kind).toBe("wrong kind");
    expect(refusal(cableToleranceUv("KX", "3")).kind).toBe("wrong kind");
    const unknown = refusal(
      cableToleranceUv("  QX of a very long name, longer than a message should repeat", "1"),
    );
    expect(unknown.kind).toBe("wrong kind");
    expect(unknown.message()).toBe(
      `cable "QX of a very long name, longer" is unknown: ${cableDesignations.join(" ")}`,
    );
  });

  it("in degrees are refused where the couple gives no EMF, or beyond its range", () => {
    expect(refusal(cableToleranceDegrees("BX", "standard", 10)).message()).toBe(
      "33 µV is no temperature at 10 °C: type B hardly gives EMF there",
    );
    expect(refusal(cableToleranceDegrees("BX", "standard", 1900)).message()).toBe(
      "temperature 1900 °C is outside the range of type B, 0 °C to 1820 °C",
    );
  });

  it("are a number above 0 or a refusal for every cable, class and temperature", () => {
    for (const name of cableDesignations) {
      for (const className of cableClassNames) {
        for (const t of [undefined, -300, 0, 21, 50, 1000, 3000]) {
          for (const found of [
            cableToleranceUv(name, className, t),
            cableToleranceDegrees(name, className, t),
          ]) {
            if (found instanceof Refusal) expect(found.message()).not.toMatch(/NaN|undefined/);
            else expect(found).toBeGreaterThan(0);
          }
        }
      }
    }
  });
});
