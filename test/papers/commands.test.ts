/** Every command of the papers is executed by CI: by a line of `.ci/run`, or by what `executed.ts` names. */
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { clearCachedScripts, getPackageJsonScript } from "office-addin-cli";
import { describe, expect, it, vi } from "vitest";
import { commandsInRemarks, commandsOf } from "./commands";
import { ELSEWHERE, NOT_HERE } from "./executed";
import { papers, sources } from "./papers";

const script = readFileSync(".ci/run", "utf8");
/** What stands between quotes, as an argument or as words to be printed, is not executed by standing there. */
const executedLines = new Set(script.split("\n").map((line) => line.trim()));

const written = [
  ...papers.flatMap(({ file, text }) => commandsOf(text).map((command) => ({ file, command }))),
  ...sources.flatMap(({ file, text }) => commandsInRemarks(text).map((command) => ({ file, command }))),
];
const commands = [...new Set(written.map(({ command }) => command))];

describe("the papers", () => {
  it.each(commands)("name no command that CI does not execute: %s", (command) => {
    const at = written.filter((one) => one.command === command).map(({ file }) => file);
    if (executedLines.has(command) || command in NOT_HERE) return;
    const place = ELSEWHERE[command];
    expect(
      place,
      `${at.join(", ")}: add it to .ci/run, or to test/papers/executed.ts with its place`,
    ).toBeDefined();
    expect(readFileSync(place!.file, "utf8")).toContain(place!.as);
  });

  it.each([...Object.keys(ELSEWHERE), ...Object.keys(NOT_HERE)])("still name %s", (command) => {
    expect(commands).toContain(command);
    expect(executedLines, "it stands in .ci/run by now").not.toContain(command);
  });

  it("name no script that Office's own command line does not find in package.json", async () => {
    vi.stubEnv("npm_package_json", resolve("package.json"));
    clearCachedScripts();
    const named = commands.flatMap((command) => command.match(/^npm (?:run )?([\w-]+)/)?.[1] ?? []);
    for (const name of new Set(named)) {
      if (name !== "ci") expect(await getPackageJsonScript(name), name).toMatch(/\S/);
    }
    vi.unstubAllEnvs();
  });

  it("say of every script what it does, in DEVELOPERS.md", () => {
    const { scripts } = JSON.parse(readFileSync("package.json", "utf8")) as {
      scripts: Record<string, string>;
    };
    const developers = commandsOf(papers.find(({ file }) => file === "DEVELOPERS.md")?.text ?? "");
    const said = developers.flatMap((command) => command.match(/^npm (?:run )?([\w-]+)/)?.[1] ?? []);
    expect(Object.keys(scripts).filter((name) => !said.includes(name))).toEqual([]);
  });
});

describe("a command", () => {
  const text = [
    "```sh",
    "npm ci && npm start # both",
    "$ ls dist",
    "```",
    "```",
    "npm run block-of-no-shell",
    "```",
    "Type `npm run over",
    "lines` or `SEED=7 npx vitest`, not `=BEAD.EMF(1)` nor `npm`.",
  ].join("\n");

  it("is found in a shell block and in inline code, and nothing else is", () => {
    expect(commandsOf(text)).toEqual([
      "npm ci",
      "npm start",
      "ls dist",
      "npm run over lines",
      "SEED=7 npx vitest",
    ]);
  });

  it("is found in a remark of a source, and not in its texts", () => {
    const source = "// Run `npm run x -- y` first.\n/**\n * `npx z`\n */\nconst say = '`npm run no`';";
    expect(commandsInRemarks(source)).toEqual(["npm run x -- y", "npx z"]);
  });
});
