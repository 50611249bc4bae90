// The log of sample 5: six probes in an invented steriliser load.

import { noise, sfc32 } from "./generator";
import { logTime } from "./log-time";

export const LOAD_LOG_FILE = "steriliser-load.csv";
export const LOAD_SCANS = 121;
export const SECONDS_BETWEEN = 30;

const SEED = 1879;
const START = Date.UTC(2026, 2, 11, 9);
const ROOM = 24;
const HOLD = 122.4;
const HEATING_TIME = 5.2; // minutes in which the distance to the hold temperature falls to 1/e
const VENT = 41; // minutes after the first scan

/** How slowly each probe's place follows the chamber (minutes), and how far its probe reads from it (°C). */
const PROBES = [
  { lag: 0.4, offset: 0.1 },
  { lag: 1.2, offset: -0.1 },
  { lag: 2.1, offset: 0.0 },
  { lag: 5.6, offset: -0.2 },
  { lag: 1.8, offset: 0.1 },
  { lag: 2.6, offset: -0.1 },
];
const NOISE = 0.05;

/** Scans count from 1. */
export const SILENT = { probe: 5, first: 66, last: 71 };

export const LOAD_LOG_NOTES = [
  "INVENTED DATA for trying out worksheet functions: no such steriliser, no such load and no such works exist.",
  "Nonesuch Works / steriliser 1 / load 0088 / six probes / a scan every 30 s / °C, calibration corrections already added.",
];

export function steriliserLoad(): string {
  const uniform = sfc32(SEED);
  const seen = PROBES.map(() => ROOM);
  const lines = [
    ...LOAD_LOG_NOTES.map((note) => `# ${note}`),
    ["time", ...PROBES.map((_, i) => `P${i + 1} °C`)].join(","),
  ];
  for (let scan = 1; scan <= LOAD_SCANS; scan++) {
    const now = chamber(((scan - 1) * SECONDS_BETWEEN) / 60);
    const cells = PROBES.map(({ lag, offset }, i) => {
      const before = seen[i] ?? now;
      const step = SECONDS_BETWEEN / 60;
      const place = before + (now - before) * (step / (step + lag));
      seen[i] = place;
      const shown = (place + offset + NOISE * noise(uniform)).toFixed(1);
      const silent = SILENT.probe === i + 1 && scan >= SILENT.first && scan <= SILENT.last;
      return silent ? "" : shown;
    });
    lines.push([logTime(START, (scan - 1) * SECONDS_BETWEEN), ...cells].join(","));
  }
  return `${lines.join("\n")}\n`;
}

function chamber(minute: number): number {
  const heated = (at: number) => HOLD - (HOLD - ROOM) * Math.exp(-at / HEATING_TIME);
  if (minute < VENT) return heated(minute) + (minute > 20 ? 0.15 * Math.sin(minute / 1.3) : 0);
  return 40 + (heated(VENT) - 40) * Math.exp(-(minute - VENT) / 8);
}
