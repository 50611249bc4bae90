import { spawnSync } from "node:child_process";
import { expect, test } from "vitest";
import { USAGE } from "../../src/build/start-options";

function start(...words: string[]) {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ["--import", "tsx", "src/build/start.ts", ...words],
    { encoding: "utf8", timeout: 20_000 },
  );
  return { status, stdout, stderr };
}

test("--help prints the usage and builds nothing", () => {
  expect(start("--help")).toEqual({ status: 0, stdout: `${USAGE}\n`, stderr: "" });
});

test("an unknown flag ends with a sentence on the error output, before anything is built", () => {
  const { status, stdout, stderr } = start("--prot", "5700");
  expect(status).toBe(2);
  expect(stdout).toBe("");
  expect(stderr).toContain('"--prot" is not known here.');
});
