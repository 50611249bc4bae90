import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, temperatureOf, thermocouple } from "../../../src/core";
import {
  differential,
  type Lead,
  leadError,
  releaded,
  rereferenced,
  retyped,
  unreversed,
} from "../../../src/core/junction";
import { type Circuit, measuredEmf } from "./circuit";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const message = (value: unknown): string => (value instanceof Refusal ? value.message() : "no refusal");

/** What an instrument set to `set`, its terminals at r, shows for the circuit. */
const shown = (set: Thermocouple, circuit: Circuit): number => {
  const indicated = temperatureOf(set, measuredEmf(circuit), circuit.terminals);
  if (indicated instanceof Refusal) throw new Error(indicated.message());
  return indicated;
};

describe("the simulated circuit", () => {
  it("without a fault shows the temperature of the measuring junction, whatever the head's", () => {
    for (const head of [-10, 23, 90]) {
      const circuit = { couple: couple("K"), extension: couple("K"), junction: 640, head, terminals: 23 };
      expect(shown(couple("K"), circuit)).toBeCloseTo(640, 9);
    }
  });
});

describe.each(["K", "J", "T", "E", "N"])("type %s", (type) => {
  const c = couple(type);
  const sound = { couple: c, extension: c, junction: 210, head: 58, terminals: 21 };

  it("crossed at the terminals comes back", () => {
    // −[E(210) − E(21)] + E(21) must still be within the type's range: a junction near room temperature.
    const circuit = { ...sound, junction: 75, crossedAtTerminals: true };
    const indicated = shown(c, circuit);
    expect(indicated).toBeLessThan(21);
    expect(unreversed(indicated, c, "terminals", 21)).toBeCloseTo(75, 9);
  });

  it("with couple alone crossed, at the head, comes back", () => {
    const circuit = { ...sound, junction: 120, crossedAtHead: true };
    expect(unreversed(shown(c, circuit), c, "head", 21, 58)).toBeCloseTo(120, 9);
  });

  it("with the extension crossed at both ends comes back", () => {
    const circuit = { ...sound, crossedAtHead: true, crossedAtTerminals: true };
    const indicated = shown(c, circuit);
    expect(indicated).toBeLessThan(210);
    expect(unreversed(indicated, c, "both", 21, 58)).toBeCloseTo(210, 9);
  });

  it.each(["copper", "K", "J", "R", "Au/Pt"])("run in %s comes back, and its error was foreseen", (name) => {
    const lead: Lead = name === "copper" ? "copper" : couple(name);
    const indicated = shown(c, { ...sound, extension: lead });
    expect(releaded(indicated, c, lead, 58, 21)).toBeCloseTo(210, 9);
    expect(leadError(210, c, lead, 58, 21)).toBeCloseTo(indicated - 210, 9);
  });

  it.each(["K", "J", "N"])("read by an instrument set to type %s comes back", (set) => {
    const indicated = shown(couple(set), sound);
    expect(retyped(indicated, couple(set), c, 21)).toBeCloseTo(210, 9);
  });

  it("read with a wrong reference junction comes back", () => {
    const logged = temperatureOf(c, measuredEmf(sound), 0) as number;
    expect(rereferenced(logged, c, 0, 21)).toBeCloseTo(210, 9);
  });
});

describe("a differential couple", () => {
  it("adds up its pairs", () => {
    const t = couple("T");
    const emf = 5 * (t.emf(64.5) - t.emf(60));
    expect(differential(emf, t, 60, 5)).toBeCloseTo(4.5, 9);
    expect(differential(-emf, t, 60, 5)).toBeLessThan(0);
    expect(differential(0, t, 60, 1)).toBeCloseTo(0, 10);
  });

  it.each([
    [0, "pairs is 0 or an empty cell"],
    [-1, "pairs is -1, not a whole number above 0"],
    [1.5, "pairs is 1.5, not a whole number above 0"],
  ])("of %d pairs is refused", (pairs, words) => {
    const refused = differential(1, couple("T"), 20, pairs);
    expect((refused as Refusal).kind).toBe("wrong kind");
    expect(message(refused)).toBe(words);
  });

  it("says which temperature is out of range, and that no couple gives such an EMF", () => {
    expect(message(differential(1, couple("T"), 500, 1))).toBe(
      "base temperature 500 °C is outside the range of type T, -270 °C to 400 °C",
    );
    expect(message(differential(Number.POSITIVE_INFINITY, couple("T"), 20, 1))).toBe(
      "EMF over 1.8E+308 mV is beyond any couple",
    );
  });

  it("says which limit an EMF passes", () => {
    expect(message(differential(100, couple("T"), 20, 1))).toMatch(
      /^the EMF comes to 100\.7\d* mV, above the limit of type T, 20\.87\d* mV \(400 °C\)$/,
    );
    expect(differential(1.7e308, couple("T"), 20, 1)).toBeInstanceOf(Refusal);
  });
});

