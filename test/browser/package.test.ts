import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { chromium } from "playwright-core";
import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import packageFile from "../../package.json";
import { makePackage } from "../../src/build/package/make";
import { type Serving, serve } from "../../src/build/serve";

const out = mkdtempSync(join(tmpdir(), "beadline-offline-"));
let server: Serving;

beforeAll(async () => {
  const { folder } = makePackage(
    { address: "https://tools.example/beadline", offline: true },
    { dist: "dist", officeJs: "node_modules/@microsoft/office-js", version: packageFile.version, out },
  );
  server = await serve(folder, { port: 5760 });
});
afterAll(async () => {
  await server.close();
  rmSync(out, { recursive: true, force: true });
});

describe("a package for a plant without internet", () => {
  it("shows the pane with its own Office.js, and asks no other address for anything", async () => {
    const browser = await chromium.connect(inject("browser"));
    const page = await browser.newPage();
    const elsewhere: string[] = [];
    const faults: string[] = [];
    await page.route("**", (route) => {
      if (route.request().url().startsWith(server.address)) return route.continue();
      elsewhere.push(route.request().url());
      return route.abort();
    });
    page.on("pageerror", (error) => faults.push(error.message));
    page.on("console", (message) => {
      if (message.type() === "error") faults.push(message.text());
    });
    await page.goto(`${server.address}taskpane.html`);
    await page.getByText("TEMPERATURE", { exact: false }).first().waitFor();
    expect(await page.evaluate(() => typeof Reflect.get(globalThis, "Office"))).toBe("object");
    expect({ elsewhere, faults }).toEqual({ elsewhere: [], faults: [] });
    await browser.close();
  });
});
