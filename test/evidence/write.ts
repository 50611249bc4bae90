/** `npm run evidence`: writes the pages anew and fails where a value falls short. */
import { mkdirSync, writeFileSync } from "node:fs";
import "../custom-functions-runtime";

// Errors are made by the functions' runtime, which must stand before anything is worked out.
const { collectEvidence, shortfalls } = await import("./collect");
const { pages } = await import("./pages");
const { findings } = await import("./totals");

const evidence = collectEvidence();
mkdirSync("evidence", { recursive: true });
for (const [path, text] of Object.entries(pages(evidence))) writeFileSync(path, text);
for (const sentence of [...findings(evidence), ...shortfalls(evidence)]) console.log(sentence);
if (shortfalls(evidence).length > 0) process.exitCode = 1;