describe("refusals", () => {
  const k = couple("K");

  it("name the temperature that is out of range", () => {
    expect(message(rereferenced(1500, k, 0, 20))).toBe(
      "indicated temperature 1500 °C is outside the range of type K, -270 °C to 1372 °C",
    );
    expect(message(rereferenced(500, k, -300, 20))).toContain("assumed reference temperature -300 °C");
    expect(message(rereferenced(500, k, 0, 2000))).toContain("actual reference temperature 2000 °C");
    expect(message(retyped(500, k, couple("B"), -20))).toContain(
      "reference temperature -20 °C is outside the range of type B",
    );
    expect(message(retyped(500, couple("T"), k, 20))).toContain(
      "indicated temperature 500 °C is outside the range of type T",
    );
    expect(message(unreversed(20, k, "head", 20, 3000))).toContain("head temperature 3000 °C");
    expect(message(releaded(500, k, couple("B"), -5, 20))).toContain(
      "head temperature -5 °C is outside the range of type B",
    );
    expect(message(leadError(5000, k, "copper", 50, 20))).toContain("temperature 5000 °C");
  });

  it("name it in full, whichever of the temperatures it is", () => {
    const ofK = "is outside the range of type K, -270 °C to 1372 °C";
    expect(message(rereferenced(500, k, -300, 20))).toBe(`assumed reference temperature -300 °C ${ofK}`);
    expect(message(rereferenced(500, k, 0, 2000))).toBe(`actual reference temperature 2000 °C ${ofK}`);
    expect(message(retyped(2000, k, couple("T"), 20))).toBe(`indicated temperature 2000 °C ${ofK}`);
    expect(message(retyped(20, k, couple("C"), 2000))).toBe(`reference temperature 2000 °C ${ofK}`);
    expect(message(retyped(500, couple("C"), k, 2000))).toBe(`reference temperature 2000 °C ${ofK}`);
    for (const crossing of ["terminals", "head", "both"] as const) {
      expect(message(unreversed(2000, k, crossing, 20, 60))).toBe(`indicated temperature 2000 °C ${ofK}`);
    }
    expect(message(unreversed(20, k, "terminals", 2000))).toBe(`reference temperature 2000 °C ${ofK}`);
    expect(message(unreversed(20, k, "both", 2000, 60))).toBe(`reference temperature 2000 °C ${ofK}`);
    expect(message(unreversed(20, k, "both", 20, 2000))).toBe(`head temperature 2000 °C ${ofK}`);
  });

  it.each([
    ["temperature", leadError],
    ["indicated temperature", releaded],
  ] as const)("of a run name the couple's %s, its head or its terminals, or the run's", (name, repair) => {
    const ofK = "is outside the range of type K, -270 °C to 1372 °C";
    const ofT = "is outside the range of type T, -270 °C to 400 °C";
    const t = couple("T");
    for (const lead of ["copper", t] as const) {
      expect(message(repair(5000, k, lead, 50, 20))).toBe(`${name} 5000 °C ${ofK}`);
    }
    expect(message(repair(500, k, "copper", 2000, 20))).toBe(`head temperature 2000 °C ${ofK}`);
    expect(message(repair(500, k, "copper", 50, -300))).toBe(`reference temperature -300 °C ${ofK}`);
    expect(message(repair(500, k, t, 500, 20))).toBe(`head temperature 500 °C ${ofT}`);
    expect(message(repair(500, k, t, 50, 450))).toBe(`reference temperature 450 °C ${ofT}`);
  });

  it("of a run say that no temperature gives the EMF", () => {
    expect(message(leadError(1370, k, couple("E"), 200, 20))).toContain("above the limit of type K");
    expect(message(releaded(-269, k, couple("E"), 200, 20))).toContain("below the limit of type K");
  });

  it("say that the repaired reading would lie beyond the couple", () => {
    expect(message(unreversed(-250, couple("T"), "terminals", 300))).toContain("above the limit of type T");
    expect(message(unreversed(900, couple("S"), "terminals", 20))).toContain("below the limit of type S");
    expect(message(rereferenced(60, couple("B"), 60, 10))).toContain("belongs to two temperatures");
  });

  it("ask for the head temperature where it counts", () => {
    expect(message(unreversed(100, k, "head", 20))).toBe("head temperature missing");
    expect(message(unreversed(100, k, "both", 20))).toBe("head temperature missing");
    expect(typeof unreversed(10, k, "terminals", 20)).toBe("number");
  });
});
