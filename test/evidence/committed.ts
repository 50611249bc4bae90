/** What the evidence writes, by the path at which it is committed. */
import { readFileSync } from "node:fs";
import type { Evidence } from "./collect";
import { html } from "./html";
import { markdown } from "./markdown";
import { withFigures } from "./readme";

export const committed = (evidence: Evidence): Readonly<Record<string, string>> => ({
  "test/evidence/pages/evidence.md": markdown(evidence),
  "test/evidence/pages/evidence.html": html(evidence),
  "README.md": withFigures(readFileSync("README.md", "utf8"), evidence),
});
