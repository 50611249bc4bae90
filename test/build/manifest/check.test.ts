import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { checkManifest, projectSurroundings } from "../../../src/build/manifest/check";

const xml = readFileSync("manifest.xml", "utf8");
const surroundings = projectSurroundings(".");

/** The faults after one change of the file. The change must change something, or the test shows nothing. */
function faultsAfter(find: string | RegExp, put: string, from = surroundings): string {
  const changed = xml.replace(find, put);
  expect(changed).not.toBe(xml);
  return checkManifest(changed, from).join("\n");
}

test("the project's manifest is in order", () => {
  expect(checkManifest(xml, surroundings)).toEqual([]);
});

test.each<[string, string | RegExp, string, string]>([
  ["broken XML", "</OfficeApp>", "", "not well-formed XML"],
  ["another kind of add-in", 'xsi:type="TaskPaneApp"', 'xsi:type="MailApp"', "TaskPaneApp"],

  [
    "swapped elements at the top",
    /(<Id>.*<\/Id>)(\s*)(<Version>.*<\/Version>)/,
    "$3$2$1",
    "<Id> must stand before <Version>",
  ],
  [
    "a label behind its icon",
    /(<Label resid="Group.Label"\/>)(\s*)(<Icon>[\s\S]*?<\/Icon>)/,
    "$3$2$1",
    "<Label> must stand before <Icon>",
  ],
  [
    "strings before addresses",
    /(<bt:Urls>[\s\S]*<\/bt:Urls>)(\s*)(<bt:ShortStrings>[\s\S]*<\/bt:ShortStrings>)/,
    "$3$2$1",
    "<Urls> must stand before <ShortStrings>",
  ],
  [
    "metadata before the page",
    /(<Page>[\s\S]*?<\/Page>)(\s*)(<Metadata>[\s\S]*?<\/Metadata>)/,
    "$3$2$1",
    "<Page> must stand before <Metadata>",
  ],
  [
    "an unknown element",
    "<DefaultSettings>",
    "<Sparkle/><DefaultSettings>",
    "<Sparkle> is not known in <OfficeApp>",
  ],
  [
    "shortcuts before the functions",
    /(<VersionOverrides[\s\S]*<\/VersionOverrides>)(\s*)(<ExtendedOverrides .*\/>)/,
    "$3$2$1",
    "<VersionOverrides> must stand before <ExtendedOverrides>",
  ],
  [
    "a context menu without its button",
    /<OfficeMenu id[\s\S]*?<\/OfficeMenu>/,
    "<OfficeMenu/>",
    "<OfficeMenu> needs <Control>",
  ],
  [
    "a menu entry that calls nothing",
    /<FunctionName>.*<\/FunctionName>/,
    "",
    "<Action> needs <FunctionName>",
  ],
  [
    "shortcuts at another place",
    "https://localhost:3000/shortcuts.json",
    "https://localhost:4000/shortcuts.json",
    "several origins",
  ],
  ["a missing element", /<ProviderName>.*<\/ProviderName>/, "", "<OfficeApp> needs <ProviderName>"],

  ["an Id that is no GUID", /<Id>.*<\/Id>/, "<Id>beadline</Id>", "is not a GUID"],
  ["a new Id", /<Id>1/, "<Id>2", "workbooks know"],
  ["a version of its own", /<Version>.*<\/Version>/, "<Version>9.9.9.0</Version>", "the Version is 9.9.9.0"],

  [
    "a dangling reference",
    'resid="Group.Label"',
    'resid="Group.Lable"',
    'refers to "Group.Lable", which no resource has',
  ],
  [
    "a resource without use",
    'resid="Group.Label"',
    'resid="ShowFunctions.Label"',
    'nothing refers to the resource "Group.Label"',
  ],
  [
    "an id that stands twice",
    'String id="Group.Label"',
    'String id="ShowFunctions.Label"',
    '"ShowFunctions.Label" stands twice',
  ],
  ["an id that is too long", /"Help\.Url"/g, `"${"H".repeat(33)}"`, "must have 1 to 32 characters"],
  [
    "a short string that is too long",
    'DefaultValue="Thermocouples"',
    `DefaultValue="${"T".repeat(126)}"`,
    '"Group.Label" has 126 characters; it may have 1 to 125',
  ],
  [
    "a long string that is too long",
    'DefaultValue="Opens',
    `DefaultValue="${"T".repeat(250)}`,
    '"ShowFunctions.Tip" has',
  ],
  ["an empty string", 'DefaultValue="Thermocouples"', 'DefaultValue=""', '"Group.Label" has 0 characters'],
  [
    "a description that is too long",
    'Description DefaultValue="',
    `Description DefaultValue="${"D".repeat(250)}`,
    '"Description" has',
  ],

  [
    "an address without encryption",
    "https://localhost:3000/functions.js",
    "http://localhost:3000/functions.js",
    "must begin with https://",
  ],
  ["half an address", "https://localhost:3000/help.html", "help.html", "is not a whole address"],
  [
    "a second origin",
    "https://localhost:3000/functions.js",
    "https://localhost:3001/functions.js",
    "several origins",
  ],

  [
    "an icon that is not there",
    'id="Icon.20" DefaultValue="https://localhost:3000/assets/icon-20.png"',
    'id="Icon.20" DefaultValue="https://localhost:3000/assets/icon-21.png"',
    "there is no file assets/icon-21.png",
  ],
  [
    "an icon of another size",
    'size="24" resid="Icon.24"',
    'size="24" resid="Icon.20"',
    "icon-20.png is 20 by 20 pixels, not 24 by 24",
  ],
  [
    "a list without its 80 pixels",
    '<bt:Image size="80" resid="Icon.80"/>',
    "",
    "<Icon> needs an image of 80 pixels",
  ],
  [
    "a large icon of the wrong size",
    "assets/icon-64.png",
    "assets/icon-32.png",
    "icon-32.png is 32 by 32 pixels, not 64 by 64",
  ],

  ["a runtime that ends with the pane", 'lifetime="long"', 'lifetime="short"', 'lifetime="long"'],
  [
    "a button with a page of its own",
    '<FunctionFile resid="Page.Url"/>',
    '<FunctionFile resid="Help.Url"/>',
    "<FunctionFile> refers to",
  ],
  [
    "functions with a page of their own",
    /(<Page>\s*<SourceLocation resid=)"Page.Url"/,
    '$1"Help.Url"',
    "<Page> refers to",
  ],
  [
    "a pane with a page of its own",
    /(<\/TaskpaneId>\s*<SourceLocation resid=)"Page.Url"/,
    '$1"Help.Url"',
    "<ShowTaskpane> refers to",
  ],
  [
    "a pane that workbooks cannot ask for",
    "Office.AutoShowTaskpaneWithDocument",
    "Beadline.Pane",
    'the pane is named "Beadline.Pane"',
  ],
  [
    "too new a function runtime",
    'Name="CustomFunctionsRuntime" MinVersion="1.3"',
    'Name="CustomFunctionsRuntime" MinVersion="1.4"',
    "1.3 is the most",
  ],
  [
    "a requirement that is not needed",
    'Set Name="SharedRuntime"',
    'Set Name="RibbonApi"',
    "RibbonApi is not one the functions use",
  ],
  [
    "a requirement left out",
    '<Set Name="SharedRuntime" MinVersion="1.1"/>',
    "",
    "SharedRuntime is not asked for",
  ],
  ["another namespace", 'DefaultValue="BEAD"', 'DefaultValue="BEADS"', "formulas in workbooks say BEAD"],
])("%s is noticed", (_what, find, put, fault) => {
  expect(faultsAfter(find, put)).toContain(fault);
});

test("a fault says in which line it stands", () => {
  const line = xml.slice(0, xml.indexOf('<Label resid="Group.Label"')).split("\n").length;
  expect(faultsAfter('resid="Group.Label"', 'resid="Nowhere"')).toContain(`line ${line}: <Label>`);
});

test("several faults are all told", () => {
  expect(
    checkManifest(xml.replace("lifetime", "life").replace("<Id>1", "<Id>2"), surroundings).length,
  ).toBeGreaterThan(1);
});

test("a version of package.json that moved on is noticed", () => {
  const moved = { ...surroundings, packageVersion: "99.0.0" };
  const { packageVersion } = surroundings;
  expect(checkManifest(xml, moved)).toEqual([
    `the Version is ${packageVersion}.0; package.json asks for 99.0.0.0`,
  ]);
});
