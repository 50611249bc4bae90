/**
 * `npm run mutation` goes through all areas, `npm run mutation -- survey log` through some. Each area leaves its report in
 * `.cache/mutation/<area>.json`; `report.ts` makes the page of them.
 */
import { spawnSync } from "node:child_process";
import { areas } from "./areas";

const asked = process.argv.slice(2);
const names = asked.length > 0 ? asked : Object.keys(areas);
for (const name of names) {
  const area = areas[name];
  if (area === undefined) throw new Error(`${name} is no area: ${Object.keys(areas).join(", ")}.`);
  process.env.MUTATION_AREA = name;
  const { status } = spawnSync("npx", ["stryker", "run", "--mutate", area.mutate.join(",")], {
    stdio: "inherit",
  });
  if (status !== 0) throw new Error(`Stryker ended with ${status} in ${name}.`);
}
