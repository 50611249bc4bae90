/** `npm run bench`: ratios measured in one run. Machines differ; ratios hardly do. */
import { convertLines } from "./convert";
import { familyLines } from "./families";
import { gridLines } from "./grid";
import { memoryOfMillionReadings } from "./memory";

const lines = [...(await convertLines()), ...(await gridLines())];

console.log("ratio   limit   what");
for (const { what, ratio, limit } of lines) {
  console.log(
    `${ratio.toFixed(2).padStart(5)}   ${limit.toFixed(1).padStart(5)}   ${what}${ratio > limit ? "   OVER" : ""}`,
  );
}
const megabytes = (kilobytes: number): string => `${Math.round(kilobytes / 1024)} MB`;
const { before, peak } = memoryOfMillionReadings();
console.log(
  `peak memory of a million readings in one formula: ${megabytes(peak)}, ${megabytes(before)} of it before the call`,
);

console.log("\nevaluations of a reference function per row, among a million; to a row among a thousand");
for await (const { family, id, evaluations, growth, refused } of familyLines()) {
  const per = growth === undefined ? "one call" : `× ${growth.toFixed(1)}`;
  console.log(
    `${evaluations.toFixed(1).padStart(9)}   ${per.padStart(8)}   ${family}: ${id}${refused === undefined ? "" : `   ${refused}`}`,
  );
}
