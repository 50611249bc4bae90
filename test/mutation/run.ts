/**
 * `npm run mutation` goes through all areas, `npm run mutation -- survey log` through some. Each area leaves its report in
 * `.cache/mutation/<area>.json`; `report.ts` makes the page of them. `npm run mutation -- --dry-run numeric` mutates
 * nothing: it runs the area's tests once, as they are run before the first mutant, which shows that they still can be.
 */
import { spawnSync } from "node:child_process";
import { areas } from "./areas";

const words = process.argv.slice(2);
const dryRun = words.includes("--dry-run");
const asked = words.filter((word) => word !== "--dry-run");
const names = asked.length > 0 ? asked : Object.keys(areas);
for (const name of names) {
  const area = areas[name];
  if (area === undefined) throw new Error(`${name} is no area: ${Object.keys(areas).join(", ")}.`);
  process.env.MUTATION_AREA = name;
  const options = ["--mutate", area.mutate.join(","), ...(dryRun ? ["--dryRunOnly"] : [])];
  const { status } = spawnSync("npx", ["stryker", "run", ...options], { stdio: "inherit" });
  if (status !== 0) throw new Error(`Stryker ended with ${status} in ${name}.`);
}
