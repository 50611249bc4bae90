/** 95 % coverage intervals from sorted trials, JCGM 101:2008, clause 7.7. */

export const COVERAGE_PROBABILITY = 0.95;

export interface Interval {
  readonly low: number;
  readonly high: number;
}

/** How many trials an interval spans, and the rank (from 0) at which the symmetric one starts. */
export function ranks(trials: number): { readonly span: number; readonly first: number } {
  const span = Math.round(COVERAGE_PROBABILITY * trials);
  return { span, first: Math.floor((trials - span + 1) / 2) - 1 };
}

/** With as many trials below it as above it. */
export function symmetricInterval(sorted: Float64Array): Interval {
  const { span, first } = ranks(sorted.length);
  return { low: sorted[first] as number, high: sorted[first + span] as number };
}

/** The narrowest that spans as many trials. */
export function shortestInterval(sorted: Float64Array): Interval {
  const { span } = ranks(sorted.length);
  let first = 0;
  let narrowest = Number.POSITIVE_INFINITY;
  for (let i = 0; i + span < sorted.length; i++) {
    const width = (sorted[i + span] as number) - (sorted[i] as number);
    if (width < narrowest) {
      narrowest = width;
      first = i;
    }
  }
  return { low: sorted[first] as number, high: sorted[first + span] as number };
}
