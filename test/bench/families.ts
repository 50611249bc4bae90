/**
 * Every function, family by family, in one unit: what a row costs in evaluations of a reference function, measured in
 * the same run, and how much dearer a row is among a million than among a thousand. Linear work keeps that near 1;
 * what leaves the processor's caches, and a result that must be collected, makes it 2 to 4; quadratic work, 1000.
 */
import type { Catalogue, CatalogueFunction } from "../../src/catalogue/catalogue";
import catalogueJson from "../../src/catalogue/catalogue.json";
import { parseExample } from "../../src/catalogue/formula";
import { type Thermocouple, thermocouple } from "../../src/core";
import { wholeColumn } from "../properties/large-input";
import { builtFunctions, type WorksheetFunction } from "./built-functions";

const catalogue = catalogueJson as Catalogue;

const FEW = 1000;
const MANY = 1_000_000;

/** Enough rounds of the few that their share of the collecting of garbage is in the mean. */
const ROUNDS_FEW = 100;
const ROUNDS_WARM = 20;

/** Milliseconds of processor time a round: unlike the clock it does not count what else the machine does. */
function processorTime(run: () => void, rounds: number): number {
  const before = process.cpuUsage();
  for (let round = 0; round < rounds; round++) run();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000 / rounds;
}

export interface FamilyLine {
  readonly family: string;
  readonly id: string;
  /** Evaluations of the reference function that a row, or a whole call of single cells, costs. */
  readonly evaluations: number;
  /** Cost of a row among many to one among few; undefined for a call of single cells. */
  readonly growth: number | undefined;
  /** The message, where so many rows are refused. */
  readonly refused: string | undefined;
}

/** Milliseconds of one evaluation. */
function oneEvaluation(): number {
  const couple = thermocouple("K") as Thermocouple;
  let kept = 0;
  const run = (): void => {
    for (let i = 0; i < MANY; i++) kept += couple.emf(20 + 1330 * ((i * 0.618033988749895) % 1));
  };
  run();
  const time = processorTime(run, 5);
  if (!Number.isFinite(kept)) throw new Error("the bare loop came to nothing");
  return time / MANY;
}

/** Whether its documented example has an argument that can be a range. */
const takesRanges = ({ examples, parameters }: CatalogueFunction): boolean => {
  const { given } = parseExample(examples[0]?.formula ?? "");
  return parameters.some(({ shape }, i) => shape !== "cell" && given[i] != null);
};

function perRow(run: WorksheetFunction, one: CatalogueFunction, rows: number, rounds: number) {
  const given = wholeColumn(one, rows);
  let result: unknown[][] = [];
  const time = processorTime(() => {
    result = run(...given);
  }, rounds);
  const only = result.length === 1 && rows > 1 ? result[0]?.[0] : undefined;
  const refused = only instanceof CustomFunctions.Error ? `${only.code} ${only.message}` : undefined;
  return { time: time / rows, refused };
}

/** One after the other, as they are measured. */
export async function* familyLines(): AsyncGenerator<FamilyLine> {
  const built = await builtFunctions();
  const evaluation = oneEvaluation();
  for (const one of catalogue.functions) {
    const run = built.get(one.id) as WorksheetFunction;
    const { id, category: family } = one;
    if (!takesRanges(one)) {
      // One row is the documented call itself where nothing grows.
      perRow(run, one, 1, ROUNDS_WARM);
      const { time, refused } = perRow(run, one, 1, ROUNDS_WARM);
      yield { family, id, evaluations: time / evaluation, growth: undefined, refused };
      continue;
    }
    perRow(run, one, FEW, ROUNDS_WARM);
    const few = perRow(run, one, FEW, ROUNDS_FEW);
    const many = perRow(run, one, MANY, 1);
    const growth = many.time / few.time;
    yield { family, id, evaluations: many.time / evaluation, growth, refused: many.refused };
  }
}
