import type { CatalogueFunction } from "../../catalogue/catalogue";
import { parseExample } from "../../catalogue/formula";
import { callText } from "../formula/arguments";
import { evaluate, isFault } from "../live/evaluate";

export interface Provoked {
  /** What was done wrong, in words. */
  readonly cause: string;
  readonly code: string;
  /** The function's own sentence. */
  readonly message: string;
}

const NUMBERS = new Set([
  "EMF",
  "temperature",
  "resistance",
  "number",
  "temperature difference",
  "EMF deviation",
]);

/**
 * The errors a function can give, by making the usual mistakes in its first example: so the sentences shown are its
 * own, and no list of them can grow old.
 */
export async function provokedErrors(found: CatalogueFunction, namespace: string): Promise<Provoked[]> {
  const example = found.examples[0];
  if (!example) return [];
  const given = parseExample(example.formula).given.map(argumentOf);
  const { parameters } = found;
  const mistakes: { cause: string; given: string[] }[] = [];
  const instead = (index: number, text: string) => given.map((each, at) => (at === index ? text : each));
  const required = parameters.findIndex(({ optional }) => !optional);
  if (required >= 0)
    mistakes.push({ cause: `${parameters[required]!.name} left out`, given: instead(required, "") });
  const number = parameters.findIndex(({ kind, shape }) => NUMBERS.has(kind) && shape === "cells");
  if (number >= 0) {
    const { name } = parameters[number]!;
    mistakes.push({ cause: `text in ${name}`, given: instead(number, '"4,096"') });
    mistakes.push({ cause: `${name} far out of range`, given: instead(number, "1E6") });
    mistakes.push({ cause: `${name} far below range`, given: instead(number, "-1E6") });
  }
  parameters.forEach(({ name, kind, options }, index) => {
    if (index >= given.length || !options || kind === "TRUE or FALSE") return;
    mistakes.push({ cause: `an unknown ${name}`, given: instead(index, '"?"') });
  });
  const reference = parameters.findIndex(
    ({ name, optional }) => name === "referenceTemperature" && !optional,
  );
  if (reference >= 0) mistakes.push({ cause: "referenceTemperature empty", given: instead(reference, '""') });
  const errors: Provoked[] = [];
  for (const { cause, given: wrong } of mistakes) {
    const result = await evaluate(callText(namespace, found.id, wrong), namespace);
    const fault = result.flat().find(isFault);
    if (fault?.message === undefined || errors.some(({ message }) => message === fault.message)) continue;
    errors.push({ cause, code: fault.code, message: fault.message });
  }
  return errors;
}

function argumentOf(matrix: ReturnType<typeof parseExample>["given"][number]): string {
  if (matrix === null) return "";
  const cells = matrix.map((row) =>
    row
      .map((value) =>
        typeof value === "string" ? `"${value.replaceAll('"', '""')}"` : String(value).toUpperCase(),
      )
      .join(","),
  );
  return matrix.length === 1 && matrix[0]!.length === 1 ? cells[0]! : `{${cells.join(";")}}`;
}

/** What the two kinds of error mean, for all functions alike. */
export const MEANINGS: Readonly<Record<string, string>> = {
  "#VALUE!": "a wrong kind of argument: put another in.",
  "#N/A": "a right kind of argument, but no valid answer exists. Charts skip it.",
};
