// Readings as wrong setups would have logged them, from the temperatures of the invented furnace.

import { type Thermocouple, thermocouple } from "../../core";
import { chamberTemperatures, SECONDS_PER_SCAN, terminalTemperature } from "./furnace";
import { noise, sfc32 } from "./generator";
import { serialTime } from "./log-time";

const SCANS_APART = 20;

type Row = [time: number, ...cells: (number | null)[]];

function couple(designation: string): Thermocouple {
  const found = thermocouple(designation);
  if (found === undefined) throw new Error(`There is no type ${designation} to write the sample with.`);
  return found;
}

const toTenth = (value: number) => Math.round(10 * value) / 10;

/** One line each ten minutes from the middle of the ramp into the soak. */
function lines<T extends Row>(
  start: number,
  seed: number,
  line: (time: number, truth: number, terminal: number) => T,
): T[] {
  const chamber = chamberTemperatures();
  const uniform = sfc32(seed);
  return Array.from({ length: 18 }, (_, i) => {
    const scan = 161 + i * SCANS_APART;
    const terminal = terminalTemperature(scan, noise(uniform));
    const truth = (chamber[scan - 1] ?? 0) + 0.3 * noise(uniform);
    return line(serialTime(start, (scan - 1) * SECONDS_PER_SCAN), truth, terminal);
  });
}

/** Type K fitted, the instrument set to J: time, logged °C, terminal °C. One reading was never written. */
export function wrongTypeRows(): Row[] {
  const [set, fitted] = [couple("J"), couple("K")];
  return lines(Date.UTC(2026, 2, 5, 6), 1822, (time, truth, terminal): Row => {
    const emf = fitted.emf(truth) - fitted.emf(terminal);
    return [time, toTenth(set.temperature(emf + set.emf(terminal))), terminal];
  }).map((row, i) => (i === 6 ? [row[0], null, row[2] ?? null] : row));
}

/** The extension pair crossed at head and terminals: time, logged °C, head °C, terminal °C. */
export function crossedRows(): Row[] {
  const typeK = couple("K");
  return lines(Date.UTC(2026, 2, 6, 6), 1823, (time, truth, terminal): Row => {
    // The head warms up with the furnace door that it is screwed to.
    const head = toTenth(34 + truth / 22);
    const logged = typeK.temperature(typeK.emf(truth) - 2 * (typeK.emf(head) - typeK.emf(terminal)));
    return [time, toTenth(logged), head, terminal];
  });
}
