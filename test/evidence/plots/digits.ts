/** Digits that agree with NIST's certified values: a line for each set, a dot for each value, what is asked for pale. */
import { ASKED_DIGITS, type CertifiedValue } from "../../published/certified";
import { place } from "./frame";

const LEFT = 84;
const WIDTH = 640;
const RIGHT = 12;
const LINE = 22;
const TOP = 8;

const FROM = 7;
const TO = 15;

const across = (digits: number): number =>
  LEFT + ((Math.max(digits, FROM) - FROM) / (TO - FROM)) * (WIDTH - LEFT - RIGHT);

function line(set: string, values: readonly CertifiedValue[], i: number): string {
  const y = TOP + i * LINE;
  const middle = y + LINE / 2;
  const asked = Math.min(...values.map((one) => one.asked));
  const dots = values.map(({ digits, asked: least }) => {
    const mark = least === ASKED_DIGITS ? "dot" : "dot other";
    return `<circle class="${mark}" cx="${place(across(digits))}" cy="${middle}" r="3.5"/>`;
  });
  return `<text x="0" y="${middle + 4}">${set}</text>
<rect class="band" x="${place(across(asked))}" y="${y + 3}" width="${place(across(TO) - across(asked))}" height="${LINE - 6}"/>
${dots.join("")}`;
}

export function digitsPlot(certified: readonly CertifiedValue[]): string[] {
  const sets = [...new Set(certified.map(({ set }) => set))];
  const floor = TOP + sets.length * LINE + 4;
  const ticks = Array.from({ length: TO - FROM + 1 }, (_, i) => FROM + i).map(
    (digits) =>
      `<text class="tick" x="${place(across(digits))}" y="${floor + 16}" text-anchor="middle">${digits}</text>`,
  );
  return [
    `<svg viewBox="0 0 ${WIDTH} ${floor + 36}" role="img" aria-label="Digits that agree with the certified values, set by set">
${sets
  .map((set, i) =>
    line(
      set,
      certified.filter((one) => one.set === set),
      i,
    ),
  )
  .join("\n")}
<line class="axis" x1="${LEFT}" y1="${floor}" x2="${WIDTH - RIGHT}" y2="${floor}"/>
${ticks.join("")}
<text class="tick" x="${WIDTH - RIGHT}" y="${floor + 32}" text-anchor="end">digits that agree, of 15</text>
</svg>`,
  ];
}
