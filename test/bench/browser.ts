/** A browser and a server for each of some folders, for as long as a part of the benchmark needs them. */
import { type Browser, chromium } from "playwright-core";
import { type Serving, serve } from "../../src/build/serve";
import { launchBrowser } from "../browser/setup/chromium";

export interface Opened {
  readonly browser: Browser;
  /** Where each folder is served. */
  readonly addresses: readonly string[];
  close(): Promise<void>;
}

export async function openBrowser(...folders: readonly string[]): Promise<Opened> {
  const browserServer = await launchBrowser();
  const browser = await chromium.connect(browserServer.wsEndpoint());
  const servers: Serving[] = [];
  for (const folder of folders) servers.push(await serve(folder, { port: 5800 }));
  return {
    browser,
    addresses: servers.map(({ address }) => address),
    async close() {
      await browser.close();
      await browserServer.close();
      for (const server of servers) await server.close();
    },
  };
}
