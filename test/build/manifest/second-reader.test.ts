/** What the vendor's own reader takes from manifest.xml, beside what our checker reads there. */
import { readFileSync } from "node:fs";
import { OfficeAddinManifest } from "office-addin-manifest";
import { expect, test } from "vitest";
import { parse } from "../../../src/build/manifest/element";

test("the vendor's reader finds in the manifest what ours finds", async () => {
  const root = parse(readFileSync("manifest.xml", "utf8"));
  const child = (name: string) => root.children.find((element) => element.name === name);
  const text = (name: string) => child(name)?.text;
  const given = (name: string) => child(name)?.attributes.DefaultValue;
  const ours = {
    id: text("Id"),
    version: text("Version"),
    providerName: text("ProviderName"),
    defaultLocale: text("DefaultLocale"),
    permissions: text("Permissions"),
    officeAppType: root.attributes["xsi:type"],
    displayName: given("DisplayName"),
    description: given("Description"),
    iconUrl: given("IconUrl"),
    highResolutionIconUrl: given("HighResolutionIconUrl"),
    supportUrl: given("SupportUrl"),
    hosts: child("Hosts")?.children.map(({ attributes }) => attributes.Name),
    defaultSettings: { sourceLocation: child("DefaultSettings")?.children[0]?.attributes.DefaultValue },
  };
  for (const [field, value] of Object.entries(ours)) expect(value, field).toBeTruthy();
  expect(await OfficeAddinManifest.readManifestFile("manifest.xml")).toMatchObject(ours);
});

test("the vendor's reader takes an add-in of this version for Excel", async () => {
  const { version } = JSON.parse(readFileSync("package.json", "utf8")) as { version: string };
  const read = await OfficeAddinManifest.readManifestFile("manifest.xml");
  expect([read.version, read.officeAppType, read.hosts]).toEqual([
    `${version}.0`,
    "TaskPaneApp",
    ["Workbook"],
  ]);
});
