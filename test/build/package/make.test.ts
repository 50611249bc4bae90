import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { cp } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { unzipSync } from "fflate";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import packageFile from "../../../package.json";
import { FIXED_ID } from "../../../src/build/manifest/identity";
import { makePackage, type Package } from "../../../src/build/package/make";
import { paneReference } from "../../../src/build/package/with-pane";

const scratch = mkdtempSync(join(tmpdir(), "beadline-package-"));
afterAll(() => rmSync(scratch, { recursive: true, force: true }));

const { version } = packageFile;
const address = "https://tools.example/thermo/beadline";
const sources = { dist: "dist", officeJs: "node_modules/@microsoft/office-js", version, out: scratch };

describe("a package for a host", () => {
  let made: Package;
  beforeAll(() => {
    made = makePackage({ address, offline: false }, sources);
  });
  const text = (file: string) => readFileSync(join(made.folder, file), "utf8");

  it("names its own address in the manifest and in the functions' help, and no other", () => {
    const manifest = text("manifest.xml");
    expect(manifest).toContain(`${address}/taskpane.html`);
    expect(manifest).not.toContain("localhost");
    const { functions } = JSON.parse(text("functions.json"));
    expect(functions.length).toBeGreaterThan(50);
    for (const { id, helpUrl } of functions) expect(helpUrl).toBe(`${address}/help.html#${id}`);
  });

  it("holds everything that was built and says how to host it", () => {
    for (const file of [
      "functions.js",
      "taskpane.html",
      "sheet.html",
      "help.html",
      "samples/furnace-log.xlsx",
    ]) {
      expect(readFileSync(join(made.folder, file)).equals(readFileSync(join("dist", file)))).toBe(true);
    }
    expect(text("HOSTING.txt")).toContain(`${address}/`);
  });

  it("is the same in the zip, and the same to the byte when it is made again", () => {
    const zip = readFileSync(made.zip);
    const entries = unzipSync(zip);
    expect(Object.keys(entries)).toHaveLength(made.files);
    expect(Buffer.from(entries[`beadline-${version}/manifest.xml`]!).toString()).toBe(text("manifest.xml"));
    makePackage({ address, offline: false }, sources);
    expect(readFileSync(made.zip).equals(zip)).toBe(true);
  });
});

describe("a package for a plant without internet", () => {
  it("carries what Excel needs of Office.js, and names no other origin in any page", () => {
    const { folder } = makePackage({ address, offline: true }, sources);
    const pane = readFileSync(join(folder, "taskpane.html"), "utf8");
    expect(pane).toContain('<script src="office/office.js"></script>');
    for (const page of ["taskpane.html", "sheet.html"]) {
      expect(readFileSync(join(folder, page), "utf8")).not.toMatch(/appsforoffice|(src|href)="https?:/);
    }
    for (const file of [
      "office.js",
      "LICENSE.md",
      "excel-win32-16.01.js",
      "excel-web-16.00.js",
      "excel-mac-16.00.js",
      "telemetry/oteljs_agave.js",
      "en-us/office_strings.js",
      "de-de/office_strings.js",
    ]) {
      expect(existsSync(join(folder, "office", file))).toBe(true);
    }
    for (const file of ["word-win32-16.01.js", "excel-web-16.00.debug.js", "en-us/outlook_strings.js"]) {
      expect(existsSync(join(folder, "office", file))).toBe(false);
    }
  });
});

describe("a package whose samples open the pane", () => {
  it("has them beside the others, with the manifest's own Id and version, and says for whom", () => {
    const share = "\\\\plant\\add-ins";
    const { folder } = makePackage({ address, offline: false, openPane: { share } }, sources);
    const text = (file: string) => readFileSync(join(folder, file), "utf8");
    const manifest = text("manifest.xml");
    const files = readdirSync(join(folder, "samples/with-pane"));
    expect(files).toEqual(readdirSync(join(folder, "samples")).filter((file) => file.endsWith(".xlsx")));
    for (const file of files) {
      const [opening, plain] = [`samples/with-pane/${file}`, `samples/${file}`].map((path) =>
        unzipSync(readFileSync(join(folder, path))),
      );
      const reference = Buffer.from(opening!["xl/webextensions/webextension1.xml"]!).toString();
      const [, id, version] = /<we:reference id="([^"]+)" version="([^"]+)"/.exec(reference)!;
      expect(manifest).toContain(`<Id>${id}</Id>`);
      expect(manifest).toContain(`<Version>${version}</Version>`);
      expect(reference).toContain(`store="${share}" storeType="FileSystem"`);
      expect(opening!["xl/worksheets/sheet2.xml"]).toEqual(plain!["xl/worksheets/sheet2.xml"]);
      expect(Object.keys(plain!)).not.toContain("xl/webextensions/webextension1.xml");
    }
    expect(text("HOSTING.txt")).toContain(`the shared folder ${share}`);
  });

  it("refers to the administrator's catalogue by its name", () => {
    expect(paneReference(readFileSync("manifest.xml", "utf8"), "central")).toEqual({
      id: FIXED_ID,
      version: `${version}.0`,
      storeType: "EXCatalog",
      store: "EXCatalog",
    });
  });
});

describe("a package that is not in order", () => {
  it("is not made, with every fault told", async () => {
    const dist = join(scratch, "broken");
    await cp("dist", dist, { recursive: true });
    rmSync(join(dist, "assets/icon-32.png"));
    writeFileSync(join(dist, "stray.js"), 'fetch("https://localhost:3000/x")');
    const out = join(scratch, "none");
    expect(() => makePackage({ address, offline: false }, { ...sources, dist, out })).toThrow(
      /no file .*icon-32\.png[\s\S]*stray\.js: names/,
    );
    expect(existsSync(join(out, `beadline-${version}`))).toBe(false);
  });
});
