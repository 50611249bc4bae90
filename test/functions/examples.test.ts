import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import catalogue from "../../src/catalogue/catalogue.json";
import { parseExample, parseResult } from "../../src/catalogue/formula";
import { WorksheetError } from "../../src/catalogue/functions-runtime";

const built = loadBuiltFunctions(readFileSync("dist/functions.js", "utf8"));
const examples = catalogue.functions.flatMap(({ id, examples }) =>
  examples.map((example) => ({ id, ...example })),
);

describe("every documented example, run on the built functions", () => {
  it.each(examples)("$formula gives $result", ({ id, formula, result }) => {
    const call = parseExample(formula);
    expect(call.id).toBe(id);
    const cells = built.get(id)?.(...call.given) ?? [];
    const { rows, more } = parseResult(result);
    if (more) expect(cells.length).toBeGreaterThan(rows.length);
    else expect(cells.length).toBe(rows.length);
    expect(cells.slice(0, rows.length).map((row) => row.length)).toEqual(rows.map((row) => row.length));
    rows.forEach((row, i) => {
      row.forEach(({ value, decimals }, j) => {
        const cell = cells[i]?.[j];
        if (cell instanceof WorksheetError) throw new Error(`${cell.code} ${cell.message}`);
        if (typeof value !== "number") expect(cell).toBe(value);
        else expect(Math.abs((cell as number) - value)).toBeLessThanOrEqual(0.5 * 10 ** -decimals + 1e-9);
      });
    });
  });

  it("covers every function", () => {
    expect(new Set(examples.map(({ id }) => id))).toEqual(new Set(built.keys()));
  });
});
