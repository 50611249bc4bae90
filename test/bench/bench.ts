/** `npm run bench`: ratios measured in one run. Machines differ; ratios hardly do. */
import { convertLines } from "./convert";

const lines = await convertLines();

console.log("ratio   limit   what");
for (const { what, ratio, limit } of lines) {
  console.log(
    `${ratio.toFixed(2).padStart(5)}   ${limit.toFixed(1).padStart(5)}   ${what}${ratio > limit ? "   OVER" : ""}`,
  );
}
console.log(`peak memory ${Math.round(process.resourceUsage().maxRSS / 1024)} MB`);
