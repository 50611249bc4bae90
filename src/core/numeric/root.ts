/** The place where a rising function reaches a value. */

export interface Rising {
  value(x: number): number;
  slope(x: number): number;
}

const MOST_STEPS = 200;

/**
 * x in low…high with f(x) = target: Newton's method inside a shrinking bracket, halving
 * it when a step would leave it. Ends when a step is below `converged`. f must rise, up
 * to its own rounding, and the target lie between f(low) and f(high). Allocates nothing.
 */
export function whereReached(
  f: Rising,
  target: number,
  low: number,
  high: number,
  start: number,
  converged: number,
): number {
  let x = start >= low && start <= high ? start : low + (high - low) / 2;
  let below = low;
  let above = high;
  for (let i = 0; i < MOST_STEPS; i++) {
    const missing = target - f.value(x);
    if (missing === 0) return x;
    if (missing > 0) below = x;
    else above = x;
    const next = x + missing / f.slope(x);
    if (Math.abs(next - x) <= converged) return Math.min(Math.max(next, below), above);
    // On an end already tried it would go round in a circle where f jumps over the target.
    x = next > below && next < above ? next : below + (above - below) / 2;
    if (above - below <= converged) return x;
  }
  return x;
}

/** Where a function changes sign between a and b, by bisection down to neighbouring doubles. */
export function signChange(f: (x: number) => number, a: number, b: number): number {
  const positiveAtB = f(b) > 0;
  let low = a;
  let high = b;
  for (;;) {
    const middle = low + (high - low) / 2;
    if (middle === low || middle === high) return high;
    if (f(middle) > 0 === positiveAtB) high = middle;
    else low = middle;
  }
}
