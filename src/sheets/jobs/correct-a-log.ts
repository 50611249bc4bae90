import { blankSafe, blankSafeNote } from "../blank-safe";
import { SheetDraft } from "../draft";
import { EXAMPLE_LINE, type Job } from "./job";

const ROWS = 500;
const [top, bottom] = [10, 9 + ROWS];
const range = (column: string) => blankSafe(`${column}${top}:${column}${bottom}`);

/** A furnace on its way up, a scan a minute: 2026-03-02 06:00, mV, terminal °C. */
const READINGS = [4.096, 8.138, 12.209, 16.397, 20.644, 24.905, 29.129, 33.275].map((emf, minute) => [
  46_083.25 + minute / 1440,
  emf,
  Math.round(10 * (22 + 0.15 * minute)) / 10,
]);

const CERTIFICATE = [
  [100, 0.3],
  [400, -0.4],
  [900, -1.3],
];

/** Only the points that are there: an empty row would be a point at 0 °C. */
const POINTS = ["H", "I"].map((column) => `FILTER(${column}10:${column}19,H10:H19<>"")`).join(",");

/** Millivolts and terminal temperatures become temperatures, and these are corrected by a certificate. */
export const correctALog: Job = {
  name: "Correct a log",
  sentence:
    "Millivolts and terminal temperatures become temperatures, corrected by the sensor's certificate.",
  examples: ["A2", `A${top}:C${bottom}`, "H10:I19"],
  sheet: new SheetDraft(
    "Corrected log",
    [
      { width: 152, format: "date-time" },
      { width: 88, format: "mV" },
      { width: 104, format: "temperature" },
      { width: 16 },
      { width: 104, format: "degrees", role: "result" },
      { width: 104, format: "degrees", role: "result" },
      { width: 24 },
      { width: 104, format: "temperature" },
      { width: 104, format: "degrees" },
    ],
    top - 1,
  )
    .title("Log corrected by a certificate")
    .notes(
      "A2",
      EXAMPLE_LINE,
      `Put times, mV and terminal temperatures below row ${top - 1}, up to row ${bottom}; the certificate's points into H and I. The type stands in B6.`,
      blankSafeNote,
    )
    .labels("A6", "Thermocouple type")
    .inputs("B6", [["K"]], ["text"])
    .heading("H8", "Certificate")
    .headers(`A${top - 1}`, [
      ["time", "date-time"],
      ["mV", "mV"],
      ["terminal °C", "temperature"],
    ])
    .headers(`E${top - 1}`, [
      ["reading °C", "degrees"],
      ["corrected °C", "degrees"],
    ])
    .headers(`H${top - 1}`, [
      ["reading °C", "temperature"],
      ["correction °C", "degrees"],
    ])
    .inputs(`A${top}`, READINGS, ["date-time", "mV", "temperature"])
    .inputs("H10", CERTIFICATE, ["temperature", "degrees"])
    .spill(`E${top}`, `=BEAD.TEMPERATURE(${range("B")},B6,${range("C")})`, ROWS)
    .spill(`F${top}`, `=BEAD.CORRECTED(BEAD.TEMPERATURE(${range("B")},B6,${range("C")}),${POINTS})`, ROWS)
    .notes("H21", "correction = true − reading", "outside the points: #N/A, never a guess")
    .plan(),
};
