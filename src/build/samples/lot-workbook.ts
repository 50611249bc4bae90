// Sample 3: the clerk's tolerance check of a lot, with the uncertainty budget that its guard band comes from.

import {
  blankSafe,
  blankSafeNote,
  columnName,
  SheetDraft,
  type SheetPlan,
  type WorkbookPlan,
} from "../../sheets";

export function lotWorkbook(): WorkbookPlan {
  return {
    name: "Tolerance check of a lot",
    sentence:
      "Eight type K thermocouples at five temperatures against class 2, guarded by the uncertainty of the calibration, with the budget beside it.",
    invented: true,
    sheets: [lotSheet(), budgetSheet(), statementSheet()],
  };
}

const INVENTED =
  "INVENTED: the thermometer bench of the Nonesuch Works; no such couples and no such calibration exist.";

const REFERENCES = [199.6, 400.3, 600.8, 799.5, 998.7];

/**
 * Errors of the couples at the five temperatures, chosen so that the lot teaches something: 3 is inside its limit
 * at 200 °C but not proven, 6 leaves it when hot, and one reading of 7 was not taken.
 */
const ERRORS: (number | null)[][] = [
  [0.4, 0.6, 0.9, 1.1, 1.5],
  [-0.7, -0.9, -1.4, -1.9, -2.3],
  [1.9, 1.6, 2.2, 2.7, 3.1],
  [1, 1.5, 2.6, 3.6, 4.5],
  [-1.1, -1.6, -3, -4.1, -5.2],
  [0.9, 1.5, 2.9, 6.4, 8.8],
  [0.2, -0.4, null, -1.8, -2.6],
  [-0.2, 0.1, 0.3, -0.1, 0.2],
];

const NAMES = ERRORS.map((_, i) => `K-${String(i + 1).padStart(2, "0")}`);
const readings = REFERENCES.map((reference, point) =>
  ERRORS.map((errors) => {
    const error = errors[point];
    return error == null ? null : Math.round(10 * (reference + error)) / 10;
  }),
);

/** The couple and the temperature whose statement is shown: inside the limit, and not proven to be. */
const STATED = { couple: 2, point: 0 };

function lotSheet(): SheetPlan {
  const lastColumn = columnName(NAMES.length);
  const rows = 1 + REFERENCES.length * NAMES.length;
  const sheet = new SheetDraft(
    "Lot check",
    [{ width: 208, format: "text", role: "result" }, ...NAMES.map(() => ({ width: 96 }) as const)],
    7,
  )
    .title("Tolerance check of a lot of eight type K thermocouples")
    .notes(
      "A2",
      INVENTED,
      "Class 2 of IEC 60584-1 for new wire. Guarded: Pass only where the error lies inside its limit less U; Fail then also says “not proven”.",
      "A Pass says that these readings lay within their limits when they were taken. It releases no sensor for an alarm, a trip or another safety duty.",
      blankSafeNote,
      "K-07 was not read near 600 °C: its row of the table stays blank, and its class rests on four points.",
    )
    .headers("A7", [
      ["reference °C", "temperature"],
      ...NAMES.map((name) => [`${name} °C`, "temperature"] as const),
    ])
    .inputs(
      "A8",
      REFERENCES.map((reference, i) => [reference, ...(readings[i] ?? [])]),
      ["temperature", ...NAMES.map(() => "temperature" as const)],
    )
    .labels("A14", "Class met, by its limits", "Error ± U at the last point °C", "U °C", "Coverage factor k");
  NAMES.forEach((_, i) => {
    const column = columnName(i + 1);
    const taken = `${column}8:${column}12`;
    sheet.result(
      `${column}14`,
      `=BEAD.CLASSMET(IF(ISBLANK(${taken}),"",$A$8:$A$12),IF(ISBLANK(${taken}),"",${taken}-$A$8:$A$12),"K")`,
      "general",
      "verdict",
    );
  });
  return sheet
    .table("B15", `=BEAD.REPORTVALUE(B12:${lastColumn}12-A12,B16)`, {
      rows: 1,
      formats: NAMES.map(() => "general" as const),
    })
    .result("B16", `=ROUNDUP(${fromBudget("expanded")},1)`, "temperature")
    .result("B17", `=ROUND(${fromBudget("k")},2)`, "factor")
    .notes(
      "D16",
      "from the sheet Budget, for the hottest point, the largest of the five; rounded up to the tenth.",
    )
    .heading("A19", "The table, couple after couple, from one formula in A20")
    .table(
      "A20",
      `=BEAD.CHECKTABLE(A8:A12,${blankSafe(`B8:${lastColumn}12`)},"K",2,B16,"guarded",{${NAMES.map((name) => `"${name}"`).join(",")}})`,
      {
        rows,
        formats: ["text", "temperature", "temperature", "degrees", "degrees", "share", "text"],
        hasHeader: true,
        verdicts: [6],
      },
    )
    .plan();
}

