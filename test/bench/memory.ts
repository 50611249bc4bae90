/** Peak memory of one call over a million readings, in a process of its own. */
import { execFileSync } from "node:child_process";
import { resolve } from "node:path";
import type { Line, Pace } from "./line";

/** Plain JavaScript, so that no compiler's memory is counted. Prints kilobytes: empty, with the readings, at the peak. */
const PROBE = `
  const built = new Map();
  globalThis.CustomFunctions = { associate: (id, run) => built.set(id, run), Error: class {}, ErrorCode: {} };
  await import(process.argv[1]);
  const peak = () => process.resourceUsage().maxRSS;
  const empty = peak();
  const column = Array.from({ length: 1_000_000 }, (_, i) => [(i % 50_000) / 1000]);
  const before = peak();
  const result = built.get("TEMPERATURE")(column, [["K"]], [[25]]);
  if (result.length !== column.length) throw new Error("rows are missing");
  console.log(empty, before, peak());
`;

export async function* memoryLines({ slack }: Pace): AsyncGenerator<Line> {
  const printed = execFileSync(process.execPath, [
    "--input-type=module",
    "--eval",
    PROBE,
    resolve("dist/functions.js"),
  ]);
  const [empty, before, peak] = printed.toString().trim().split(" ").map(Number) as [number, number, number];
  const megabytes = Math.round((peak - before) / 1024);
  yield {
    what: `memory of one formula over 1 000 000 readings (${megabytes} MB), to that of the readings themselves`,
    ratio: (peak - before) / (before - empty),
    limit: 1.5 * slack,
  };
}
