import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { type LockEntry, lockFileFaults } from "../../../src/build/licences/lock-file";

const read = (file: string) => JSON.parse(readFileSync(file, "utf8"));
const digest = `sha512-${"A".repeat(86)}==`;

describe("the lock file", () => {
  const lock = read("package-lock.json") as { packages: Record<string, LockEntry & Record<string, unknown>> };

  it("pins every package by a SHA-512 digest, and none comes over an open line", () => {
    expect(lockFileFaults(lock.packages)).toEqual([]);
  });

  it("belongs to package.json, whose versions are all exact", () => {
    const { dependencies = {}, devDependencies } = read("package.json");
    expect(lock.packages[""]?.devDependencies).toEqual(devDependencies);
    for (const version of Object.values({ ...dependencies, ...devDependencies }))
      expect(version).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it.each([
    ["no digest", { version: "1.0.0" }, "node_modules/x has no SHA-512 digest"],
    ["a weak digest", { version: "1.0.0", integrity: "sha1-AAAA" }, "node_modules/x has no SHA-512 digest"],
    [
      "an open line",
      { version: "1.0.0", integrity: digest, resolved: "http://mirror/x.tgz" },
      "node_modules/x comes from http://mirror/x.tgz",
    ],
    [
      "a branch",
      { version: "1.0.0", integrity: digest, resolved: "git+ssh://git@host/x.git" },
      "node_modules/x comes from git+ssh://git@host/x.git",
    ],
    ["no version", { integrity: digest }, "node_modules/x has no version"],
    ["a link", { link: true }, "node_modules/x is a link to somewhere else"],
  ])("is refused for %s", (_, entry, fault) => {
    expect(lockFileFaults({ "": {}, "node_modules/x": entry })).toEqual([fault]);
  });
});
