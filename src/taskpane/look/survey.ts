import { serialText, shownValue, withUnit } from "../live/show-value";
import { Trouble } from "../workbook/trouble";
import type { CellValue } from "../workbook/workbook";
import { single } from "./drawn-functions";
import type { Figure, Line } from "./figure";

export interface SurveyBlock {
  readonly times: readonly (readonly CellValue[])[];
  readonly readings: readonly (readonly CellValue[])[];
  readonly names: readonly string[];
  readonly setpoint: number;
  readonly tolerance: number;
  /** Added to each sensor's readings, as the functions do; left out, nothing is. */
  readonly corrections?: readonly number[];
  /** The whole log, or what is near the band. */
  readonly whole: boolean;
}

/** What counts as near the band, in tolerances from the set point. */
const NEAR = 3;

export interface SensorLine {
  readonly name: string;
  readonly lowest: number | null;
  readonly highest: number | null;
  /** Of the readings in the marked stretch, the one farthest from the set point. */
  readonly worst: { readonly deviation: number; readonly time: number } | undefined;
}

export interface SurveyFigure {
  readonly figure: Figure;
  readonly sensors: readonly SensorLine[];
}

const FIRST_DATE = 20_000;

/** A survey over time: the sensors, the band, the soak, and the worst sensors marked. */
export function surveyFigure({
  times,
  readings: raw,
  names,
  setpoint,
  tolerance,
  corrections,
  whole,
}: SurveyBlock): SurveyFigure {
  const readings = corrections === undefined ? raw : corrected(raw, corrections);
  const rows = times.flatMap(([time], index) =>
    typeof time === "number" && readings[index] ? [{ time, cells: readings[index] }] : [],
  );
  if (rows.length < 2) throw new Trouble("The times must be numbers, one for each row of readings.");
  const x = rows.map(({ time }) => time);
  const soak = soakOf({ times, readings, setpoint, tolerance });
  const inSoak = (time: number) => !soak || (time >= soak.from && time <= soak.to);
  const sensors = names.map((name, index) =>
    sensorOf(
      name,
      rows.map(({ time, cells }) => ({ time, value: cells[index] })),
      setpoint,
      inSoak,
    ),
  );
  const ranked = sensors
    .filter(({ worst }) => worst)
    .sort((a, b) => Math.abs(b.worst!.deviation) - Math.abs(a.worst!.deviation));
  const worstNames = new Set(ranked.slice(0, sensors.length > 3 ? 2 : 1).map(({ name }) => name));
  const lines: Line[] = names.map((name, index) => ({
    label: name,
    values: rows.map(({ cells }) => (typeof cells[index] === "number" ? cells[index] : null)),
    role: worstNames.has(name) ? "ember" : "muted",
    named: worstNames.has(name) || names.length <= 3,
  }));
  const clock = (time: number) =>
    time >= FIRST_DATE ? serialText(time, true).slice(11, 16) : shownValue(time);
  const [first] = ranked;
  const title = first
    ? `${first.name} reaches ${signed(first.worst!.deviation)} at ${clock(first.worst!.time)}${soak ? ", the most in the soak" : ""}`
    : "No sensor has readings here";
  return {
    figure: {
      title,
      x: { label: x[0]! >= FIRST_DATE ? "time of day" : "time", isTime: x[0]! >= FIRST_DATE, values: x },
      y: {
        label: "temperature, °C",
        ...(soak && !whole ? { from: setpoint - NEAR * tolerance, to: setpoint + NEAR * tolerance } : {}),
      },
      // The worst are drawn last, over the rest.
      lines: lines.sort((a, b) => Number(a.role === "ember") - Number(b.role === "ember")),
      bands: [
        {
          low: x.map(() => setpoint - tolerance),
          high: x.map(() => setpoint + tolerance),
          label: "tolerance",
          role: "slate",
        },
      ],
      level: { value: setpoint, label: "set" },
      ...(soak ? { stretch: { ...soak, label: "soak" } } : {}),
    },
    sensors,
  };
}

/** Sensors are named from what is judged: the corrected readings. */
const corrected = (readings: SurveyBlock["readings"], corrections: readonly number[]): CellValue[][] =>
  readings.map((cells) =>
    cells.map((cell, sensor) => (typeof cell === "number" ? cell + (corrections[sensor] ?? 0) : cell)),
  );

const signed = (deviation: number) =>
  withUnit(`${deviation > 0 ? "+" : ""}${deviation.toFixed(1).replace("-", "−")}`, "°C");

/** Undefined where the sensors were never in band together. */
function soakOf({
  times,
  readings,
  setpoint,
  tolerance,
}: Omit<SurveyBlock, "names" | "corrections" | "whole">): { from: number; to: number } | undefined {
  const unit = typeof times[0]?.[0] === "number" && times[0][0] < FIRST_DATE ? "min" : null;
  const metric = (name: string) =>
    single("SOAK", times, readings, setpoint, tolerance, null, null, unit, name);
  const [from, to] = [metric("start"), metric("end")];
  return typeof from === "number" && typeof to === "number" ? { from, to } : undefined;
}

function sensorOf(
  name: string,
  readings: readonly { time: number; value: CellValue | undefined }[],
  setpoint: number,
  inSoak: (time: number) => boolean,
): SensorLine {
  let lowest: number | null = null;
  let highest: number | null = null;
  let worst: SensorLine["worst"];
  for (const { time, value } of readings) {
    if (typeof value !== "number") continue;
    lowest = lowest === null ? value : Math.min(lowest, value);
    highest = highest === null ? value : Math.max(highest, value);
    const deviation = value - setpoint;
    if (inSoak(time) && (!worst || Math.abs(deviation) > Math.abs(worst.deviation)))
      worst = { deviation, time };
  }
  return { name, lowest, highest, worst };
}
