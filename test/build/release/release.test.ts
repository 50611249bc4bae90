/** The release of a version in a copy of the project: what it says, what it changes, and what it leaves alone. */
import { execFileSync, spawnSync } from "node:child_process";
import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import packageFile from "../../../package.json";
import { isUnreleased } from "../../../src/build/contract/changelog";
import { places, versionSet } from "../../../src/build/release/places";
import { release } from "../../../src/build/release/release";

const { version: now } = packageFile;
const [major, minor] = now.split(".").map(Number) as [number, number];
const next = `${major}.${minor + 1}.0`;

const root = mkdtempSync(join(tmpdir(), "beadline-release-"));
afterAll(() => rmSync(root, { recursive: true, force: true }));

const git = (...words: string[]) =>
  execFileSync("git", ["-c", "user.name=Test", "-c", "user.email=test@localhost", ...words], {
    cwd: root,
    encoding: "utf8",
  });
const read = (file: string) => readFileSync(join(root, file), "utf8");
const write = (file: string, text: string) => writeFileSync(join(root, file), text);

/** Enough to see how it goes: the contract's own tests run them all. */
const some = ["TEMPERATURE", "EMF", "TYPEA", "PROVENANCE"];

/** As after a release of the version at hand, with the next one's section open. */
const opened = (changelog: string) =>
  changelog
    .replace(new RegExp(`^(## ${now.replaceAll(".", "\\.")}.*)unreleased`, "m"), "$12026-01-31")
    .replace(/^## /m, `## ${next} – unreleased\n\n### Results changed\n\nNothing.\n\n## `);

beforeAll(() => {
  for (const file of [
    "src",
    "test/contract",
    "dist/functions.js",
    "package.json",
    "package-lock.json",
    "manifest.xml",
    "CHANGELOG.md",
    "tsconfig.json",
  ]) {
    cpSync(file, join(root, file), { recursive: true });
  }
  symlinkSync(resolve("node_modules"), join(root, "node_modules"), "junction");
  for (const file of ["src/catalogue/catalogue.json", `test/contract/${now}.json`]) {
    const { functions, calls, ...rest } = JSON.parse(read(file));
    const few = (list: { id: string }[]) => list.filter(({ id }) => some.includes(id));
    write(file, JSON.stringify({ ...rest, functions: few(functions), ...(calls && { calls: few(calls) }) }));
  }
  write(".gitignore", "node_modules\ndist\n");
  write("CHANGELOG.md", opened(read("CHANGELOG.md")));
  git("init", "--quiet");
  git("add", "-A");
  git("commit", "--quiet", "-m", "Start");
});

beforeEach(() => {
  git("reset", "--quiet", "--hard");
  git("clean", "--quiet", "-fd");
  cpSync("dist/functions.js", join(root, "dist/functions.js"));
});

/** In place of generating and bundling, which other tests do: what is built calls itself by the new version. */
const build = () => {
  for (const file of ["dist/functions.js", "src/catalogue/catalogue.json"])
    write(file, read(file).replaceAll(`"${now}"`, `"${next}"`).replaceAll(`\\"${now}\\"`, `\\"${next}\\"`));
};

const released = (version: string, check = false) =>
  release(
    { version, check },
    { root, today: "2026-07-01", uncommitted: () => git("status", "--porcelain"), build },
  );

const byCommand = (...words: string[]) => {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ["node_modules/tsx/dist/cli.mjs", "src/build/release/index.ts", ...words],
    { cwd: root, encoding: "utf8" },
  );
  return { status, stdout, stderr };
};

describe("npm run release", () => {
  it("says with --check what it would do, and changes nothing", () => {
    const { status, stdout, stderr } = byCommand(next, "--check");
    expect({ status, stderr }).toEqual({ status: 0, stderr: "" });
    expect(stdout).toContain("Nothing stands in the way.");
    for (const { file } of places) expect(stdout).toContain(file);
    expect(stdout).toContain(`test/contract/${next}.json`);
    expect(git("status", "--porcelain")).toBe("");
  }, 120_000);

  it("refuses with reasons and an exit code, and changes nothing", () => {
    write("src/build/stray.ts", "");
    const { status, stderr } = byCommand(now);
    expect(status).toBe(1);
    expect(stderr).toContain("?? src/build/stray.ts");
    expect(stderr).toContain(`${now} has been released already.`);
    expect(git("status", "--porcelain")).toBe("?? src/build/stray.ts\n");
    expect(byCommand("soon").status).toBe(2);
  }, 120_000);

  it("sets the version everywhere, freezes results, closes the section with the day, and commits nothing", () => {
    const head = git("rev-parse", "HEAD");
    const outcome = released(next);
    expect(outcome).toHaveProperty("said");
    const said = (outcome as { said: string[] }).said.join("\n");
    for (const step of ["bash .ci/run", `git tag v${next}`, "git commit"]) expect(said).toContain(step);
    expect(git("rev-parse", "HEAD")).toBe(head);
    for (const { file, words } of places) expect(read(file)).toContain(words(next));
    expect(read("CHANGELOG.md")).toContain(`## ${next} – 2026-07-01\n`);
    expect(isUnreleased(read("CHANGELOG.md"), next)).toBe(false);
    const record = JSON.parse(read(`test/contract/${next}.json`));
    expect(record).toMatchObject({ version: next, changed: [] });
    expect(record.functions.map(({ id }: { id: string }) => id)).toEqual(some);
    expect(existsSync(join(root, `test/contract/${next}.xlsx`))).toBe(true);
    // The records of the versions before stay as they are.
    expect(git("status", "--porcelain", "test/contract")).toBe(
      `?? test/contract/${next}.json\n?? test/contract/${next}.xlsx\n`,
    );
    git("add", "-A");
    git("commit", "--quiet", "-m", "Release");
    expect(released(next)).toMatchObject({
      refused: [expect.stringContaining("released already"), expect.anything()],
    });
    git("reset", "--quiet", "--hard", head.trim());
  });

  it("refuses a changed result of a real function until the changelog names it", () => {
    const file = `test/contract/${now}.json`;
    const call = /(\{"id":"EMF","given":.*?"result":\[\[)(-?[\d.]+)/.exec(read(file))!;
    write(file, read(file).replace(call[0], `${call[1]}${Number(call[2]) + 0.001}`));
    git("commit", "--quiet", "-am", "As if EMF had given something else before");
    expect(released(next, true)).toEqual({ refused: [expect.stringContaining("Results of EMF changed")] });
    write("CHANGELOG.md", read("CHANGELOG.md").replace("Nothing.", "- EMF by 1 µV."));
    git("commit", "--quiet", "-am", "Said");
    expect(released(next, true)).toHaveProperty("said");
  });
});

describe("the places of the version", () => {
  it("are each found once in the project itself", () => {
    expect(versionSet((file) => readFileSync(file, "utf8"), now, next)).toHaveProperty("changed");
  });

  it.each(places.map((place, index) => [place.file, index] as const))(
    "are missed in %s where it says something else",
    (file, index) => {
      const text = readFileSync(file, "utf8");
      const found = versionSet(
        (name) => (name === file ? text.replace(places[index]!.words(now), "") : readFileSync(name, "utf8")),
        now,
        next,
      );
      expect(found).toEqual({ missing: [expect.stringContaining(file)] });
    },
  );
});
