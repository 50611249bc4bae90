/**
 * What a conversion costs, as ratios to one evaluation of the reference function measured in the same run:
 * the exact inverse, and one formula over a million readings on the built functions.
 */
import { type Thermocouple, thermocouple } from "../../src/core";
import { builtFunctions, type WorksheetFunction } from "./built-functions";
import { type Limit, limits } from "./limits";
import type { Line, Pace } from "./line";
import { bestTimes, type Work } from "./processor-time";

const READINGS = 1_000_000;

/** Spread evenly over 20 to 1350 °C in no order (multiples of the golden ratio). */
function readings(couple: Thermocouple) {
  const temperatures = Float64Array.from(
    { length: READINGS },
    (_, i) => 20 + 1330 * ((i * 0.618033988749895) % 1),
  );
  return { temperatures, emfs: temperatures.map((t) => couple.emf(t)) };
}

export async function* conversionLines({ quick, slack }: Pace): AsyncGenerator<Line> {
  const couple = thermocouple("K") as Thermocouple;
  const { temperatures, emfs } = readings(couple);
  const column = Array.from(emfs, (emf) => [emf]);
  const references = Array.from(temperatures, (t) => [20 + t / 200]);
  const TEMPERATURE = (await builtFunctions()).get("TEMPERATURE") as WorksheetFunction;
  const converted = new Float64Array(READINGS);
  let kept = 0;
  const works: Work[] = [
    {
      name: "evaluation",
      run() {
        for (let i = 0; i < READINGS; i++) kept += couple.emf(temperatures[i] as number);
      },
    },
    {
      name: "inverse",
      run() {
        couple.temperatures(emfs, converted, READINGS);
      },
    },
    { name: "call", run: () => void TEMPERATURE(column, [["K"]], [[25]]) },
    { name: "call with references", run: () => void TEMPERATURE(column, [["K"]], references) },
  ];
  const time = bestTimes(works, quick ? 3 : 10);
  if (!Number.isFinite(kept + converted.reduce((sum, t) => sum + t)))
    throw new Error("the benchmark converted a reading to nothing");
  const line = ({ what, limit }: Limit, name: string): Line => ({
    what,
    ratio: time(name) / time("evaluation"),
    limit: limit * slack,
  });
  yield line(limits.inverse, "inverse");
  yield line(limits.formula, "call");
  yield line(limits.references, "call with references");
}
