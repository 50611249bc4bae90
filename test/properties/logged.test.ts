/** What must hold of every function that takes a logged block, whatever stands in its cells. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { runningSlope } from "../../src/core/numeric/running-slope";
import * as worksheet from "../../src/functions";
import { errorCell, one } from "../functions/call";

const cell = fc.oneof(
  { weight: 8, arbitrary: fc.integer({ min: 890, max: 910 }) },
  { weight: 1, arbitrary: fc.constantFrom<unknown>("", null, true, "1,5", 0, undefined) },
  {
    weight: 1,
    arbitrary: fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY, 1e308, -1e308, 9e99, 1e-308),
  },
  { weight: 1, arbitrary: fc.constantFrom("#N/A", "#REF!").map((code) => errorCell(code)) },
);
const interval = fc.oneof(
  { weight: 8, arbitrary: fc.constantFrom(0, 1, 2, 10) },
  { weight: 1, arbitrary: fc.constantFrom(1e-300, 1e300) },
);
const log = fc
  .tuple(fc.integer({ min: 1, max: 12 }), fc.integer({ min: 1, max: 3 }))
  .chain(([rows, columns]) =>
    fc.record({
      block: fc.array(fc.array(cell, { minLength: columns, maxLength: columns }), {
        minLength: rows,
        maxLength: rows,
      }),
      intervals: fc.array(interval, { minLength: rows, maxLength: rows }),
      blankBelow: fc.integer({ min: 0, max: 2 }),
      oddTime: fc.option(fc.tuple(fc.nat(11), cell), { freq: 5 }),
    }),
  )
  .map(({ block, intervals, blankBelow, oddTime }) => {
    let now = 0;
    const times: unknown[][] = intervals.map((step) => {
      now += step;
      return [now];
    });
    if (oddTime !== null && times.length > 3) times[oddTime[0] % times.length] = [oddTime[1]];
    for (let k = 0; k < blankBelow && k < times.length; k++) times[times.length - 1 - k] = [""];
    return { block, times };
  });

type Call = (block: unknown[][], times: unknown[][]) => unknown[][];
const { none, min } = { none: undefined, min: one("min") };
const f = worksheet;

const SAME_SHAPE: Readonly<Record<string, Call>> = {
  FLAGS: (block) => f.FLAGS(block, one(895), one(905), one(3), one(2), one(2)),
  DESPIKE: (block) => f.DESPIKE(block),
  RAMPRATE: (block, times) => f.RAMPRATE(times, block, none, min),
  UNLAG: (block, times) => f.UNLAG(times, block, one(30), one(1), min),
};
const OTHERS: Readonly<Record<string, Call>> = {
  TIMELINE: (_, times) => f.TIMELINE(times),
  TIMECONSTANT: (block, times) => f.TIMECONSTANT(times, block, min),
  SOAK: (block, times) => f.SOAK(times, block, one(900), one(8), none, none, min),
  SURVEY: (block, times) => f.SURVEY(times, block, one(900), one(8), none, none, none, none, none, none, min),
  "SURVEY from start to end": (block, times) =>
    f.SURVEY(times, block, one(900), one(8), none, none, one(1), one(30), none, none, min, none, one("F")),
  SURVEYSENSORS: (block, times) =>
    f.SURVEYSENSORS(times, block, one(900), one(8), none, none, one(0), one(9), min),
  ENVELOPE: (block) => f.ENVELOPE(block),
  TIMEABOVE: (block, times) => f.TIMEABOVE(times, block, one(900), none, min),
  LETHALITY: (block, times) =>
    f.LETHALITY(times, block, one(900), one(10), none, none, none, min, one("running")),
  MEANKINETIC: (block, times) => f.MEANKINETIC(block, none, times, min, one("K")),
};

describe.each(Object.entries({ ...SAME_SHAPE, ...OTHERS }))("%s", (name, call) => {
  it("answers with numbers, texts and errors only, in a rectangle", () => {
    fc.assert(
      fc.property(log, ({ block, times }) => {
        const result = call(block, times);
        expect(result.length).toBeGreaterThan(0);
        const whole = result.length === 1 && result[0]?.length === 1;
        if (name in SAME_SHAPE && !whole) {
          expect(result.map((row) => row.length)).toEqual(block.map((row) => row.length));
        }
        for (const row of result) {
          expect(row.length).toBe(result[0]?.length);
          for (const entry of row) {
            if (typeof entry === "number") expect(Number.isFinite(entry)).toBe(true);
            else if (typeof entry !== "string") expect(entry).toBeInstanceOf(CustomFunctions.Error);
          }
        }
      }),
      { numRuns: 400 },
    );
  });
});

describe("the slope over a wide window", () => {
  it("is that of all its points, summed one by one", () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.constantFrom(0, 1, 1, 2), fc.integer({ min: 0, max: 50 })), {
          minLength: 600,
          maxLength: 900,
        }),
        fc.integer({ min: 140, max: 1000 }),
        (points, halfWidth) => {
          let now = 1e6;
          const x = Float64Array.from(points, ([step]) => {
            now += step;
            return now;
          });
          const y = Float64Array.from(points, ([, value]) => (value > 45 ? Number.NaN : value));
          const slopes = runningSlope(x, y, halfWidth);
          for (let i = 0; i < x.length; i += 97) {
            if (Number.isNaN(y[i])) continue;
            let [n, sx, sy, sxx, sxy] = [0, 0, 0, 0, 0];
            for (let k = 0; k < x.length; k++) {
              const dx = (x[k] as number) - (x[i] as number);
              if (Math.abs(dx) > halfWidth || Number.isNaN(y[k])) continue;
              n++;
              sx += dx;
              sy += y[k] as number;
              sxx += dx * dx;
              sxy += dx * (y[k] as number);
            }
            expect(slopes[i]).toBeCloseTo((n * sxy - sx * sy) / (n * sxx - sx * sx), 11);
          }
        },
      ),
      { numRuns: 40 },
    );
  });
});
