/** What a released version is held to: its metadata, and calls with their results, as they are frozen in a file. */
import { WorksheetError } from "../../catalogue/functions-runtime";

export type Given = readonly (readonly (readonly (number | string | boolean)[])[] | null)[];
/** Of an error only its code is part of the contract; its words may be made clearer. */
export type ResultCell = number | string | { readonly error: string };
export type Result = readonly (readonly ResultCell[])[];

export interface FrozenCall {
  readonly id: string;
  readonly given: Given;
  readonly result: Result;
}

export interface FrozenFunction {
  readonly id: string;
  readonly parameters: readonly { readonly name: string; readonly optional: boolean }[];
}

export interface VersionRecord {
  readonly version: string;
  readonly functions: readonly FrozenFunction[];
  readonly calls: readonly FrozenCall[];
  /** Calls of the version before whose results this version changes, as its changelog says. */
  readonly changed: readonly Pick<FrozenCall, "id" | "given">[];
}

export type Functions = ReadonlyMap<string, (...given: never[]) => unknown[][]>;

export function resultOf(functions: Functions, { id, given }: Pick<FrozenCall, "id" | "given">): Result {
  const call = functions.get(id) as ((...given: unknown[]) => unknown[][]) | undefined;
  if (call === undefined) return [[{ error: "no such function" }]];
  return call(...given).map((row) =>
    row.map((cell) => (cell instanceof WorksheetError ? { error: cell.code } : (cell as number | string))),
  );
}

/** The same bits, or as close as another processor's arithmetic may come. */
const RELATIVE = 1e-12;

/** Differences of two large numbers leave this much of what cancels. */
const ABSOLUTE = 1e-12;

function sameCell(before: ResultCell, now: ResultCell, versions: readonly [string, string]): boolean {
  if (typeof before === "number" && typeof now === "number")
    return Math.abs(now - before) <= Math.max(RELATIVE * Math.abs(before), ABSOLUTE);
  if (typeof before === "object" && typeof now === "object") return before.error === now.error;
  // PROVENANCE names the version itself.
  if (typeof before === "string" && typeof now === "string")
    return before.replaceAll(versions[0], versions[1]) === now;
  return false;
}

export const sameResult = (before: Result, now: Result, versions: readonly [string, string]): boolean =>
  before.length === now.length &&
  before.every(
    (row, i) =>
      row.length === now[i]?.length &&
      row.every((cell, j) => sameCell(cell, now[i]?.[j] as ResultCell, versions)),
  );

/** What makes two calls the same one. */
export const keyOf = ({ id, given }: Pick<FrozenCall, "id" | "given">): string =>
  `${id} ${JSON.stringify(given)}`;

/** One function or call a line, so that a difference between two versions can be read. */
export function printed({ version, functions, calls, changed }: VersionRecord): string {
  const lines = (all: readonly unknown[]): string =>
    all.map((one) => `\n    ${JSON.stringify(one)}`).join(",");
  return `{
  "version": ${JSON.stringify(version)},
  "functions": [${lines(functions)}
  ],
  "calls": [${lines(calls)}
  ],
  "changed": [${lines(changed)}${changed.length > 0 ? "\n  " : ""}]
}
`;
}
