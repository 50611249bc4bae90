/** All the evidence there is: every published value that the tests hold, residuals, bands, and certified digits. */
import { type CertifiedValue, certifiedPolynomials, certifiedUnivariate } from "../published/certified";
import { type InverseBand, inverseBands } from "../published/inverse-bands";
import { differs, type Misprint, misprints } from "../published/misprints";
import { type Judged, judged, type Origin, type PublishedSet } from "../published/published-value";
import { conversionResiduals, type Residuals } from "./residuals";
import { publishedSets } from "./sets";

export interface JudgedSet {
  readonly source: string;
  readonly origin: Origin;
  readonly compared: string;
  readonly rows: readonly Judged[];
}

export interface JudgedMisprint extends Pick<Misprint, "what" | "unit" | "where" | "why"> {
  readonly misprinted: string;
  readonly right: string;
  readonly ours: string;
  readonly holds: boolean;
}

export interface Evidence {
  readonly sets: readonly JudgedSet[];
  readonly bands: readonly InverseBand[];
  readonly residuals: readonly Residuals[];
  readonly certified: readonly CertifiedValue[];
  readonly misprints: readonly JudgedMisprint[];
}

export const judgedSet = ({ values, ...about }: PublishedSet): JudgedSet => ({
  ...about,
  rows: values.map(judged),
});

export function judgedMisprint(misprint: Misprint): JudgedMisprint {
  const { what, unit, where, why, misprinted, decimals = 0 } = misprint;
  const { published, ours, holds } = judged(misprint);
  return {
    what,
    unit,
    where,
    why,
    misprinted: misprinted.toFixed(decimals),
    right: published,
    ours,
    holds: holds && differs(misprint),
  };
}

export const collectEvidence = (): Evidence => ({
  sets: publishedSets.map(judgedSet),
  bands: inverseBands(),
  residuals: conversionResiduals(),
  certified: [...certifiedPolynomials(), ...certifiedUnivariate()],
  misprints: misprints.map(judgedMisprint),
});

const short = <T extends { readonly holds: boolean }>(
  all: readonly T[],
  words: (one: T) => string,
): string[] => all.filter(({ holds }) => !holds).map(words);

/** What falls short, in words; empty when everything holds. */
export const shortfalls = ({ sets, bands, residuals, certified, misprints: printed }: Evidence): string[] => [
  ...sets.flatMap(({ source, rows }) =>
    short(rows, ({ what, published, ours }) => `${source}: ${what}: published ${published}, ours ${ours}`),
  ),
  ...short(
    bands,
    ({ type, emfRange, least, most }) =>
      `NIST SRD 60, inverse of type ${type}, ${emfRange.join(" to ")} mV: ${least} to ${most} °C is outside its band`,
  ),
  ...short(
    residuals,
    ({ name, worstDegrees, worstMillivolts }) =>
      `${name}: the inverse is off by up to ${worstDegrees} °C and ${worstMillivolts} mV`,
  ),
  ...short(
    certified,
    ({ set, what, certified: value, ours, digits }) =>
      `NIST StRD ${set}: ${what}: certified ${value}, ours ${ours}, ${digits} digits agree`,
  ),
  ...short(
    printed,
    ({ what, right, misprinted, ours }) => `${what}: right ${right}, misprinted ${misprinted}, ours ${ours}`,
  ),
];
