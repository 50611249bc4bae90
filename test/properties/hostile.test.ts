/** Every function of functions.json under arbitrary cells: it answers, and what it answers is sound. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import catalogue from "../../src/catalogue/catalogue.json";
import { parseExample } from "../../src/catalogue/formula";
import metadata from "../../src/catalogue/functions.json";
import * as worksheet from "../../src/functions";
import { argument, cell } from "./hostile-cells";
import { unsound } from "./sound-result";

type Call = (...given: unknown[]) => unknown;

const functions = metadata.functions.map(({ id, parameters }) => ({
  id,
  count: parameters.length,
  call: (worksheet as unknown as Record<string, Call>)[id] as Call,
  /** Calls that work, to be spoilt: arbitrary arguments alone seldom get past the first of them. */
  examples: (catalogue.functions.find((one) => one.id === id)?.examples ?? []).map(
    ({ formula }) => parseExample(formula).given,
  ),
}));

/** Excel puts an invocation object after the last argument. */
const invocation = { address: "Sheet1!A1", functionName: "x" };

const sound = (call: Call, given: readonly unknown[]): void => {
  expect(unsound(call(...given), given)).toBeUndefined();
};

const RUNS = 400;

describe.each(functions)("$id", ({ count, call, examples }) => {
  it("gives a sound result for whatever it is handed", () => {
    const given = fc.array(argument, { minLength: count, maxLength: count });
    fc.assert(
      fc.property(given, (all) => sound(call, all)),
      { numRuns: RUNS },
    );
    sound(call, []);
    sound(call, new Array(count).fill(null).concat(invocation));
  });

  it("gives a sound result when a good call is spoilt", () => {
    const spoilt = fc
      .tuple(
        fc.constantFrom(...examples),
        fc.array(fc.tuple(fc.nat(), fc.nat(), fc.nat(), cell), { maxLength: 3 }),
      )
      .map(([example, changes]) => {
        const all: unknown[] = Array.from({ length: count }, (_, i) => structuredClone(example[i]) ?? null);
        for (const [which, row, column, content] of changes) {
          const range = all[which % count];
          if (!Array.isArray(range)) all[which % count] = [[content]];
          else {
            const cells = range[row % range.length] as unknown[];
            cells[column % cells.length] = content;
          }
        }
        return [...all, invocation];
      });
    const replaced = fc
      .tuple(
        fc.constantFrom(...examples),
        fc.array(fc.tuple(fc.nat(), argument), { minLength: 1, maxLength: 2 }),
      )
      .map(([example, changes]) => {
        const all: unknown[] = Array.from({ length: count }, (_, i) => example[i] ?? null);
        for (const [which, whole] of changes) all[which % count] = whole;
        return all;
      });
    fc.assert(
      fc.property(fc.oneof(spoilt, replaced), (all) => sound(call, all)),
      { numRuns: 2 * RUNS },
    );
  });
});

describe("calls that once gave a message with Infinity or NaN in it", () => {
  it.each<[string, Call, unknown[]]>([
    ["a table of the smallest steps", worksheet.EMFTABLE, [[["K"]], [[0]], [[30]], [[5e-324]]]],
    ["a sensor of the largest resistance", worksheet.PRTEMPERATURE, [[[138.51]], [[1.7976931348623157e308]]]],
    ["NaN for TRUE or FALSE", worksheet.CALFIT, [[[0], [1]], [[1], [3]], [[0]], null, [[Number.NaN]]]],
  ] as [string, Call, unknown[]][])("%s", (_, call, given) => sound(call, given));
});

describe("the functions", () => {
  it("are those of functions.json, and each has an example to spoil", () => {
    expect(Object.keys(worksheet).sort()).toEqual(functions.map(({ id }) => id).sort());
    for (const { examples } of functions) expect(examples.length).toBeGreaterThan(0);
  });
});
