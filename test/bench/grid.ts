/**
 * The same column of readings on the local sheet, twice: one formula over it, and a native formula in each cell with
 * the published inverse polynomial that people paste today (NIST SRD 60, type K, 0 to 500 °C, as printed).
 */
import { chromium, type Page } from "playwright-core";
import { serve } from "../../src/build/serve";
import { launchBrowser } from "../browser/setup/chromium";
import { publishedInverses } from "../published/inverse-approximations";
import type { Line } from "./convert";
import { limits } from "./limits";

const ROWS = 10_000;

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

export async function gridLines(): Promise<Line[]> {
  const coefficients = publishedInverses.find(
    ({ type, emfRange }) => type === "K" && emfRange[0] === 0,
  )?.coefficients;
  if (coefficients === undefined) throw new Error("no published inverse of type K from 0 °C");
  const readings = Array.from({ length: ROWS }, (_, i) => [(20 * (i + 1)) / ROWS]);
  const native = readings.map((_, i) => polynomial(coefficients, `A${i + 1}`));
  const one = [`=BEAD.TEMPERATURE(IF(ISBLANK(A1:A${ROWS}),"",A1:A${ROWS}),"K",0)`];
  const [server, browserServer] = await Promise.all([serve("dist", { port: 5800 }), launchBrowser()]);
  const browser = await chromium.connect(browserServer.wsEndpoint());
  try {
    const page = await browser.newPage();
    await page.goto(server.address);
    await page.waitForFunction(() => window.beadlineSheet !== undefined);
    const times = { one: Number.POSITIVE_INFINITY, native: Number.POSITIVE_INFINITY };
    for (let round = 0; round < 3; round++) {
      times.one = Math.min(times.one, await timeSheet(page, `One${round}`, readings, one));
      times.native = Math.min(times.native, await timeSheet(page, `Native${round}`, readings, native));
    }
    return [{ ...limits.sheet, ratio: times.one / times.native }];
  } finally {
    await browser.close();
    await browserServer.close();
    await server.close();
  }
}
