// The packages whose code went into a bundle, as the build itself wrote them down.

import { existsSync, readdirSync, readFileSync } from "node:fs";
import { resolve } from "node:path";
import { root } from "../sources";

export interface ShippedPackage {
  readonly name: string;
  readonly version: string;
  /** As the package declares it, an SPDX expression; else by its licence file; else empty. */
  readonly licence: string;
  /** Its own licence and notice files, in full. */
  readonly texts: readonly string[];
  /** Where it is installed, from the root of the project: its key in the lock file. */
  readonly folder: string;
}

const LISTS = [".cache/bundled/functions.json", ".cache/bundled/pages.json"];

/** Its start-up code stands in every bundle without being a module of it. */
const BUNDLER = "node_modules/webpack";

const FOLDER = /^.*node_modules\/(?:@[^/]+\/)?[^/]+/;

const LEGAL = /^(licen[cs]e|notice|copying)/i;

/** What `npm run build` bundled; it must have run. */
export function shippedPackages(): ShippedPackage[] {
  const folders = new Set([BUNDLER]);
  for (const list of LISTS) {
    const file = resolve(root, list);
    if (!existsSync(file)) throw new Error(`${list} is missing: run npm run build`);
    for (const path of JSON.parse(readFileSync(file, "utf8")) as string[]) {
      const folder = FOLDER.exec(path)?.[0];
      if (folder !== undefined) folders.add(folder);
    }
  }
  return [...folders].map(describe).sort((a, b) => (a.name < b.name ? -1 : a.name > b.name ? 1 : 0));
}

function describe(folder: string): ShippedPackage {
  const path = resolve(root, folder);
  const { name, version, license } = JSON.parse(readFileSync(resolve(path, "package.json"), "utf8")) as {
    name: string;
    version: string;
    license?: unknown;
  };
  const texts = readdirSync(path)
    .filter((file) => LEGAL.test(file))
    .sort()
    .map((file) => readFileSync(resolve(path, file), "utf8").replaceAll("\r\n", "\n").trim());
  const licence = typeof license === "string" ? license : licenceOfText(texts[0] ?? "");
  return { name, version, licence, texts, folder };
}

/** For a package that carries a licence and forgets to declare it. */
function licenceOfText(text: string): string {
  if (/^\s*Apache License\s+Version 2\.0, January 2004/.test(text)) return "Apache-2.0";
  return /^\s*(The )?MIT License/.test(text) ? "MIT" : "";
}
