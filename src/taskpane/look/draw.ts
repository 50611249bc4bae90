import uPlot from "uplot";
import { serialText } from "../live/show-value";
import type { Figure, Role } from "./figure";
import "uplot/dist/uPlot.min.css";

const HEIGHT = 280;
const LABEL_HEIGHT = 14;

type Colours = Readonly<Record<Role | "ink" | "line" | "paper", string>>;

export interface Drawing {
  readonly canvas: HTMLCanvasElement;
  readonly end: () => void;
}

/** Draws a figure into a place of the page, in the page's colours of the moment, as wide as the place is. */
export function draw(place: HTMLElement, figure: Figure): Drawing {
  const colours = coloursOf(place);
  const font = `12px ${getComputedStyle(place).fontFamily}`;
  const axis = (label: string, isTime = false): uPlot.Axis => ({
    label,
    labelFont: font,
    font,
    labelSize: 20,
    stroke: colours.ink,
    grid: { stroke: colours.line, width: 1 },
    ticks: { stroke: colours.line, width: 1 },
    ...(isTime
      ? { values: (_: uPlot, ticks: number[]) => ticks.map((tick) => serialText(tick, true).slice(11, 16)) }
      : {}),
  });
  const plot = new uPlot(
    {
      width: Math.max(240, place.clientWidth),
      height: HEIGHT,
      padding: [12, 56, 0, 0],
      legend: { show: false },
      cursor: { show: false },
      select: { show: false, left: 0, top: 0, width: 0, height: 0 },
      scales: { x: { time: false }, y: { range: yRange(figure) } },
      axes: [
        {
          ...axis(figure.x.label, figure.x.isTime),
          size: 32,
          ...(figure.x.isTime
            ? { splits: (_: uPlot, __: number, from: number, to: number) => timeTicks(from, to) }
            : {}),
        },
        { ...axis(figure.y.label), size: 48 },
      ],
      series: [
        {},
        ...figure.lines.map(({ role, label }, index) => ({
          label,
          stroke: colours[role],
          width: role === "muted" ? 1 : 2,
          points: { show: false },
          ...(role === "slate" && index > 1 ? { dash: [6, 3 * index] } : {}),
        })),
      ],
      hooks: {
        drawClear: [(u) => drawBehind(u, figure, colours, font)],
        draw: [(u) => drawNames(u, figure, colours, font)],
      },
    },
    [[...figure.x.values], ...figure.lines.map(({ values }) => [...values])] as uPlot.AlignedData,
    place,
  );
  const observer = new ResizeObserver(() => {
    const width = Math.max(240, place.clientWidth);
    if (width !== plot.width) plot.setSize({ width, height: HEIGHT });
  });
  observer.observe(place);
  return {
    canvas: plot.ctx.canvas,
    end() {
      observer.disconnect();
      plot.destroy();
    },
  };
}

/** Steps of a time axis in minutes: those that people count in. */
const STEPS = [1, 2, 5, 10, 15, 30, 60, 120, 180, 360, 720, 1440];
const MOST_TICKS = 5;

/** Whole steps of a time axis whose values are days. */
function timeTicks(from: number, to: number): number[] {
  const minutes = (to - from) * 1440;
  const step =
    (STEPS.find((each) => minutes / each <= MOST_TICKS) ?? 1440 * Math.ceil(minutes / 1440 / MOST_TICKS)) /
    1440;
  const ticks: number[] = [];
  for (let tick = Math.ceil(from / step) * step; tick <= to; tick += step) ticks.push(tick);
  return ticks;
}

/** Bands and levels count too: they must not lie outside the picture. */
function yRange({ lines, bands, level, y }: Figure): [number, number] {
  if (y.from !== undefined && y.to !== undefined) return [y.from, y.to];
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  const see = (values: readonly (number | null)[]) => {
    for (const value of values) {
      if (value === null) continue;
      low = Math.min(low, value);
      high = Math.max(high, value);
    }
  };
  for (const { values } of lines) see(values);
  for (const band of bands) [band.low, band.high].forEach(see);
  if (level) see([level.value]);
  if (low > high) return [0, 1];
  const room = (high - low || 1) * 0.05;
  return [low - room, high + room];
}

