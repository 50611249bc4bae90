/** What the small pictures of the page share: a size, margins, and numbers short enough for a file. */
export const WIDTH = 320;
export const HEIGHT = 132;
export const LEFT = 8;
export const RIGHT = 8;
export const TOP = 30;
export const BOTTOM = 22;

export const FLOOR = HEIGHT - BOTTOM;

export const place = (value: number): string => value.toFixed(1);

/** From left to right over a range. */
export const across =
  (from: number, to: number) =>
  (value: number): number =>
    LEFT + ((value - from) / (to - from)) * (WIDTH - LEFT - RIGHT);

/** `title` and `label` are plain text without marks of HTML; `ends` stand under the axis. */
export const frame = (
  title: string,
  label: string,
  ends: readonly [string, string],
  inside: string,
): string =>
  `<svg viewBox="0 0 ${WIDTH} ${HEIGHT}" role="img" aria-label="${label}">
<text class="title" x="${LEFT}" y="16">${title}</text>
${inside}
<line class="axis" x1="${LEFT}" y1="${FLOOR}" x2="${WIDTH - RIGHT}" y2="${FLOOR}"/>
<text class="tick" x="${LEFT}" y="${HEIGHT - 6}">${ends[0]}</text>
<text class="tick" x="${WIDTH - RIGHT}" y="${HEIGHT - 6}" text-anchor="end">${ends[1]}</text>
</svg>`;

export const band = (top: number, bottom: number): string =>
  `<rect class="band" x="${LEFT}" y="${place(top)}" width="${WIDTH - LEFT - RIGHT}" height="${place(bottom - top)}"/>`;

export const trace = (points: readonly (readonly [x: number, y: number])[]): string =>
  `<polyline class="trace" points="${points.map(([x, y]) => `${place(x)},${place(y)}`).join(" ")}"/>`;

export const tick = (x: number, y: number, text: string, anchor: "start" | "end" = "start"): string =>
  `<text class="tick" x="${x}" y="${place(y)}" text-anchor="${anchor}">${text}</text>`;
