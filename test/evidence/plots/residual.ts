/**
 * A residual over a couple's range, as a small picture on a logarithmic scale: what we promise as a pale band, our
 * residual in ember.
 */
import { short } from "../../published/published-value";
import { PROMISED_DEGREES, PROMISED_MILLIVOLTS, type Residuals } from "../residuals";
import { across, band, FLOOR, frame, RIGHT, TOP, tick, trace, WIDTH } from "./frame";

/** From rounding noise up to what anybody could notice; decades share the height alike. */
const LEAST = 1e-15;
const MOST = 1e-7;

const down = (residual: number): number => {
  const size = Math.min(Math.max(Math.abs(residual), LEAST), MOST);
  const share = Math.log10(size / LEAST) / Math.log10(MOST / LEAST);
  return TOP + (1 - share) * (FLOOR - TOP);
};

/** Names of couples are plain text without marks of HTML. */
export function residualPlot({ name, low, high, points, worstDegrees, byDegrees }: Residuals): string {
  const x = across(low, high);
  const promise = down(PROMISED_DEGREES);
  const title = `${name}: at most ${short(worstDegrees)} °C`;
  const instead = byDegrees ? "" : `, above it ${short(PROMISED_MILLIVOLTS)} mV holds`;
  const inside = [
    band(promise, FLOOR),
    trace(points.map(([t, residual]) => [x(t), down(residual)])),
    tick(WIDTH - RIGHT - 4, promise - 4, `1E-9 °C${instead}`, "end"),
  ];
  return frame(
    title,
    `${title} from ${Math.round(low)} to ${high} °C`,
    [`${Math.round(low)} °C`, `${high} °C`],
    inside.join("\n"),
  );
}
