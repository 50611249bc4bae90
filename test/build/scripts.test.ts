/** The commands that the papers and CI name, looked up as Office's command line looks up a script of npm. */
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { clearCachedScripts, getPackageJsonScript } from "office-addin-cli";
import { afterEach, beforeEach, expect, test, vi } from "vitest";

const PAPERS = ["README.md", "DEVELOPERS.md", "SECURITY.md", ".ci/run"];

/** `npm run name`, and the two names that need no "run". */
const named = (text: string): string[] =>
  [...text.matchAll(/\bnpm (?:run ([\w:-]+)|(start|test)\b)/g)].map(
    ([, run, short]) => (run ?? short) as string,
  );

beforeEach(() => {
  clearCachedScripts();
  vi.stubEnv("npm_package_json", resolve("package.json"));
});
afterEach(() => vi.unstubAllEnvs());

test.each(PAPERS)("%s names no script that package.json does not have", async (paper) => {
  const names = new Set(named(readFileSync(paper, "utf8")));
  expect(names.size).toBeGreaterThan(0);
  for (const name of names) expect(await getPackageJsonScript(name), name).toMatch(/\S/);
});

test("DEVELOPERS.md names every script of package.json", () => {
  const { scripts } = JSON.parse(readFileSync("package.json", "utf8")) as { scripts: Record<string, string> };
  expect(named(readFileSync("DEVELOPERS.md", "utf8"))).toEqual(expect.arrayContaining(Object.keys(scripts)));
});
