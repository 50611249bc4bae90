/** The content security policy of each page, word for word: whoever changes one must change it here as well. */
import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import styleHashes from "../../src/local-sheet/style-hashes.json";

const rest = "base-uri 'none'; form-action 'none'";
const own = `img-src 'self' data:; connect-src 'self'; ${rest}`;

const policies: Readonly<Record<string, string>> = {
  "taskpane.html": `default-src 'none'; script-src 'self' https://appsforoffice.microsoft.com; style-src 'self'; ${own}`,
  "sheet.html": `default-src 'none'; script-src 'self'; style-src 'self' ${styleHashes.map((hash) => `'${hash}'`).join(" ")}; ${own}`,
  "help.html": `default-src 'none'; style-src 'self'; img-src 'self' data:; ${rest}`,
};

const pageOf = (name: string) => readFileSync(`dist/${name}`, "utf8");
const policiesIn = (page: string) =>
  [...page.matchAll(/<meta http-equiv="Content-Security-Policy" content="([^"]*)"/g)].map(([, text]) => text);

it("every page that is built has a policy here", () => {
  expect(
    readdirSync("dist")
      .filter((file) => file.endsWith(".html"))
      .sort(),
  ).toEqual(Object.keys(policies).sort());
});

describe.each(Object.entries(policies))("%s", (name, policy) => {
  it("has exactly this policy", () => {
    expect(policiesIn(pageOf(name))).toEqual([policy]);
  });

  it("allows nothing unsafe, no wildcard, and no host but Office.js's own on the pane", () => {
    expect(policy).not.toMatch(/unsafe|\*|strict-dynamic|blob:|http:/);
    const hosts = policy.match(/https:\/\/[^\s;]+/g) ?? [];
    expect(hosts).toEqual(name === "taskpane.html" ? ["https://appsforoffice.microsoft.com"] : []);
  });

  it("begins with it: nothing loads before the policy holds", () => {
    const page = pageOf(name);
    const start = page.indexOf("<meta http-equiv");
    expect(page.slice(0, start)).not.toMatch(/<(script|link|style|img|base|object|iframe)\b/i);
  });
});

it("the hashes are those of four short style sheets, the empty one among them", () => {
  expect(styleHashes).toHaveLength(4);
  for (const hash of styleHashes) expect(hash).toMatch(/^sha256-[A-Za-z0-9+/]{43}=$/);
  expect(styleHashes).toContain(`sha256-${createHash("sha256").digest("base64")}`);
});
