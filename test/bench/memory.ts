/** Peak memory of one call over a million readings, in a process of its own. */
import { execFileSync } from "node:child_process";
import { resolve } from "node:path";

/** Plain JavaScript, so that no compiler's memory is counted. */
const PROBE = `
  const built = new Map();
  globalThis.CustomFunctions = { associate: (id, run) => built.set(id, run), Error: class {}, ErrorCode: {} };
  await import(process.argv[1]);
  const column = Array.from({ length: 1_000_000 }, (_, i) => [(i % 50_000) / 1000]);
  const before = process.resourceUsage().maxRSS;
  const result = built.get("TEMPERATURE")(column, [["K"]], [[25]]);
  if (result.length !== column.length) throw new Error("rows are missing");
  console.log(before, process.resourceUsage().maxRSS);
`;

export function memoryOfMillionReadings(): { readonly before: number; readonly peak: number } {
  const printed = execFileSync(process.execPath, [
    "--input-type=module",
    "--eval",
    PROBE,
    resolve("dist/functions.js"),
  ]);
  const [before, peak] = printed.toString().trim().split(" ").map(Number);
  return { before: before as number, peak: peak as number };
}
