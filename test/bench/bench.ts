/**
 * `npm run bench`: ratios measured in one run, each with its limit. Machines differ; ratios hardly do. Ends with a code
 * other than 0 when a limit is broken. `npm run bench -- Screen` runs one part; `-- --quick` looks in a short time for
 * what is out by an order of magnitude, such as work that grows with the square of the rows.
 */
import { conversionLines } from "./conversion";
import { FAMILIES, familyLines } from "./families";
import { gridLines } from "./grid";
import { breaks, FULL, HEADING, type Line, type Pace, printed, QUICK } from "./line";
import { memoryLines } from "./memory";
import { openingLines } from "./opening";

type Part = (pace: Pace) => AsyncIterable<Line>;

const PARTS: Readonly<Record<string, Part>> = {
  conversion: conversionLines,
  memory: memoryLines,
  opening: openingLines,
  grid: gridLines,
  ...Object.fromEntries(
    FAMILIES.map((family): [string, Part] => [family, (pace) => familyLines(family, pace)]),
  ),
};

/** The grid takes minutes on a busy machine, and what grows out of bounds there grows so in its functions too. */
const NOT_QUICK = ["grid"];

const given = process.argv.slice(2);
const pace = given.includes("--quick") ? QUICK : FULL;
const asked = given.filter((word) => word !== "--quick");
const unknown = asked.find((word) => !Object.hasOwn(PARTS, word));
if (unknown !== undefined) {
  console.error(`"${unknown}" is no part of the benchmark: ${Object.keys(PARTS).join(", ")}, --quick`);
  process.exit(2);
}
const all = Object.keys(PARTS).filter((name) => !(pace.quick && NOT_QUICK.includes(name)));

console.log(HEADING);
let lines = 0;
let broken = 0;
for (const name of asked.length > 0 ? asked : all) {
  for await (const line of (PARTS[name] as Part)(pace)) {
    console.log(printed(line));
    lines++;
    if (breaks(line)) broken++;
  }
}
console.log(
  broken === 0 ? `${lines} lines within their limits` : `${broken} of ${lines} lines beyond a limit`,
);
if (broken > 0) process.exitCode = 1;
