/** Where a segment may be summed plainly and where it has to be compensated. */
import { describe, expect, it } from "vitest";
import { furtherDesignations, letterDesignations, type Thermocouple, thermocouple } from "../../../src/core";
import { compensatedPolynomial, polynomial } from "../../../src/core/numeric/polynomial";
import { Segment } from "../../../src/core/thermoelectric/segment";

/** °C: the loss that plain summation may cost by its bound. */
const ALLOWED = 2e-9;
const STEPS = 256;

const published = [...letterDesignations, ...furtherDesignations].flatMap((name) =>
  (thermocouple(name) as Thermocouple).reference.segments.map((segment) => ({ name, segment })),
);

/** Higham's bound 2n·u·Σ|cᵢ||t|ⁱ over the slope of the polynomial, °C; the slope counts as 1E-4 mV/°C at least. */
function lossBound(coefficients: readonly number[], t: number): number {
  let [size, slope] = [0, 0];
  coefficients.forEach((c, i) => {
    size += Math.abs(c) * Math.abs(t) ** i;
    if (i > 0) slope += i * c * t ** (i - 1);
  });
  return (2 * coefficients.length * 2 ** -53 * size) / Math.max(Math.abs(slope), 1e-4);
}

describe.each(
  published
    .filter(({ segment }) => segment.exponential === undefined)
    .map(({ name, segment }) => [`${name} from ${segment.from} °C`, segment] as const),
)("type %s", (_, segment) => {
  const { from, to, coefficients } = segment;
  const [near, far] = Math.abs(from) < Math.abs(to) ? [from, to] : [to, from];
  const at = (step: number): number => near + ((far - near) * step) / STEPS;
  const first = Array.from({ length: STEPS + 1 }, (_, i) => i).find(
    (i) => lossBound(coefficients, at(i)) > ALLOWED,
  );

  it("is summed plainly from its end nearest to 0 °C as far as the bound allows, and compensated beyond", () => {
    const made = new Segment(segment);
    // The step before the first that is not allowed is the last that is plain; in between is either.
    for (let i = 0; i <= STEPS; i++) {
      for (const t of [at(i), at(Math.min(i + 0.37, STEPS))]) {
        const step = ((t - near) / (far - near)) * STEPS;
        const plain = first === undefined || step < first - 1.001;
        if (!plain && step < first + 0.001) continue;
        expect(made.emf(t)).toBe((plain ? polynomial : compensatedPolynomial)(coefficients, t));
      }
    }
  });
});

describe("where sums are compensated (DEVELOPERS.md, Numbers)", () => {
  it("is far below 0 °C for types E, K and T, and nowhere for types J, N, R and S", () => {
    const differs = (name: string): boolean =>
      (thermocouple(name) as Thermocouple).reference.segments.some((segment) => {
        const made = new Segment(segment);
        return Array.from(
          { length: 400 },
          (_, i) => segment.from + ((segment.to - segment.from) * i) / 400,
        ).some(
          (t) => segment.exponential === undefined && made.emf(t) !== polynomial(segment.coefficients, t),
        );
      });
    expect(["E", "K", "T"].filter(differs)).toEqual(["E", "K", "T"]);
    expect(["J", "N", "R", "S"].filter(differs)).toEqual([]);
  });
});

describe("a column through a segment", () => {
  it("gets what lies from the given start to the segment's end, is not there yet, and is counted", () => {
    const { segment } = published.find(({ name }) => name === "N") as (typeof published)[number];
    const made = new Segment(segment);
    const none = Number.NaN;
    const emfs = Float64Array.of(none, none, none, none, 7, none, none);
    made.emfs(Float64Array.of(-300, -270, -100, 0, -100, 1, -50), emfs, 6, -270);
    expect([...emfs]).toEqual([none, made.emf(-270), made.emf(-100), made.emf(0), 7, none, none]);
  });
});
