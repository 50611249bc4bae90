/** Where an EMF that ought to rise with the temperature turns back. */
import { signChange } from "../numeric/root";

/** Slopes that are looked at between two joins: a published polynomial has far fewer turns. */
const LOOKS = 256;

/** Share by which golden-section search narrows its bracket at each step. */
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * The lowest temperature between the first and the last of `joins` (°C, rising) at which
 * `slope` changes sign; the first join where it falls throughout; undefined where it rises
 * throughout. Between looks the least slope is sought where it dips.
 */
export function turningPoint(slope: (t: number) => number, joins: readonly number[]): number | undefined {
  let before = joins[0] as number;
  let risesBefore: boolean | undefined;
  const changed = (t: number): number | undefined => {
    const rises = slope(t) > 0;
    if (risesBefore !== undefined && rises !== risesBefore) return signChange(slope, before, t);
    risesBefore = rises;
    before = t;
    return undefined;
  };
  for (const [from, to] of pieces(joins)) {
    const width = (to - from) / LOOKS;
    for (let i = 0; i <= LOOKS; i++) {
      const t = i === LOOKS ? to : from + i * width;
      const left = Math.max(from, t - width);
      const right = Math.min(to, t + width);
      const dips = slope(t) <= Math.min(slope(left), slope(right));
      const turn = (dips ? changed(leastBetween(slope, left, right)) : undefined) ?? changed(t);
      if (turn !== undefined) return turn;
    }
  }
  return risesBefore === false ? joins[0] : undefined;
}

/** From join to join; a join itself belongs to the piece below it. */
function pieces(joins: readonly number[]): [from: number, to: number][] {
  return joins.slice(1).map((to, i) => {
    const join = joins[i] as number;
    return [i === 0 ? join : join + (to - join) * 1e-12, to];
  });
}

/** Golden-section search for the least value of f. */
function leastBetween(f: (t: number) => number, a: number, b: number): number {
  let low = a;
  let high = b;
  for (let i = 0; i < 60; i++) {
    const width = GOLDEN * (high - low);
    if (f(high - width) < f(low + width)) high = low + width;
    else low = high - width;
  }
  return low + (high - low) / 2;
}
