/**
 * Every function, family by family, in one unit: what a row costs in evaluations of a reference function, measured in
 * the same run, and how much dearer a row is among many than among few.
 */
import type { Catalogue, CatalogueFunction } from "../../src/catalogue/catalogue";
import catalogueJson from "../../src/catalogue/catalogue.json";
import { type Thermocouple, thermocouple } from "../../src/core";
import { builtFunctions, type WorksheetFunction } from "./built-functions";
import { GROWTH, limitOf } from "./family-limits";
import type { Line, Pace } from "./line";
import { bestTimes, type Work, warmUp } from "./processor-time";
import { argumentsOf, mostRows, takesRanges } from "./rows";

const catalogue = catalogueJson as Catalogue;

export const FAMILIES: readonly string[] = [...new Set(catalogue.functions.map(({ category }) => category))];

const FEW = 1000;

const EVALUATIONS = 200_000;

/** The bare loop: evaluations over 20 to 1350 °C in no order (multiples of the golden ratio). */
function bareLoop(): Work {
  const couple = thermocouple("K") as Thermocouple;
  const temperatures = Float64Array.from(
    { length: EVALUATIONS },
    (_, i) => 20 + 1330 * ((i * 0.618033988749895) % 1),
  );
  let kept = 0;
  return {
    name: "evaluations",
    run() {
      for (let i = 0; i < EVALUATIONS; i++) kept += couple.emf(temperatures[i] as number);
      if (!Number.isFinite(kept)) throw new Error("the bare loop came to nothing");
    },
  };
}

/** The message, where a call with more than one row has only that to say. */
function refusalOf(result: readonly (readonly unknown[])[]): string | undefined {
  const only = result.length === 1 ? result[0]?.[0] : undefined;
  return only instanceof CustomFunctions.Error ? `${only.code} ${only.message}` : undefined;
}

function lineOf(one: CatalogueFunction, call: WorksheetFunction, loop: Work, { quick, slack }: Pace): Line {
  const grows = takesRanges(one);
  const few = grows ? FEW : 1;
  const many = mostRows(one, !grows ? 1 : quick ? 100 * FEW : 1000 * FEW);
  let result: unknown[][] = [];
  const among = (rows: number): (() => void) => {
    const given = argumentsOf(one, rows);
    return () => {
      result = call(...given());
    };
  };
  const amongFew = among(few);
  const works: Work[] = [loop, { name: "few", calls: warmUp(amongFew, quick ? 20 : 40), run: amongFew }];
  if (grows) works.push({ name: "many", run: among(many) });
  const time = quick ? bestTimes(works, 2, 250) : bestTimes(works, 3, 1000);
  const evaluation = time("evaluations") / EVALUATIONS;
  const row = grows ? time("many") / many : time("few");
  return {
    what: `${one.category}: ${one.id}${grows ? (many < 1000 * FEW && !quick ? `, ${many} rows` : "") : ", one call"}`,
    ratio: row / evaluation,
    limit: limitOf(one, grows) * slack,
    growth: grows ? { ratio: row / (time("few") / few), limit: GROWTH } : undefined,
    refused: grows ? refusalOf(result) : undefined,
  };
}

/** One after the other, as they are measured. */
export async function* familyLines(family: string, pace: Pace): AsyncGenerator<Line> {
  const built = await builtFunctions();
  const loop = bareLoop();
  warmUp(loop.run, 100);
  for (const one of catalogue.functions.filter(({ category }) => category === family)) {
    yield lineOf(one, built.get(one.id) as WorksheetFunction, loop, pace);
  }
}
