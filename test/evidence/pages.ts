/** The two pages, by the path at which they are committed. */
import type { Evidence } from "./collect";
import { html } from "./html";
import { markdown } from "./markdown";

export const pages = (evidence: Evidence): Readonly<Record<string, string>> => ({
  "evidence/evidence.md": markdown(evidence),
  "evidence/evidence.html": html(evidence),
});
