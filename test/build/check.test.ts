import { expect, test } from "vitest";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import { checkSample } from "../../src/build/check";
import { readLog } from "../../src/build/sample-log";
import { WorksheetError } from "../../src/catalogue/functions-runtime";

const LOG = `# invented
time,CH1 mV,CH2 mV,terminal °C
06:00:00,1.000,2.000,20.0
06:00:30,99.999,,20.0
06:01:00,88.888,fault,
`;

/** Stands in for a built bundle: multiplies by ten, and refuses as the real one does. */
const BUNDLE = `CustomFunctions.associate("TEMPERATURE", (emf, type, terminal) => emf.map((row) => row.map((cell) => {
  const { ErrorCode } = CustomFunctions;
  if (cell === "") return "";
  if (typeof cell === "string") return new CustomFunctions.Error(ErrorCode.invalidValue, "text, not a number");
  if (cell > 50) return new CustomFunctions.Error(ErrorCode.notAvailable, cell + " mV is above 54.886 mV");
  return cell * 10;
})));`;

test("a log is read with its comments left out, numbers as numbers and gaps as empty text", () => {
  const log = readLog(LOG);
  expect(log.channels).toEqual(["CH1", "CH2"]);
  expect(log.millivolts).toEqual([
    [1, 2],
    [99.999, ""],
    [88.888, "fault"],
  ]);
  expect(log.terminals).toEqual([[20], [20], [""]]);
});

test("a log without the columns is refused", () => {
  expect(() => readLog("a,b\n1,2\n")).toThrow("terminal °C");
});

test("the check counts temperatures and groups what was refused by reason", () => {
  const { lines, temperatures } = checkSample(BUNDLE, LOG);
  const text = lines.join("\n");
  expect(temperatures).toBe(2);
  expect(text).toContain("3 scans of 2 channels, 06:00:00 to 06:01:00");
  expect(text).toMatch(/2 refused #N\/A, first at scan 2 of CH1: 99.999 mV is above 54.886 mV/);
  expect(text).toMatch(/1 refused #VALUE!, first at scan 3 of CH2: text, not a number/);
  expect(text).toMatch(/1 blank, first at scan 2 of CH2$/m);
  expect(text).toMatch(/first scan +10\.00 °C +20\.00 °C/);
  expect(text).toMatch(/last scan +#N\/A +#VALUE!/);
  expect(text).toMatch(/highest +10\.00 °C +20\.00 °C/);
});

test("a bundle that gives no numbers is seen to give none", () => {
  const empty = `CustomFunctions.associate("TEMPERATURE", (emf) => emf.map((row) => row.map(() => NaN)));`;
  const { temperatures, lines } = checkSample(empty, LOG);
  expect(temperatures).toBe(0);
  expect(lines.join("\n")).toContain("neither number nor error, first at scan 1 of CH1: NaN");
});

test("a bundle without TEMPERATURE, or with too few rows, is an error", () => {
  expect(() => checkSample("", LOG)).toThrow("no function TEMPERATURE");
  expect(() => checkSample(`CustomFunctions.associate("TEMPERATURE", () => [[1]])`, LOG)).toThrow(
    "1 rows came out",
  );
});

test("the bundle sees CustomFunctions and nothing of Node or of a page", () => {
  const seen = loadBuiltFunctions(
    `CustomFunctions.associate("SEES", () => [[[typeof process, typeof window, typeof Office, typeof require].join()]])`,
  );
  expect(seen.get("SEES")?.()).toEqual([["undefined,undefined,undefined,undefined"]]);
  const error = loadBuiltFunctions(
    `CustomFunctions.associate("E", () => [[new CustomFunctions.Error(CustomFunctions.ErrorCode.notAvailable, "why")]])`,
  ).get("E")?.()[0]?.[0];
  expect(error).toEqual(new WorksheetError("#N/A", "why"));
});

test("an id that is associated twice is an error", () => {
  const twice = `CustomFunctions.associate("A", () => []); CustomFunctions.associate("A", () => []);`;
  expect(() => loadBuiltFunctions(twice)).toThrow("A twice");
});
