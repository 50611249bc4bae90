import { blankSafe, blankSafeNote } from "../blank-safe";
import { SheetDraft } from "../draft";
import { EXAMPLE_LINE, type Job } from "./job";

const NAMES = ["couple 1", "couple 2", "couple 3", "couple 4"];

const READINGS = [
  [199.8, 200.6, 199.1, 201.9, 200],
  [400.2, 401.3, 399.4, 403, 400.5],
  [600.1, 601.8, 598.9, 604.1, 600.3],
  [800.4, 802.5, 798.7, 806.9, 800.1],
  [1000.2, 1003.1, 997.6, 1008.2, 999.9],
];

/** Readings of a lot against a class, guarded by the uncertainty of the check. */
export const toleranceCheck: Job = {
  name: "Tolerance check",
  sentence: "Readings of several couples against a tolerance class, with a guarded verdict for each point.",
  examples: ["A2", "A11:E20"],
  sheet: new SheetDraft(
    "Tolerance check",
    [
      { width: 152, format: "temperature" },
      ...NAMES.map(() => ({ width: 104, format: "temperature" }) as const),
      { width: 24 },
      { width: 120, format: "text", role: "result" },
      { width: 104, format: "temperature", role: "result" },
      { width: 104, format: "temperature", role: "result" },
      { width: 88, format: "degrees", role: "result" },
      { width: 88, format: "degrees", role: "result" },
      { width: 72, format: "share", role: "result" },
      { width: 88, format: "text", role: "result" },
    ],
    10,
  )
    .title("Tolerance check")
    .notes(
      "A2",
      EXAMPLE_LINE,
      "Reference temperatures into A, one column of readings for each couple beside them, up to row 20.",
      "Guarded: Pass only where the error lies inside its limit less U; Fail then also says “not proven”.",
      blankSafeNote,
    )
    .labels("A6", "Type", "Tolerance class", "U of an error °C")
    .inputs("B6", [["K"], [2]], ["text"])
    .inputs("B8", [[0.6]], ["degrees"])
    .headers("A10", [
      ["reference °C", "temperature"],
      ...NAMES.map((name) => [`${name} °C`, "temperature"] as const),
    ])
    .inputs("A11", READINGS, ["temperature", "temperature", "temperature", "temperature", "temperature"])
    .table(
      "G10",
      `=BEAD.CHECKTABLE(${blankSafe("A11:A20")},${blankSafe("B11:E20")},B6,B7,B8,"guarded",{${NAMES.map((name) => `"${name}"`).join(",")}})`,
      {
        rows: 1 + 10 * NAMES.length,
        formats: ["text", "temperature", "temperature", "degrees", "degrees", "share", "text"],
        hasHeader: true,
        verdicts: [6],
      },
    )
    .plan(),
};
