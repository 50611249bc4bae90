/**
 * `npm run pictures`: takes the README's pictures anew, into `samples/pictures/` or a folder that is named. Not a part of
 * `npm run generate`: two machines do not draw the same bytes. After a change of the look, run it and look at them.
 */
import { existsSync, mkdirSync, statSync } from "node:fs";
import { chromium } from "playwright-core";
import { serve } from "../../../src/build/serve";
import { launchBrowser } from "../setup/chromium";
import { FOLDER, PICTURES, SCHEMES } from "./pictures";
import { takePicture } from "./take";

const folder = process.argv[2] ?? FOLDER;

if (!existsSync("dist/sheet.html")) throw new Error("dist/sheet.html is missing: run `npm run build` first.");
mkdirSync(folder, { recursive: true });
const [server, launched] = await Promise.all([serve("dist", { port: 5840 }), launchBrowser()]);
try {
  const browser = await chromium.connect(launched.wsEndpoint());
  for (const picture of PICTURES) {
    for (const scheme of SCHEMES) {
      const path = await takePicture(browser, server.address, folder, picture, scheme);
      console.log(`${path}  ${Math.round(statSync(path).size / 1000)} kB`);
    }
  }
  await browser.close();
} finally {
  await launched.close();
  await server.close();
}
