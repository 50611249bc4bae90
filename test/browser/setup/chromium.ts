import { existsSync, mkdirSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { type BrowserServer, chromium } from "playwright-core";
import packageFile from "../../../package.json";

const version = packageFile.devDependencies["@sparticuz/chromium"];

/**
 * Starts a browser for the tests. On Linux it comes with an npm package, which unpacks itself, its libraries and
 * its fonts into the temporary folder: one of our own, named by version, so that no other program's half-unpacked
 * copy is taken. Elsewhere it is the installed Chrome or Edge.
 */
export async function launchBrowser(): Promise<BrowserServer> {
  if (process.platform !== "linux") return launchInstalled();
  const folder = join(tmpdir(), `beadline-chromium-${version}`);
  mkdirSync(folder, { recursive: true });
  // Set before the package is loaded: it reads both while loading. Without the second it leaves out its libraries.
  process.env.TMPDIR = folder;
  process.env.AWS_EXECUTION_ENV ??= "AWS_Lambda_nodejs20.x";
  const { default: packaged } = await import("@sparticuz/chromium");
  const executablePath = await packaged.executablePath();
  return chromium.launchServer({
    executablePath,
    // Not the package's own list: that one switches web security off.
    args: ["--no-sandbox", "--disable-gpu", "--font-render-hinting=none"],
    env: {
      ...process.env,
      LD_LIBRARY_PATH: join(folder, "al2023", "lib"),
      FONTCONFIG_FILE: writeFontConfiguration(folder),
    } as Record<string, string>,
  });
}

/** Without fonts the browser draws no text, or ends; the package's own configuration names other folders. */
function writeFontConfiguration(folder: string): string {
  const file = join(folder, "beadline-fonts.conf");
  if (!existsSync(file)) {
    writeFileSync(
      file,
      `<?xml version="1.0"?><!DOCTYPE fontconfig SYSTEM "fonts.dtd"><fontconfig>
<dir>${join(folder, "fonts")}</dir><cachedir>${join(folder, "font-cache")}</cachedir></fontconfig>`,
    );
  }
  return file;
}

async function launchInstalled(): Promise<BrowserServer> {
  try {
    return await chromium.launchServer({ channel: "chrome" });
  } catch {
    return await chromium.launchServer({ channel: "msedge" });
  }
}
