/** What the build says of everything that ships. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { isPermissive } from "../../../src/build/licences/permissive";
import { shippedPackages } from "../../../src/build/licences/shipped-packages";

const packages = shippedPackages();
const built = (file: string): string => readFileSync(`dist/${file}`, "utf8");

describe("what ships", () => {
  it.each(packages)("$name $version is permissive: $licence", ({ licence }) => {
    expect(isPermissive(licence)).toBe(true);
  });

  it("has no foreign code in functions.js but the bundler's own", () => {
    const bundled = JSON.parse(readFileSync(".cache/bundled/functions.json", "utf8"));
    expect(bundled).toEqual([]);
  });

  it("is named in THIRD-PARTY-NOTICES.txt, with its licence in full where it has one", () => {
    const notices = built("THIRD-PARTY-NOTICES.txt");
    for (const { name, version, licence, texts } of packages) {
      expect(notices).toContain(`${name} ${version}, ${licence}`);
      for (const text of texts) expect(notices.includes(text)).toBe(true);
    }
  });

  it("is the bill of materials, each with the digest of the lock file", () => {
    const bill = JSON.parse(built("bill-of-materials.cdx.json"));
    expect(bill.bomFormat).toBe("CycloneDX");
    expect(bill.components.map(({ name }: { name: string }) => name)).toEqual(
      packages.map(({ name }) => name),
    );
    const references = new Set(bill.components.map((one: Record<string, string>) => one["bom-ref"]));
    expect(references.size).toBe(packages.length);
    expect(bill.dependencies[0].dependsOn.length).toBe(packages.length);
    for (const { hashes } of bill.components) expect(hashes[0]?.content).toMatch(/^[0-9a-f]{128}$/);
  });
});
