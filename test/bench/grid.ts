/**
 * The same column of readings on the local sheet, twice: one formula over it, and a native formula in each cell with
 * the published inverse polynomial that people paste today (NIST SRD 60, type K, 0 to 500 °C, as printed). Then one
 * formula over ten times as many.
 */
import type { Page } from "playwright-core";
import { publishedInverses } from "../published/inverse-approximations";
import { openBrowser } from "./browser";
import { limits } from "./limits";
import type { Line, Pace } from "./line";

const ROWS = 10_000;
const MANY = 10 * ROWS;
const ROUNDS = 2;

/** Milliseconds from handing the formulas to the sheet until its last cell holds a number. */
const timeSheet = (page: Page, name: string, rows: number[][], formulas: string[]): Promise<number> =>
  page.evaluate(
    async ([name, rows, formulas]) => {
      const column = { width: 88, format: "mV" } as const;
      const sheet = window.beadlineSheet as NonNullable<typeof window.beadlineSheet>;
      const start = performance.now();
      await sheet.addSheet({
        name,
        columns: [column, column],
        frozenRows: 0,
        printOnePageWide: true,
        cells: formulas.map((formula, row) => ({ row, column: 1, formula, role: "result" })),
        readings: { row: 0, column: 0, rows },
      });
      const last = `${name}!B${rows.length}`;
      while (typeof (await sheet.getValues(last))[0]?.[0] !== "number")
        await new Promise((next) => setTimeout(next, 5));
      return performance.now() - start;
    },
    [name, rows, formulas] as const,
  );

/** A1, B1 … as native arithmetic in ascending powers. */
const polynomial = (coefficients: readonly number[], cell: string): string =>
  `=${coefficients.map((coefficient, power) => `${coefficient}*${cell}^${power}`).join("+")}`.replaceAll(
    "+-",
    "-",
  );

const readings = (rows: number): number[][] =>
  Array.from({ length: rows }, (_, i) => [(20 * (i + 1)) / rows]);

const one = (rows: number): string[] => [`=BEAD.TEMPERATURE(IF(ISBLANK(A1:A${rows}),"",A1:A${rows}),"K",0)`];

type Name = "few" | "many" | "native";

export async function* gridLines({ slack }: Pace): AsyncGenerator<Line> {
  const coefficients = publishedInverses.find(
    ({ type, emfRange }) => type === "K" && emfRange[0] === 0,
  )?.coefficients;
  if (coefficients === undefined) throw new Error("no published inverse of type K from 0 °C");
  const few = readings(ROWS);
  const native = few.map((_, i) => polynomial(coefficients, `A${i + 1}`));
  const opened = await openBrowser("dist");
  const never = Number.POSITIVE_INFINITY;
  const best = { few: never, many: never, native: never };
  try {
    for (let round = 0; round < ROUNDS; round++) {
      // A page anew: the more formulas a workbook holds, the longer any of them takes.
      const page = await opened.browser.newPage();
      await page.goto(opened.addresses[0] as string);
      await page.waitForFunction(() => window.beadlineSheet !== undefined);
      const measure = async (name: Name, sheet: string, rows: number[][], formulas: string[]) => {
        best[name] = Math.min(best[name], await timeSheet(page, sheet, rows, formulas));
      };
      await measure("few", "First", few, one(ROWS));
      await measure("few", "Second", few, one(ROWS));
      await measure("many", "Third", readings(MANY), one(MANY));
      await measure("native", "Fourth", few, native);
      await page.close();
    }
    const { what, limit } = limits.sheet;
    yield { what, ratio: best.few / best.native, limit: limit * slack };
    yield {
      what: "one formula on the local sheet, a row among 100 000, to a row among 10 000",
      ratio: best.many / MANY / (best.few / ROWS),
      limit: 3 * slack,
    };
  } finally {
    await opened.close();
  }
}
