import { blankSafe, blankSafeNote } from "../blank-safe";
import { SheetDraft } from "../draft";
import { EXAMPLE_LINE, type Job } from "./job";

const LINES = blankSafe("A8:F17");

/** From lines as they are typed to k and U. */
export const uncertaintyBudget: Job = {
  name: "Uncertainty budget",
  sentence: "Contributions line by line, combined by the GUM to an expanded uncertainty.",
  examples: ["A2", "A8:F17"],
  sheet: new SheetDraft(
    "Budget",
    [
      { width: 248, format: "text" },
      { width: 88, format: "degrees" },
      { width: 120, format: "text" },
      { width: 80, format: "factor" },
      { width: 160, format: "degrees" },
      { width: 152, format: "count" },
      { width: 112, format: "degrees", role: "result" },
      { width: 152, format: "count", role: "result" },
      { width: 80, format: "share", role: "result" },
    ],
    7,
  )
    .title("Uncertainty budget")
    .notes(
      "A2",
      EXAMPLE_LINE,
      "One line for each contribution, in °C, up to row 17. Left empty: the distribution's own divisor, sensitivity 1, infinitely many degrees of freedom.",
      "Distributions: normal, rectangular, triangular, u-shaped, trapezoidal, resolution (full step), standard.",
      blankSafeNote,
    )
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
        ["certificate of the reference (U)", 0.6, "normal", 2, null, null],
        ["drift since then", 0.4, "rectangular", null, null, null],
        ["indicator, resolution (full step)", 0.1, "resolution", null, null, null],
        ["repeatability, mean of five", 0.35, "standard", null, null, 4],
      ],
      ["text", "degrees", "text", "factor", "factor", "count"],
    )
    .labels("A19", "Combined standard uncertainty °C", "Coverage factor k", "Expanded uncertainty U °C")
    .result("B19", `=BEAD.BUDGET(${LINES},,"combined")`, "degrees")
    .result("B20", `=BEAD.BUDGET(${LINES},,"k")`, "factor")
    .result("B21", `=BEAD.BUDGET(${LINES},,"expanded")`, "degrees")
    .heading("A23", "The budget, from one formula in A24")
    .table("A24", `=BEAD.BUDGET(${LINES})`, {
      rows: 16,
      formats: ["text", "degrees", "text", "factor", "degrees", "factor", "degrees", "count", "share"],
      hasHeader: true,
    })
    .plan(),
};
