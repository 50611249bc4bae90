/**
 * Workbooks in the field go on calculating what they calculated. A result that is changed on purpose is said in the
 * changelog, and `npm run contract` writes the new record; while 0.1.0 is unreleased, its own record may be rewritten.
 */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import { callsToFreeze } from "../../src/build/contract/calls";
import { isUnreleased, resultsChanged, unannounced } from "../../src/build/contract/changelog";
import { frozenRecords } from "../../src/build/contract/frozen";
import { keyOf, resultOf, sameResult } from "../../src/build/contract/record";
import catalogue from "../../src/catalogue/catalogue.json";
import metadata from "../../src/catalogue/functions.json";

const built = loadBuiltFunctions(readFileSync("dist/functions.js", "utf8"));
const records = frozenRecords();
const changelog = readFileSync("CHANGELOG.md", "utf8");

describe.each(records)("version $version", ({ version, functions, calls, changed }) => {
  const later = records.slice(records.findIndex((one) => one.version === version) + 1);
  const overruled = new Set(later.flatMap((record) => record.changed.map(keyOf)));

  it.each(functions)("$id still takes its arguments, and new ones only behind them", ({ id, parameters }) => {
    const now = metadata.functions.find((one) => one.id === id)?.parameters ?? [];
    const names = now.map(({ name }) => name);
    expect(names.slice(0, parameters.length)).toEqual(parameters.map(({ name }) => name));
    for (const [i, parameter] of now.entries()) {
      // What could be left out may be left out still, and nothing new is asked for.
      const before = parameters[i];
      if (before === undefined || before.optional)
        expect((parameter as { optional?: boolean }).optional).toBe(true);
    }
  });

  it.each(functions.map(({ id }) => id))("%s still gives the same results", (id) => {
    for (const call of calls) {
      if (call.id !== id || overruled.has(keyOf(call))) continue;
      const now = resultOf(built, call);
      if (!sameResult(call.result, now, [version, catalogue.version]))
        expect({ ...call, result: now }).toEqual(call);
    }
  });

  it("names every changed function under Results changed", () => {
    expect(
      unannounced(
        changed.map(({ id }) => id),
        changelog,
        version,
      ),
    ).toEqual([]);
  });
});

describe("the records", () => {
  it("cover every function of the version at hand: else run npm run contract", () => {
    const frozen = records.find(({ version }) => version === catalogue.version);
    expect(frozen?.functions.map(({ id }) => id)).toEqual(catalogue.functions.map(({ id }) => id));
  });

  it("freeze numbers more often than refusals", () => {
    for (const { calls } of records) {
      const answered = calls.filter(({ result }) => typeof result.flat()[0] !== "object");
      expect(answered.length / calls.length).toBeGreaterThan(0.7);
    }
  });

  it("are made of the same calls each time", () => {
    expect(callsToFreeze(catalogue.functions as never)).toEqual(callsToFreeze(catalogue.functions as never));
  });
});

describe("the changelog", () => {
  const text = `# Changelog\n\n## 0.2.0 – unreleased\n\n### Results changed\n\n- EMF by 2E-9.\n\n### Added\n\n- SEEBECK\n\n## 0.1.0\n\n### Results changed\n\nTYPEA.\n`;

  it("is read section by section", () => {
    expect(resultsChanged(text, "0.2.0").trim()).toBe("- EMF by 2E-9.");
    expect(resultsChanged(text, "0.3.0")).toBe("");
    expect(isUnreleased(text, "0.2.0")).toBe(true);
    expect(isUnreleased(text, "0.1.0")).toBe(false);
  });

  it("lets no changed result go unsaid, nor a name pass for another that holds it", () => {
    expect(unannounced(["EMF", "SEEBECK", "TYPEA"], text, "0.2.0")).toEqual(["SEEBECK", "TYPEA"]);
    expect(unannounced(["EMF"], text.replace("EMF", "EMFTABLE"), "0.2.0")).toEqual(["EMF"]);
  });
});

describe("a result", () => {
  it("may differ by the last bits, not by more, nor in its kind or shape", () => {
    const versions = ["0.1.0", "0.2.0"] as const;
    expect(sameResult([[1]], [[1 + 5e-13]], versions)).toBe(true);
    expect(sameResult([[1]], [[1 + 5e-12]], versions)).toBe(false);
    expect(sameResult([[1]], [["1"]], versions)).toBe(false);
    expect(sameResult([[1], [2]], [[1]], versions)).toBe(false);
    expect(sameResult([[{ error: "#N/A" }]], [[{ error: "#VALUE!" }]], versions)).toBe(false);
    expect(sameResult([["version 0.1.0"]], [["version 0.2.0"]], versions)).toBe(true);
  });
});
