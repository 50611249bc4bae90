import { describe, expect, it } from "vitest";
import { shifted } from "../../src/workbooks/shifted-formula";
import { couldSpill, fromStored, toStored } from "../../src/workbooks/stored-formula";

describe("a formula in a file", () => {
  it.each([
    ['=BEAD.EMF(A1,"K")', '_xldudf_BEAD_EMF(A1,"K")'],
    ["=bead.emf(A1)", "_xldudf_BEAD_EMF(A1)"],
    ['=CONCAT("BEAD.EMF(",A1)', '_xlfn.CONCAT("BEAD.EMF(",A1)'],
    ["='LET(x'!A1+1", "'LET(x'!A1+1"],
    [
      "=LET(t,A1:A9,s,t*2,BEAD.EMF(s)-t)",
      "_xlfn.LET(_xlpm.t,A1:A9,_xlpm.s,_xlpm.t*2,_xldudf_BEAD_EMF(_xlpm.s)-_xlpm.t)",
    ],
    ["=MAP(A1:A3,LAMBDA(x,x+$X$1))", "_xlfn.MAP(A1:A3,_xlfn.LAMBDA(_xlpm.x,_xlpm.x+$X$1))"],
    ["=SORT(FILTER(A1:A9,A1:A9>0))", "_xlfn._xlws.SORT(_xlfn._xlws.FILTER(A1:A9,A1:A9>0))"],
    ["=STDEV.S(A1:A9)", "_xlfn.STDEV.S(A1:A9)"],
    ["=SUM(A1:A9)", "SUM(A1:A9)"],
    ['="say ""BEAD.EMF("" "&A1', '"say ""BEAD.EMF("" "&A1'],
  ])("%s is stored as %s", (typed, stored) => {
    expect(toStored(typed)).toBe(stored);
  });

  it.each([
    ['_xldudf_BEAD_EMF(A1,"_xlfn.K")', '=BEAD.EMF(A1,"_xlfn.K")'],
    ["_xlfn.LET(_xlpm.t,A1,_xlfn._xlws.SORT(_xlpm.t))", "=LET(t,A1,SORT(t))"],
  ])("%s is read as %s", (stored, typed) => {
    expect(fromStored(stored)).toBe(typed);
  });

  it("is a dynamic array where it could fill more than one cell", () => {
    for (const formula of ["=BEAD.EMF(A1)", "=A1:A9*2", "={1,2}", "=INDEX(A1:B9,1,0)", "=SUM(A1:A9*2)"]) {
      expect(`${formula} ${couldSpill(formula)}`).toBe(`${formula} true`);
    }
    for (const formula of [
      "=B25",
      "=A1*2-'Load: (log)'!B2",
      "=MIN(B14:G14)",
      '="a:b("&A1',
      "=SUM(A1:A9)/COUNT(B:B)",
    ]) {
      expect(`${formula} ${couldSpill(formula)}`).toBe(`${formula} false`);
    }
  });
});

describe("a formula that was filled down", () => {
  it.each([
    ["=A1+$A1+A$1+$A$1", "=B3+$A3+B$1+$A$1"],
    ["=SUM(A1:B2)*2E1", "=SUM(B3:C4)*2E1"],
    ['=A1&"A1"', '=B3&"A1"'],
    ["='A1'!A1", "='A1'!B3"],
    ["=Log!A1+LOG10(A1)", "=Log!B3+LOG10(B3)"],
    ["=BEAD.EMF(A1,XFD1)", "=BEAD.EMF(B3,#REF!)"],
  ])("%s reads %s two rows down and one column right", (formula, expected) => {
    expect(shifted(formula, 2, 1)).toBe(expected);
  });
});