/** Canvas knows no variables of a style sheet: a probe in the page resolves them, system colours included. */
function coloursOf(place: HTMLElement): Colours {
  const probe = place.appendChild(document.createElement("span"));
  const resolve = (name: string) => {
    probe.style.color = `var(--${name})`;
    return getComputedStyle(probe).color;
  };
  const names = ["ember", "slate", "muted", "ink", "line", "paper"] as const;
  const colours = Object.fromEntries(names.map((name) => [name, resolve(name)])) as Record<
    (typeof names)[number],
    string
  >;
  probe.remove();
  return colours;
}

function drawBehind(u: uPlot, { bands, level, stretch, x }: Figure, colours: Colours, font: string): void {
  const { ctx } = u;
  const { left, top, width, height } = u.bbox;
  ctx.save();
  ctx.beginPath();
  ctx.rect(left, top, width, height);
  ctx.clip();
  if (stretch) {
    const [from, to] = [stretch.from, stretch.to].map((value) => u.valToPos(value, "x", true)) as [
      number,
      number,
    ];
    ctx.fillStyle = colours.slate;
    ctx.globalAlpha = 0.1;
    ctx.fillRect(from, top, to - from, height);
    ctx.globalAlpha = 1;
    ctx.font = scaled(font);
    ctx.textBaseline = "top";
    ctx.textAlign = "left";
    ctx.fillText(stretch.label, from + 4 * devicePixelRatio, top + 2 * devicePixelRatio);
  }
  for (const band of bands) {
    ctx.fillStyle = colours[band.role];
    ctx.globalAlpha = 0.16;
    ctx.beginPath();
    const points = x.values.flatMap((value, index) =>
      band.low[index] == null || band.high[index] == null ? [] : [{ value, index }],
    );
    for (const { value, index } of points)
      ctx.lineTo(u.valToPos(value, "x", true), u.valToPos(band.high[index]!, "y", true));
    for (const { value, index } of points.reverse())
      ctx.lineTo(u.valToPos(value, "x", true), u.valToPos(band.low[index]!, "y", true));
    ctx.fill();
    ctx.globalAlpha = 1;
  }
  if (level) {
    const y = u.valToPos(level.value, "y", true);
    ctx.strokeStyle = colours.ink;
    ctx.lineWidth = devicePixelRatio;
    ctx.setLineDash([4 * devicePixelRatio, 4 * devicePixelRatio]);
    ctx.beginPath();
    ctx.moveTo(left, y);
    ctx.lineTo(left + width, y);
    ctx.stroke();
  }
  ctx.restore();
}

/** Names at the ends of the lines, pushed apart where they would lie on one another. */
function drawNames(u: uPlot, { lines, level, x }: Figure, colours: Colours, font: string): void {
  const { ctx } = u;
  const names = lines
    .filter(({ named }) => named)
    .flatMap(({ label, values, role }) => {
      let last = values.length - 1;
      while (last >= 0 && values[last] === null) last--;
      if (last < 0) return [];
      return [
        {
          label,
          colour: colours[role],
          at: u.valToPos(x.values[last]!, "x", true),
          y: u.valToPos(values[last]!, "y", true),
        },
      ];
    });
  if (level)
    names.push({
      label: level.label,
      colour: colours.ink,
      at: u.bbox.left + u.bbox.width,
      y: u.valToPos(level.value, "y", true),
    });
  names.sort((a, b) => a.y - b.y);
  ctx.save();
  ctx.font = scaled(font);
  ctx.textBaseline = "middle";
  ctx.textAlign = "left";
  let free = Number.NEGATIVE_INFINITY;
  for (const { label, colour, at, y } of names) {
    const own = Math.max(y, free);
    free = own + LABEL_HEIGHT * devicePixelRatio;
    ctx.fillStyle = colour;
    ctx.fillText(label, at + 4 * devicePixelRatio, own);
  }
  ctx.restore();
}

const scaled = (font: string) => font.replace("12px", `${12 * devicePixelRatio}px`);
