/** From where an EMF belongs to one temperature only. */
import { signChange } from "../numeric/root";
import type { Segment } from "./segment";

const STEPS = 512;

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
  return signChange((t) => first.emf(t) - start, fallenTo, Math.min(fallenTo + step, first.to));
}
