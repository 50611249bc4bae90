import { describe, expect, it } from "vitest";
import type { Catalogue } from "../../src/catalogue/catalogue";
import catalogueFile from "../../src/catalogue/catalogue.json";
import { formulaOf, givenOf, readDraft } from "../../src/taskpane/build/draft";
import { argumentText, callText, fieldFault } from "../../src/taskpane/formula/arguments";
import { localForm } from "../../src/taskpane/formula/local-form";
import { argumentsOfCell } from "../../src/taskpane/formula/per-row";
import { resultShape } from "../../src/taskpane/formula/shape";
import { findCall, parse } from "../../src/taskpane/formula/syntax";

const catalogue = catalogueFile as unknown as Catalogue;
const parameter = (id: string, name: string) =>
  catalogue.functions.find((each) => each.id === id)!.parameters.find((each) => each.name === name)!;
const emf = parameter("TEMPERATURE", "emf");
const type = parameter("TEMPERATURE", "type");

describe("reading a formula", () => {
  it.each([
    ["-1.5E-3", { kind: "constant", value: -0.0015 }],
    ['"say ""K"""', { kind: "constant", value: 'say "K"' }],
    [
      "{1,2;3,4}",
      {
        kind: "array",
        rows: [
          [1, 2],
          [3, 4],
        ],
      },
    ],
    ["'Furnace log'!$B$8:B20", { kind: "range", address: "'Furnace log'!$B$8:B20" }],
    ["B:C", { kind: "range", address: "B:C" }],
    ["A1+1", { kind: "other" }],
    ["F(1)+G(2)", { kind: "other" }],
  ])("takes %s for what it is", (text, expected) => {
    expect(parse(text)).toEqual(expected);
  });

  it("finds the call inside another formula, quotes and commas in it", () => {
    expect(findCall('=ROUND(BEAD.EMF(A1,"K,",{1,2}),1)', "BEAD")).toEqual({
      before: "=ROUND(",
      id: "EMF",
      given: ["A1", '"K,"', "{1,2}"],
      after: ",1)",
    });
    expect(findCall('="BEAD.EMF(1)"', "BEAD")).toBeUndefined();
    expect(findCall("=XBEAD.EMF(1)", "BEAD")).toBeUndefined();
    expect(findCall("=BEAD.EMF(1", "BEAD")).toBeUndefined();
  });

  it.each([
    '=BEAD.TEMPERATURE(IF(ISBLANK(B8:E2007),"",B8:E2007),"K",IF(ISBLANK(F8:F2007),"",F8:F2007))',
    '=ROUND(BEAD.EMF(A1,"K",,"F"),2)',
    '=BEAD.EMF(H8:H20,"K")',
    '=BEAD.VERDICT(B1:B5,2.2,,"simple")',
    "=BEAD.TEMPERATURE(A1*1000,B1,'Other sheet'!C1)",
  ])("puts %s back as it was", (formula) => {
    const draft = readDraft(formula, catalogue)!;
    expect(formulaOf(draft, "BEAD", givenOf(draft))).toBe(formula);
  });
});

describe("writing a formula", () => {
  it.each([
    ["4.096", "4.096"],
    ["B8:B20", 'IF(ISBLANK(B8:B20),"",B8:B20)'],
    ["B8", "B8"],
    ["{1;2}", "{1;2}"],
    ["", ""],
  ])("writes the reading %s as %s", (field, text) => {
    expect(argumentText(field, emf, true)).toBe(text);
  });

  it.each([
    ["K", '"K"'],
    ["Au/Pt", '"Au/Pt"'],
    ["$B$5", "$B$5"],
    ['say "K"', '"say ""K"""'],
  ])("writes the option %s as %s", (field, text) => {
    expect(argumentText(field, type, true)).toBe(text);
  });

  it("drops what is left out at the end", () => {
    expect(callText("BEAD", "EMF", ["1", '"K"', "", ""])).toBe('BEAD.EMF(1,"K")');
    expect(callText("BEAD", "EMF", ["1", '"K"', "", '"F"'])).toBe('BEAD.EMF(1,"K",,"F")');
  });

  it.each([
    ["4,096", "Write numbers with a point here: 4.096."],
    ["(1", "bracket"],
    ["1,2,3", "comma"],
    ["", "Needed."],
  ])("finds the fault in %s", (field, words) => {
    expect(fieldFault(field, emf)).toContain(words);
  });
});

describe("the form for each row", () => {
  it("takes of each range the cell that belongs to it", () => {
    const given = ['IF(ISBLANK(B8:C9),"",B8:C9)', '"K"', "F8:F9", "$A$1", "'Furnace log'!B1:C1"];
    expect(argumentsOfCell(given, 1, 1)).toEqual([
      'IF(ISBLANK(C9),"",C9)',
      '"K"',
      "F9",
      "$A$1",
      "'Furnace log'!C1",
    ]);
  });

  it("has the shape of its ranges together", () => {
    expect(resultShape(['IF(ISBLANK(B8:C9),"",B8:C9)', '"K"', "F8:F9", ""])).toEqual({ rows: 2, columns: 2 });
    expect(resultShape(["A1*2"])).toBeUndefined();
  });
});

describe("the local form", () => {
  it("changes separators outside quotes, in arrays to those of arrays", () => {
    const comma = { decimal: ",", list: ";" };
    expect(localForm('=BEAD.EMF({1.5,2;3,4},"K,1.5",A1.B2,0.25)', comma)).toBe(
      '=BEAD.EMF({1,5\\2;3\\4};"K,1.5";A1.B2;0,25)',
    );
    expect(localForm("=A(1,2.5)", { decimal: ".", list: "," })).toBe("=A(1,2.5)");
  });
});
