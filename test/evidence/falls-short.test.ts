/** The checks can fail: what is doctored falls short, on the page and in the list that the test of the evidence reads. */
import { describe, expect, it } from "vitest";
import { Refusal, thermocouple } from "../../src/core";
import { platinumResistance } from "../../src/core/junction";
import { letterTypes } from "../../src/core/thermoelectric/couples";
import type { ReferenceFunction } from "../../src/core/thermoelectric/reference-function";
import { certifiedPolynomial } from "../published/certified";
import { publishedInverses } from "../published/inverse-approximations";
import { inverseBand } from "../published/inverse-bands";
import { misprints } from "../published/misprints";
import { judged, type PublishedValue } from "../published/published-value";
import { strdPolynomials } from "../published/strd-polynomials";
import { collectEvidence, type Evidence, judgedMisprint, judgedSet, shortfalls } from "./collect";
import { html } from "./html";
import { markdown } from "./markdown";
import { residualsOf } from "./residuals";
import { publishedSets } from "./sets";
import { findings } from "./totals";

const sound = collectEvidence();

/** One shortfall and no more, in words that name it, on both pages and in the counts of the head. */
function expectOneShortfall(doctored: Partial<Evidence>, words: RegExp): void {
  const evidence = { ...sound, ...doctored };
  expect(shortfalls(evidence)).toEqual([expect.stringMatching(words)]);
  expect(markdown(evidence).match(/FALLS SHORT/g)).toHaveLength(1);
  expect(html(evidence).match(/✗ FALLS SHORT/g)).toHaveLength(1);
  expect(findings(evidence)).not.toEqual(findings(sound));
}

const values = publishedSets.flatMap((set) => set.values);

describe("a published value", () => {
  it("that is one unit of its last digit off falls short", () => {
    const [first, ...others] = publishedSets.map((set, i) =>
      i > 0
        ? set
        : {
            ...set,
            values: set.values.map((value, row) =>
              row === 41 ? { ...value, published: (value.published as number) + 0.001 } : value,
            ),
          },
    );
    expectOneShortfall(
      { sets: [first, ...others].map((set) => judgedSet(set as (typeof publishedSets)[number])) },
      /^NIST SRD 60 table \(1 °C steps\): .+: published .+, ours /,
    );
  });

  it.each([-1, 1])("of every set falls short when its last digit is %d off", (by) => {
    const exact = values.filter(
      ({ published, decimals, tolerance }) =>
        typeof published === "number" && decimals !== undefined && tolerance === undefined,
    );
    expect(exact.length).toBeGreaterThan(700);
    const kept = exact.filter((value) => {
      const unit = 10 ** -(value.decimals as number);
      return judged({ ...value, published: (value.published as number) + by * unit }).holds;
    });
    expect(kept).toEqual([]);
  });

  it.each([-1, 1])("with a tolerance of its own falls short beyond it, %d times", (by) => {
    const ranged = values.filter(({ tolerance, atMost }) => tolerance !== undefined && !atMost);
    expect(ranged.length).toBeGreaterThan(300);
    const kept = ranged.filter((value) => {
      const step = 2.01 * (value.tolerance as number) + 1e-15 * Math.abs(value.published as number);
      return judged({ ...value, published: (value.published as number) + by * (step || 1) }).holds;
    });
    expect(kept).toEqual([]);
  });

  it("that is a bound or a text falls short when ours passes it or reads otherwise", () => {
    const others = values.filter(({ published, atMost }) => typeof published === "string" || atMost);
    expect(others.length).toBeGreaterThanOrEqual(8);
    for (const value of others) {
      const doctored = typeof value.published === "string" ? `${value.published} ` : 0;
      expect(judged({ ...value, published: doctored }).holds).toBe(false);
    }
  });

  it("falls short when ours is no number, infinite or refused", () => {
    const refused = platinumResistance(1e9, 100);
    expect(refused).toBeInstanceOf(Refusal);
    for (const value of values) {
      for (const ours of [undefined, Number.NaN, Number.POSITIVE_INFINITY, "1", refused]) {
        const doctored: PublishedValue = { ...value, ours: () => ours };
        expect(judged(doctored).holds).toBe(false);
      }
    }
  });
});

describe("an inverse", () => {
  const reference = letterTypes.find(({ designation }) => designation === "K") as ReferenceFunction;
  const couple = thermocouple("K");
  if (couple === undefined) throw new Error("no type K");

  it("that is 2E-9 °C off near 500 °C falls short of its promise", () => {
    const wrong = Object.create(couple, {
      temperature: {
        value: (emf: number) => couple.temperature(emf) + (Math.abs(emf - 20.644) < 0.1 ? 2e-9 : 0),
      },
    });
    const residuals = sound.residuals.map((one) =>
      one.name === "type K" ? residualsOf(reference, wrong) : one,
    );
    expectOneShortfall({ residuals }, /^type K: the inverse is off by up to 2\.0\d+e-9 °C/);
  });

  it("that leaves NIST's band falls short", () => {
    const bands = sound.bands.map((one, i) => {
      const published = publishedInverses[i];
      if (published === undefined || i !== 8) return one;
      // The approximation moved by 0.02 °C, as if our inverse were off by so much.
      const [constant, ...rest] = published.coefficients;
      return inverseBand({ ...published, coefficients: [(constant as number) - 0.02, ...rest] });
    });
    expectOneShortfall({ bands }, /^NIST SRD 60, inverse of type K, 0 to 20\.644 mV: .+ outside its band$/);
  });
});

describe("a certified value", () => {
  const set = strdPolynomials.find(({ name }) => name === "Norris");
  if (set === undefined) throw new Error("no Norris");
  const [[estimate, sd], ...rest] = set.certified as [[number, number], ...[number, number][]];

  it("that differs in its twelfth digit falls short", () => {
    const doctored = { ...set, certified: [[estimate * (1 + 1e-12), sd], ...rest] as [number, number][] };
    const certified = [
      ...certifiedPolynomial(doctored),
      ...sound.certified.filter((one) => one.set !== "Norris"),
    ];
    expectOneShortfall(
      { certified },
      /^NIST StRD Norris: B0: certified .+, ours .+, 1[12]\.\d digits agree$/,
    );
  });

  it("falls short where ours is no number", () => {
    const doctored = { ...set, certified: [[Number.NaN, sd], ...rest] as [number, number][] };
    expect(certifiedPolynomial(doctored)[0]?.holds).toBe(false);
  });
});

describe("a known misprint", () => {
  it("that ours would follow falls short", () => {
    const misread = misprints.map((one, i) => (i === 6 ? { ...one, ours: () => one.misprinted } : one));
    expectOneShortfall(
      { misprints: misread.map(judgedMisprint) },
      /^type S, 5\.975 mV, .+: right 699\.87, misprinted 721\.37, ours 721\.37/,
    );
  });

  it("that does not differ from what is right falls short", () => {
    for (const one of misprints) {
      expect(judgedMisprint({ ...one, misprinted: one.published }).holds).toBe(false);
    }
  });
});