/** What goes into the certificate of one couple. */
function statementSheet(): SheetPlan {
  const on = (cell: string) => `'Lot check'!${cell}`;
  const reading = on(`${columnName(STATED.couple + 1)}${8 + STATED.point}`);
  const reference = on(`A${8 + STATED.point}`);
  return new SheetDraft("Statement", [{ width: 208, format: "text" }, { width: 96 }, { width: 520 }], 4)
    .title(`Statement of conformity: ${NAMES[STATED.couple]} near 200 °C`)
    .notes(
      "A2",
      INVENTED,
      "Agree on the decision rule with the customer before the work. A stated Pass releases no sensor for a safety duty.",
    )
    .labels(
      "A5",
      "Reading °C",
      "Reference °C",
      "Error °C",
      "Limit ± of class 2 °C",
      "U °C",
      "Coverage factor k",
      "Verdict",
    )
    .result("B5", `=${reading}`, "temperature")
    .result("B6", `=${reference}`, "temperature")
    .result("B7", "=B5-B6", "temperature")
    .result("B8", '=BEAD.TOLERANCE(B6,"K",2)', "degrees")
    .result("B9", `=${on("B16")}`, "temperature")
    .result("B10", `=${on("B17")}`, "factor")
    .result("B11", '=BEAD.VERDICT(B7,B8,B9,"guarded")', "general", "verdict")
    .paragraph("A13", "Statement", "C13", '=BEAD.STATEMENT(B7,B8,B9,"guarded",B10)', 96)
    .plan();
}

const LINES = 'IF(ISBLANK(Budget!A8:F13),"",Budget!A8:F13)';
const fromBudget = (metric: string) => `BEAD.BUDGET(${LINES},,"${metric}")`;

function budgetSheet(): SheetPlan {
  return new SheetDraft(
    "Budget",
    [
      { width: 304, format: "text" },
      { width: 76, format: "degrees" },
      { width: 116, format: "text" },
      { width: 76, format: "factor" },
      { width: 172, format: "degrees" },
      { width: 152, format: "degrees" },
      { width: 108, format: "degrees", role: "result" },
      { width: 148, format: "count", role: "result" },
      { width: 76, format: "share", role: "result" },
    ],
    4,
  )
    .title("Uncertainty budget of one error, at 1000 °C")
    .notes(
      "A2",
      INVENTED,
      "Values in °C, as half-widths ± unless the distribution says otherwise. Blank: divisor of the distribution, sensitivity 1, infinitely many degrees of freedom.",
      blankSafeNote,
    )
    .heading("A6", "Lines, as they are typed")
    .headers("A7", [
      ["quantity", "text"],
      ["value °C", "degrees"],
      ["distribution", "text"],
      ["divisor", "factor"],
      ["sensitivity", "factor"],
      ["degrees of freedom", "count"],
    ])
    .inputs(
      "A8",
      [
        ["reference couple, certificate (U)", 0.6, "normal", 2, null, null],
        ["reference couple, drift since then", 0.4, "rectangular", null, null, null],
        ["block, difference between wells", 0.5, "rectangular", null, null, null],
        ["indicator, accuracy", 0.2, "rectangular", null, null, null],
        ["indicator, resolution (full step)", 0.1, "resolution", null, null, null],
        ["repeatability, mean of five", 0.35, "standard", null, null, 4],
      ],
      ["text", "degrees", "text", "factor", "factor", "count"],
    )
    .heading("A15", "The budget, from one formula in A16")
    .table("A16", `=BEAD.BUDGET(${LINES.replaceAll("Budget!", "")})`, {
      rows: 12,
      formats: [
        "text",
        "degrees",
        "text",
        "factor",
        "uncertainty",
        "factor",
        "uncertainty",
        "count",
        "share",
      ],
      hasHeader: true,
      rowFormats: { 8: "factor", 9: "probability", 10: "factor" },
    })
    .labels("A29", "k from the degrees of freedom alone", "Error of K-08, as a certificate prints it °C")
    .result("B29", "=BEAD.COVERAGE(G24)", "factor")
    .result("B30", "=BEAD.REPORTVALUE('Lot check'!I12-'Lot check'!A12,G27)", "general")
    .plan();
}
