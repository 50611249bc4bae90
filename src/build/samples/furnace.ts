// An invented furnace: where its temperature stands at every scan of one load. Simple, but it does what a real
// one does to a log: it lags behind the ramp, overshoots, hunts a little in the soak and cools ever slower.

export const SCANS = 2000;
export const SECONDS_PER_SCAN = 30;
export const SOAK_TEMPERATURE = 925;

const ROOM = 26;
const RAMP_START = 10; // minutes after the first scan
const RAMP_RATE = 4; // °C per minute
const RAMP_END = RAMP_START + (SOAK_TEMPERATURE - ROOM) / RAMP_RATE;
export const SOAK_END = 640;
const COOLING_TIME = 150; // minutes in which the distance to the room falls to 1/e

/** What the controller asks for. */
function program(minute: number): number {
  if (minute < RAMP_START) return ROOM;
  if (minute < RAMP_END) return ROOM + RAMP_RATE * (minute - RAMP_START);
  if (minute < SOAK_END) return SOAK_TEMPERATURE;
  return ROOM + (SOAK_TEMPERATURE - ROOM) * Math.exp((SOAK_END - minute) / COOLING_TIME);
}

/** What the chamber does: a damped oscillator behind the program, and the burner's own slow hunting when hot. */
export function chamberTemperatures(): number[] {
  const stiffness = 0.15; // per minute
  const damping = 0.62;
  const step = SECONDS_PER_SCAN / 60;
  const temperatures: number[] = [];
  let temperature = ROOM;
  let rate = 0;
  for (let scan = 0; scan < SCANS; scan++) {
    const minute = scan * step;
    const hunting = 0.6 * Math.sin(minute / 1.9) * (temperature / SOAK_TEMPERATURE);
    temperatures.push(temperature + (minute < SOAK_END ? hunting : 0));
    rate += step * (stiffness ** 2 * (program(minute) - temperature) - 2 * damping * stiffness * rate);
    temperature += step * rate;
  }
  return temperatures;
}

/** The logger's terminals warm up with the day and cool again: 24 to 31 °C, to the tenth that the logger writes. */
export function terminalTemperature(scan: number, noise: number): number {
  const day = Math.sin((Math.PI * scan) / (1.15 * SCANS));
  return Math.round(10 * (24.4 + 6.1 * day + 0.06 * noise)) / 10;
}
