/** A residual over a couple's range, as a small picture: promise as a pale band, our residual in ember. */
import { short } from "./group";
import { PROMISED_DEGREES, type Residuals } from "./residuals";

const WIDTH = 320;
const HEIGHT = 120;
const LEFT = 8;
const RIGHT = 8;
const TOP = 26;
const BOTTOM = 22;

/** From rounding noise up to what anybody could notice; decades share the height alike. */
const LEAST = 1e-15;
const MOST = 1e-7;

const down = (residual: number): number => {
  const size = Math.min(Math.max(Math.abs(residual), LEAST), MOST);
  const share = Math.log10(size / LEAST) / Math.log10(MOST / LEAST);
  return TOP + (1 - share) * (HEIGHT - TOP - BOTTOM);
};

const place = (value: number): string => value.toFixed(1);

/** `name` is plain text without marks of HTML. */
export function residualPlot({ name, low, high, points, worstDegrees }: Residuals): string {
  const across = (t: number): number => LEFT + ((t - low) / (high - low)) * (WIDTH - LEFT - RIGHT);
  const line = points.map(([t, residual]) => `${place(across(t))},${place(down(residual))}`).join(" ");
  const promise = down(PROMISED_DEGREES);
  const floor = HEIGHT - BOTTOM;
  const title = `${name}: at most ${short(worstDegrees)} °C`;
  return `<svg viewBox="0 0 ${WIDTH} ${HEIGHT}" role="img" aria-label="${title} from ${Math.round(low)} to ${high} °C">
<text class="title" x="${LEFT}" y="16">${title}</text>
<rect class="band" x="${LEFT}" y="${place(promise)}" width="${WIDTH - LEFT - RIGHT}" height="${place(floor - promise)}"/>
<line class="axis" x1="${LEFT}" y1="${floor}" x2="${WIDTH - RIGHT}" y2="${floor}"/>
<polyline class="trace" points="${line}"/>
<text class="tick" x="${LEFT + 4}" y="${place(promise - 4)}">1E-9 °C</text>
<text class="tick" x="${LEFT}" y="${HEIGHT - 6}">${Math.round(low)} °C</text>
<text class="tick" x="${WIDTH - RIGHT}" y="${HEIGHT - 6}" text-anchor="end">${high} °C</text>
</svg>`;
}
