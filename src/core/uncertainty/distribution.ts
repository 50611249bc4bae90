/** Type B evaluation: the standard uncertainty of a stated half-width, expanded value or resolution. */
import { noAnswer, type Refusal, wrongKind } from "../errors";
import { finite } from "../numeric/finite";
import { refusedUnlessPositive } from "../numeric/positive";

/** By how much the stated value is divided (JCGM 100:2008, 4.3; JCGM 101:2008, 6.4). */
const divisors = {
  /** An expanded uncertainty with k = 2. */
  normal: 2,
  rectangular: Math.sqrt(3),
  triangular: Math.sqrt(6),
  "u-shaped": Math.SQRT2,
  /** Its divisor depends on the ratio of its top to its bottom. */
  trapezoidal: undefined,
  /** The full step of a display, within ± half of which the value lies. */
  resolution: Math.sqrt(12),
  /** Already a standard uncertainty. */
  standard: 1,
} as const;

export type Distribution = keyof typeof divisors;

export const distributions = Object.keys(divisors) as readonly Distribution[];

/** Further words that are understood. */
const otherNames: Readonly<Record<string, Distribution>> = {
  uniform: "rectangular",
  gaussian: "normal",
  arcsine: "u-shaped",
};

const plain = (text: string): string => text.toLowerCase().replace(/[\s-]/g, "");

const byName = new Map<string, Distribution>([
  ...distributions.map((name) => [plain(name), name] as const),
  ...Object.entries(otherNames),
]);

/** A distribution from its name; case, spaces and hyphens make no difference. Refused: an unknown word (wrong kind). */
export function distribution(text: string): Distribution | Refusal {
  return (
    byName.get(plain(text)) ??
    wrongKind`distribution "${text.trim().slice(0, 30)}" is unknown: ${distributions.join(", ")}`
  );
}

/**
 * The number that a stated value is divided by. `given` replaces the distribution's own; for
 * "trapezoidal" it is the ratio β of top to bottom, above 0 up to 1, and the divisor
 * √6/√(1 + β²). Refused: 0 or less, no ratio, a ratio above 1.
 */
export function divisorOf(kind: Distribution, given?: number): number | Refusal {
  if (given === undefined) {
    return divisors[kind] ?? noAnswer`trapezoidal needs the ratio of its top to its bottom as divisor`;
  }
  const refused = refusedUnlessPositive(given, kind === "trapezoidal" ? "ratio of top to bottom" : "divisor");
  if (refused !== undefined) return refused;
  if (kind !== "trapezoidal") return given;
  if (given > 1) return noAnswer`ratio of top to bottom ${given} is above 1`;
  return Math.sqrt(6 / (1 + given * given));
}

/**
 * Standard uncertainty of a half-width, an expanded uncertainty ("normal"), a full step
 * ("resolution") or a standard uncertainty, in the value's own unit. Refused: a value below 0,
 * an expanded uncertainty of 0, and what `divisorOf` refuses.
 */
export function standardUncertainty(value: number, kind: Distribution, divisor?: number): number | Refusal {
  if (value < 0) return noAnswer`value ${value} is below 0: give the half-width without sign`;
  if (value === 0 && kind === "normal") return noAnswer`expanded uncertainty is 0 or an empty cell`;
  const by = divisorOf(kind, divisor);
  return typeof by === "number" ? finite(value / by, "standard uncertainty") : by;
}
