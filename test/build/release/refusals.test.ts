/** Why a version may not be released: each reason, and the one way on which there is none. */
import { describe, expect, it } from "vitest";
import type { VersionRecord } from "../../../src/build/contract/record";
import { readReleaseOptions } from "../../../src/build/release/options";
import { refusals, type State } from "../../../src/build/release/refusals";

const changelog = (heading: string, results = "Nothing.") =>
  `# Changelog\n\n## ${heading}\n\n### Added\n\n- DOUBLE.\n\n### Results changed\n\n${results}\n\n## 0.1.0 – 2026-01-31\n\n### Results changed\n\nNothing: this is the first version.\n`;

/** Frozen: DOUBLE of 2 was 4, and NAME said its version. */
const record: VersionRecord = {
  version: "0.1.0",
  functions: [],
  calls: [
    { id: "DOUBLE", given: [[[2]]], result: [[4]] },
    { id: "NAME", given: [], result: [["version 0.1.0"]] },
  ],
  changed: [],
};

const functions = (factor: number, version = "0.1.0"): State["functions"] =>
  new Map<string, (...given: never[]) => unknown[][]>([
    ["DOUBLE", (cells: number[][]) => cells.map((row) => row.map((cell) => cell * factor))],
    ["NAME", () => [[`version ${version}`]]],
  ]);

const ready: State = {
  uncommitted: "",
  version: "0.1.0",
  changelog: changelog("0.2.0 – unreleased"),
  functions: functions(2),
  records: [record],
};

const told = (wanted: string, change: Partial<State>) => refusals(wanted, { ...ready, ...change });

describe("a version", () => {
  it("may be released where everything is in its place", () => {
    expect(told("0.2.0", {})).toEqual([]);
  });

  it("may be released that was set before its work began", () => {
    expect(told("0.2.0", { version: "0.2.0", functions: functions(2, "0.2.0") })).toEqual([]);
  });

  it("is refused while something is not committed, which is shown", () => {
    expect(told("0.2.0", { uncommitted: " M src/core/units.ts\n" })).toEqual([
      "These are not committed:\n M src/core/units.ts",
    ]);
  });

  it.each([
    ["0.1.0", "0.1.0 has been released already."],
    ["0.0.9", "0.0.9 is not higher than 0.1.0, the version at hand."],
    ["0.0.10", "0.0.10 is not higher than 0.1.0"],
  ])("is refused as %s, which is not higher than 0.1.0", (wanted, reason) => {
    expect(
      told(wanted, {
        changelog: changelog(`${wanted} – unreleased`).replace(
          "## 0.1.0 – unreleased",
          "## 0.1.0 – 2026-01-31",
        ),
      }).join("\n"),
    ).toContain(reason);
  });

  it("is higher by numbers, not by letters", () => {
    const change = {
      version: "0.9.0",
      functions: functions(2, "0.9.0"),
      changelog: changelog("0.10.0 – unreleased"),
    };
    expect(told("0.10.0", change)).toEqual([]);
  });

  it.each([
    ["there is no open section", changelog("0.2.0 – 2026-02-28")],
    ["the open section is another version's", changelog("0.3.0 – unreleased")],
    [
      "the open section stands below another",
      `${changelog("0.3.0 – unreleased")}\n## 0.2.0 – unreleased\n\n### Results changed\n\nNothing.\n`,
    ],
    ["the section says nothing of results", changelog("0.2.0 – unreleased", "")],
    ["the section has no place for results", "# Changelog\n\n## 0.2.0 – unreleased\n\n### Added\n\n- X\n"],
    ["there is no section at all", "# Changelog\n"],
  ])("is refused where %s", (_, text) => {
    expect(told("0.2.0", { changelog: text })).toEqual([
      `CHANGELOG.md must begin with the open section "## 0.2.0 – unreleased", and say under "### Results changed" what changed, or that nothing did.`,
    ]);
  });

  it("is refused where a result changed and the changelog is silent of it, and not where it speaks", () => {
    const change = { functions: functions(2.001) };
    expect(told("0.2.0", change)).toEqual([
      `Results of DOUBLE changed, and "Results changed" of 0.2.0 in CHANGELOG.md does not name it.`,
    ]);
    const said = changelog("0.2.0 – unreleased", "- DOUBLE: by a thousandth.");
    expect(told("0.2.0", { ...change, changelog: said })).toEqual([]);
  });

  it("is refused where a function is gone", () => {
    const fewer = new Map([...functions(2)].filter(([id]) => id !== "NAME"));
    expect(told("0.2.0", { functions: fewer }).join()).toContain("Results of NAME changed");
  });

  it("is told every reason at once", () => {
    expect(told("0.0.9", { uncommitted: "?? x\n", changelog: "", functions: functions(3) })).toHaveLength(4);
  });
});

describe("what npm run release is told", () => {
  it("is a version, and perhaps to look only", () => {
    expect(readReleaseOptions(["0.2.0"])).toEqual({ version: "0.2.0", check: false });
    expect(readReleaseOptions(["--check", "10.0.12"])).toEqual({ version: "10.0.12", check: true });
    expect(readReleaseOptions(["0.2.0", "--help"])).toEqual({ help: true });
  });

  it.each([
    [[]],
    [["0.2"]],
    [["v0.2.0"]],
    [["0.2.0-beta"]],
    [["00.2.0"]],
    [["0.2.0", "0.3.0"]],
    [["0.2.0", "--chek"]],
  ])("is refused as %j", (words) => {
    expect(readReleaseOptions(words)).toHaveProperty("refused");
  });
});
