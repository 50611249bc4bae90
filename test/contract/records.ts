/** The frozen records, oldest first. */
import { readdirSync, readFileSync } from "node:fs";
import { resolve } from "node:path";
import type { VersionRecord } from "./record";

export const folder = resolve("test/contract");

const order = (version: string): number =>
  version.split(".").reduce((sum, part) => sum * 10_000 + Number(part), 0);

export const frozenRecords = (): VersionRecord[] =>
  readdirSync(folder)
    .filter((file) => /^\d+\.\d+\.\d+\.json$/.test(file))
    .map((file) => JSON.parse(readFileSync(resolve(folder, file), "utf8")) as VersionRecord)
    .sort((a, b) => order(a.version) - order(b.version));
