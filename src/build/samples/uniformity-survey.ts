// The log of sample 4: nine sensors in an invented furnace, from the end of the ramp to the door.

import { noise, sfc32 } from "./generator";
import { logTime } from "./log-time";

export const SURVEY_LOG_FILE = "uniformity-survey.csv";
export const SURVEY_SCANS = 76;
export const MINUTES_PER_SCAN = 2;
export const SETPOINT = 900;

const SEED = 1826;
const START = Date.UTC(2026, 2, 9, 8);
const RAMP_RATE = 9; // °C per minute
const RAMP_FROM = 359;
const RAMP_END = (SETPOINT - RAMP_FROM) / RAMP_RATE;
const COOLING_FROM = 136; // minutes after the first scan

/** How far each sensor's place settles from the set point (°C), and how slowly it follows (minutes). */
const PLACES = [
  { offset: -1.2, lag: 1.7 },
  { offset: 0.8, lag: 1.6 },
  { offset: -1.9, lag: 1.9 },
  { offset: 1.9, lag: 1.4 },
  { offset: 2.6, lag: 0.9 },
  { offset: 1.1, lag: 1.5 },
  { offset: -0.6, lag: 1.8 },
  { offset: -2.6, lag: 1.9 },
  { offset: -3.1, lag: 2.1 },
];
const NOISE = 0.22;

/** From each sensor's certificate at the set point: what must be added to its readings. */
export const CORRECTIONS = [-0.4, 0.3, -0.6, -1.1, -2.4, 0.2, -0.3, 0.5, 0.4];

/** Sensor 5 sits by the burner and runs past the set point before the slow corners arrive. */
const OVERSHOOT = { sensor: 5, height: 7.4, at: RAMP_END + 1.9, width: 2 };

/** Scans count from 1; the logger writes a word for a sensor that it has lost. */
export const LOST = { sensor: 7, first: 49, last: 51, written: "open" };

export const SURVEY_LOG_NOTES = [
  "INVENTED DATA for trying out worksheet functions: no such furnace, no such works and no such survey exist.",
  "Nonesuch Works / furnace 3 / uniformity survey / nine type K couples / a scan every 2 min / °C as the logger shows them.",
];

export function uniformitySurvey(): string {
  const uniform = sfc32(SEED);
  const lines = [
    ...SURVEY_LOG_NOTES.map((note) => `# ${note}`),
    ["time", ...PLACES.map((_, i) => `S${i + 1} °C`)].join(","),
  ];
  for (let scan = 1; scan <= SURVEY_SCANS; scan++) {
    const minute = (scan - 1) * MINUTES_PER_SCAN;
    const cells = PLACES.map((_, i) => {
      const shown = truth(i, minute) - (CORRECTIONS[i] ?? 0) + NOISE * noise(uniform);
      const lost = LOST.sensor === i + 1 && scan >= LOST.first && scan <= LOST.last;
      return lost ? LOST.written : shown.toFixed(1);
    });
    lines.push([logTime(START, minute * 60), ...cells].join(","));
  }
  return `${lines.join("\n")}\n`;
}

/** A straight ramp seen through a first-order lag, the soak with the burner's hunting, and the door. */
function truth(place: number, minute: number): number {
  const { offset, lag } = PLACES[place] ?? { offset: 0, lag: 1 };
  const after = minute - RAMP_END;
  const behind = after < 0 ? RAMP_RATE * after - RAMP_RATE * lag : -RAMP_RATE * lag * Math.exp(-after / lag);
  const past =
    OVERSHOOT.sensor === place + 1
      ? OVERSHOOT.height * Math.exp(-(((minute - OVERSHOOT.at) / OVERSHOOT.width) ** 2))
      : 0;
  const hunting = after > 0 ? 0.3 * Math.sin(minute / 4.3) : 0;
  const cooling = minute > COOLING_FROM ? -9 * (minute - COOLING_FROM) : 0;
  return SETPOINT + offset + behind + past + hunting + cooling;
}
