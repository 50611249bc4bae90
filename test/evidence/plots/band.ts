/** A published inverse approximation less our inverse, over its EMF: the printed band pale, the difference in ember. */
import type { InverseBand } from "../../published/inverse-bands";
import { across, band, FLOOR, frame, LEFT, TOP, tick, trace } from "./frame";

/** Each second of the points is enough for a picture of this size. */
const KEPT = 2;

export function bandPlot({
  type,
  emfRange: [from, to],
  errorBand: [lower, upper],
  points,
}: InverseBand): string {
  const x = across(from, to);
  const margin = 0.25 * (upper - lower);
  const [low, high] = [lower - margin, upper + margin];
  const down = (error: number): number =>
    TOP + ((high - Math.min(Math.max(error, low), high)) / (high - low)) * (FLOOR - TOP);
  const kept = points.filter((_, i) => i % KEPT === 0);
  const inside = [
    band(down(upper), down(lower)),
    trace(kept.map(([emf, error]) => [x(emf), down(error)])),
    tick(LEFT + 4, down(upper) - 3, `${upper} °C`),
    tick(LEFT + 4, down(lower) + 12, `${lower} °C`),
  ];
  const title = `type ${type}, ${from} to ${to} mV`;
  return frame(
    title,
    `${title}: within ${lower} to ${upper} °C`,
    [`${from} mV`, `${to} mV`],
    inside.join("\n"),
  );
}
