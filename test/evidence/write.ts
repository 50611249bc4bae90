/** `npm run evidence`: writes the pages and the README's figures anew and fails where a value falls short. */
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";
import "../custom-functions-runtime";

// Errors are made by the functions' runtime, which must stand before anything is worked out.
const { collectEvidence, shortfalls } = await import("./collect");
const { committed } = await import("./committed");
const { findings } = await import("./totals");

const evidence = collectEvidence();
for (const [path, text] of Object.entries(committed(evidence))) {
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, text);
}
for (const sentence of [...findings(evidence), ...shortfalls(evidence)]) console.log(sentence);
if (shortfalls(evidence).length > 0) process.exitCode = 1;
