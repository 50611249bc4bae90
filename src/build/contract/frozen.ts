// What is frozen of each version: its record as JSON, and its workbook.

import { existsSync, readdirSync, readFileSync } from "node:fs";
import { resolve } from "node:path";
import type { VersionRecord } from "./record";

/** From the root of the project. */
export const folder = "test/contract";

/** Versions as they follow one another: 0.10.0 after 0.9.1. */
export const order = (version: string): number =>
  version.split(".").reduce((sum, part) => sum * 10_000 + Number(part), 0);

/** The records, oldest first. */
export const frozenRecords = (root = "."): VersionRecord[] =>
  readdirSync(resolve(root, folder))
    .filter((file) => /^\d+\.\d+\.\d+\.json$/.test(file))
    .map((file) => JSON.parse(readFileSync(resolve(root, folder, file), "utf8")) as VersionRecord)
    .sort((a, b) => order(a.version) - order(b.version));

export const isFrozen = (version: string, root = "."): boolean =>
  existsSync(resolve(root, folder, `${version}.json`));
