// The sample log: what a logger in an invented works would have written about one load, with the faults that
// real logs have. Seeded, so that it comes out the same each time and the committed file can be compared.

import { thermocouple } from "../../core";
import {
  chamberTemperatures,
  SCANS,
  SECONDS_PER_SCAN,
  SOAK_TEMPERATURE,
  terminalTemperature,
} from "./furnace";
import { noise, sfc32 } from "./generator";
import { logTime } from "./log-time";

export const FURNACE_LOG_PATH = "samples/furnace-log.csv";

const SEED = 1821; // the year in which Seebeck saw the needle move

/** Four type K couples: how far each reads from the chamber when hot (°C), and how slowly it follows (minutes). */
const CHANNELS = [
  { offset: 1.4, lag: 0.8 },
  { offset: -0.9, lag: 1.1 },
  { offset: 0.4, lag: 1.0 },
  { offset: -2.2, lag: 2.4 },
];
const NOISE_MV = 0.008;

export const CHANNEL_COUNT = CHANNELS.length;

/** Scans count from 1; each fault covers its first and last scan. */
export const FAULTS = {
  blank: { first: 421, last: 446 },
  openSensor: { channel: 3, first: 900, last: 939, written: "99.999" },
  text: { channel: 2, scan: 1501, written: "fault" },
};

/** What the file says of itself, and the sheet too. */
export const LOG_NOTES = [
  "INVENTED DATA for trying out worksheet functions: no such furnace and no such works exist.",
  "Nonesuch Works / furnace 3 / load 0417 / four type K couples / a scan every 30 s",
  "mV as measured at the logger's terminals (not compensated); terminal °C is the reference junction.",
  "Faults put in on purpose: a blank stretch; CH3 open for a while (99.999); one text cell in CH2.",
];

/** The whole file as text. */
export function furnaceLog(): string {
  const typeK = thermocouple("K");
  if (typeK === undefined) throw new Error("There is no type K to write the sample with.");
  const uniform = sfc32(SEED);
  const chamber = chamberTemperatures();
  const junctions = CHANNELS.map(() => chamber[0] ?? 0);
  const lines = [...LOG_NOTES.map((note) => `# ${note}`), "time,CH1 mV,CH2 mV,CH3 mV,CH4 mV,terminal °C"];
  for (let scan = 1; scan <= SCANS; scan++) {
    const now = chamber[scan - 1] ?? 0;
    const terminal = terminalTemperature(scan, noise(uniform));
    const cells = CHANNELS.map(({ offset, lag }, channel) => {
      const before = junctions[channel] ?? now;
      const junction = before + (now - before) * (SECONDS_PER_SCAN / 60 / (SECONDS_PER_SCAN / 60 + lag));
      junctions[channel] = junction;
      const seen = junction + offset * (junction / SOAK_TEMPERATURE);
      const emf = typeK.emf(seen) - typeK.emf(terminal) + NOISE_MV * noise(uniform);
      return writtenInstead(scan, channel + 1) ?? emf.toFixed(3);
    });
    const blank = isBlank(scan);
    lines.push([timeOf(scan), ...cells, blank ? "" : terminal.toFixed(1)].join(","));
  }
  return `${lines.join("\n")}\n`;
}

function isBlank(scan: number): boolean {
  return scan >= FAULTS.blank.first && scan <= FAULTS.blank.last;
}

function writtenInstead(scan: number, channel: number): string | undefined {
  const { openSensor, text } = FAULTS;
  if (isBlank(scan)) return "";
  if (channel === openSensor.channel && scan >= openSensor.first && scan <= openSensor.last) {
    return openSensor.written;
  }
  if (channel === text.channel && scan === text.scan) return text.written;
  return undefined;
}

const timeOf = (scan: number): string =>
  logTime(Date.UTC(2026, 2, 2, 6, 0, 0), (scan - 1) * SECONDS_PER_SCAN);
