import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { readLog } from "../../src/build/sample-log";
import { FAULTS, FURNACE_LOG_PATH, furnaceLog } from "../../src/build/samples/furnace-log";
import { thermocouple } from "../../src/core";

const text = furnaceLog();
const log = readLog(text);
const { blank, openSensor, text: textCell } = FAULTS;

test("the same log comes out every time, and it is the committed one", () => {
  expect(furnaceLog()).toBe(text);
  expect(readFileSync(FURNACE_LOG_PATH, "utf8").replaceAll("\r\n", "\n")).toBe(text);
});

test("its first line says that it is invented", () => {
  expect(text.split("\n")[0]).toMatch(/^# INVENTED DATA/);
});

test("2 000 scans, 30 s apart, with the columns the sheet expects", () => {
  const lines = text.split("\n").filter((line) => !line.startsWith("#"));
  expect(lines[0]).toBe("time,CH1 mV,CH2 mV,CH3 mV,CH4 mV,terminal °C");
  expect(log.times).toHaveLength(2000);
  expect(log.times.slice(0, 2)).toEqual(["2026-03-02 06:00:00", "2026-03-02 06:00:30"]);
  expect(log.times.at(-1)).toBe("2026-03-02 22:39:30");
  expect(log.channels).toEqual(["CH1", "CH2", "CH3", "CH4"]);
  for (const line of lines.slice(1, -1)) expect(line.split(",")).toHaveLength(6);
});

test("readings are written to 3 decimals, terminal temperatures to 1", () => {
  for (const line of text.trimEnd().split("\n").slice(5)) {
    const [, ...cells] = line.split(",");
    const terminal = cells.pop();
    expect(terminal).toMatch(/^(\d\d\.\d)?$/);
    for (const cell of cells) expect(cell).toMatch(/^(-?\d+\.\d{3}|fault)?$/);
  }
});

test("the faults stand where they were put, and nowhere else", () => {
  log.millivolts.forEach((row, index) => {
    const scan = index + 1;
    const inBlank = scan >= blank.first && scan <= blank.last;
    expect(log.terminals[index]?.[0] === "").toBe(inBlank);
    row.forEach((cell, column) => {
      const channel = column + 1;
      const open = channel === openSensor.channel && scan >= openSensor.first && scan <= openSensor.last;
      if (inBlank) expect(cell).toBe("");
      else if (open) expect(cell).toBe(99.999);
      else if (channel === textCell.channel && scan === textCell.scan) expect(cell).toBe("fault");
      else expect(cell).toSatisfy((value: unknown) => typeof value === "number" && Math.abs(value) < 40);
    });
  });
});

test("the terminals drift between 24 and 31 °C", () => {
  const terminals = log.terminals.flat().filter((cell) => typeof cell === "number");
  expect(Math.min(...terminals)).toBeGreaterThanOrEqual(24);
  expect(Math.max(...terminals)).toBeLessThanOrEqual(31);
  expect(Math.max(...terminals) - Math.min(...terminals)).toBeGreaterThan(4);
});

test("converted back, the load soaks near 925 °C, after a ramp that overshoots", () => {
  const typeK = thermocouple("K");
  if (typeK === undefined) throw new Error("no type K");
  const first = log.millivolts.map(([emf], index) => {
    const terminal = log.terminals[index]?.[0];
    if (typeof emf !== "number" || typeof terminal !== "number") return Number.NaN;
    return typeK.temperature(emf + typeK.emf(terminal));
  });
  const soak = first.slice(700, 1250);
  for (const t of soak) expect(Math.abs(t - 925)).toBeLessThan(5);
  expect(Math.max(...first.filter(Number.isFinite))).toBeGreaterThan(Math.max(...soak) + 1);
  expect(first[0]).toBeLessThan(40);
  expect(first.at(-1)).toBeLessThan(200);
});
