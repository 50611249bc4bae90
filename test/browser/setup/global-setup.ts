import { existsSync } from "node:fs";
import { fileURLToPath } from "node:url";
import type { TestProject } from "vitest/node";
import { serve } from "../../../src/build/serve";
import { launchBrowser } from "./chromium";

declare module "vitest" {
  export interface ProvidedContext {
    /** Where dist/ is served, on this machine only. */
    address: string;
    /** Where the browser listens for the tests. */
    browser: string;
  }
}

/** One server and one browser for all browser tests. */
export default async function setUp(project: TestProject) {
  const dist = fileURLToPath(new URL("../../../dist", import.meta.url));
  if (!existsSync(`${dist}/sheet.html`))
    throw new Error("dist/sheet.html is missing: run `npm run build` first.");
  const [server, browser] = await Promise.all([serve(dist, { port: 5700 }), launchBrowser()]);
  project.provide("address", server.address);
  project.provide("browser", browser.wsEndpoint());
  return async () => {
    await browser.close();
    await server.close();
  };
}
