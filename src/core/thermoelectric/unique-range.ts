/** From where an EMF belongs to one temperature only. */
import type { Segment } from "./segment";

const STEPS = 512;

/** Root of a function that changes sign between a and b, by bisection down to neighbouring doubles. */
function crossing(f: (t: number) => number, a: number, b: number): number {
  const rises = f(b) > 0;
  let low = a;
  let high = b;
  for (;;) {
    const middle = low + (high - low) / 2;
    if (middle === low || middle === high) return high;
    if (f(middle) > 0 === rises) high = middle;
    else low = middle;
  }
}

/**
 * The lowest t from which E(t) rises and every EMF is reached once. Where E falls
 * first (type B, from 0 °C to its minimum near 21 °C), that is where E has come
 * back to its value at the lower end of the range.
 */
export function uniqueFrom(first: Segment): number {
  const step = (first.to - first.from) / STEPS;
  const start = first.emf(first.from);
  let fallenTo = first.from;
  for (let i = 1; i <= STEPS; i++) {
    const t = first.from + i * step;
    if (first.emf(t) <= start) fallenTo = t;
  }
  if (fallenTo === first.from) return first.from;
  return crossing((t) => first.emf(t) - start, fallenTo, Math.min(fallenTo + step, first.to));
}
