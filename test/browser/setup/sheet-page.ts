import { type Browser, type BrowserContextOptions, chromium, type Page } from "playwright-core";
import { expect, inject } from "vitest";
import type { CellValue } from "../../../src/local-sheet/workbook";

let browser: Browser | undefined;

/**
 * A page that breaks the test when it breaks a promise of ours: a request to another origin, a violation of the
 * content security policy, an error in a script.
 */
export interface WatchedPage {
  page: Page;
  /** What went wrong up to now; tests end with `expect(...).toEqual([])` by `closePage`. */
  faults: string[];
}

/** Where Excel's script comes from. Tests answer for that host themselves: no request leaves the machine. */
const OFFICE_HOST = "https://appsforoffice.microsoft.com/";

export interface PageOptions extends BrowserContextOptions {
  /** `script`: the vendor's own Office.js, from its npm package. `absent`: the host cannot be reached. */
  office?: "script" | "absent";
}

export async function openPage(path = "", { office, ...options }: PageOptions = {}): Promise<WatchedPage> {
  browser ??= await chromium.connect(inject("browser"));
  const context = await browser.newContext({ viewport: { width: 1280, height: 800 }, ...options });
  const page = await context.newPage();
  const faults: string[] = [];
  const own = inject("address");
  if (office !== undefined) {
    await context.route(`${OFFICE_HOST}**`, (route) => {
      const file = new URL(route.request().url()).pathname.replace("/lib/1/hosted/", "");
      if (office === "absent") return route.abort();
      return route.fulfill({ path: `node_modules/@microsoft/office-js/dist/${file}` });
    });
  }
  page.on("request", (request) => {
    const url = request.url();
    if (office !== undefined && url.startsWith(OFFICE_HOST)) return;
    if (!url.startsWith(own) && !/^(data|blob|about):/.test(url)) faults.push(`request to ${url}`);
  });
  page.on("pageerror", (error) => faults.push(`script error: ${error.message}`));
  page.on("console", (message) => {
    // The browser's own word that the script of an absent host did not load.
    const expected = office === "absent" && message.location().url.startsWith(OFFICE_HOST);
    if (message.type() === "error" && !expected) faults.push(`console: ${message.text()}`);
  });
  await page.addInitScript(() => {
    document.addEventListener("securitypolicyviolation", (event) => {
      console.error(`policy violation: ${event.violatedDirective} ${event.blockedURI} ${event.sample}`);
    });
  });
  await page.goto(own + path);
  return { page, faults };
}

/** The local sheet with its sample calculated. */
export async function openSheet(options: BrowserContextOptions = {}): Promise<WatchedPage> {
  const watched = await openPage("", options);
  try {
    await waitForValue(watched.page, "'Furnace log'!H8", (value) => typeof value === "number", 20_000);
  } catch (failure) {
    throw new Error(`the sample is not calculated: ${watched.faults.join("; ")}`, { cause: failure });
  }
  return watched;
}

export async function closePage({ page, faults }: WatchedPage): Promise<void> {
  await page.context().close();
  expect(faults).toEqual([]);
}

export const readValues = (page: Page, range: string): Promise<CellValue[][]> =>
  page.evaluate((address) => window.beadlineSheet!.getValues(address), range);

/** Waits for a cell rather than for the engine's word that it is done, which may come too early. */
export async function waitForValue(
  page: Page,
  cell: string,
  isReady: (value: CellValue | undefined) => boolean,
  timeout = 30_000,
): Promise<CellValue> {
  const end = Date.now() + timeout;
  let value: CellValue | undefined;
  while (Date.now() < end) {
    value = await page.evaluate(
      async (address) => (await window.beadlineSheet?.getValues(address).catch(() => undefined))?.[0]?.[0],
      cell,
    );
    if (isReady(value)) return value!;
    await page.waitForTimeout(50);
  }
  throw new Error(`${cell} still holds ${JSON.stringify(value)} after ${timeout} ms`);
}

/** Goes to a cell as a user does, by the name box at the left of the formula bar, with the grid in focus after. */
export async function goToCell(page: Page, cell: string): Promise<void> {
  const nameBox = page.locator("#grid input").first();
  await nameBox.fill(cell);
  await nameBox.press("Enter");
  await page.waitForFunction(
    async (address) => (await window.beadlineSheet!.getSelection()).endsWith(`!${address}`),
    cell,
  );
}
