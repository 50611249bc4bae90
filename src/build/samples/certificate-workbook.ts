// Sample 2: readings put right. A sensor's certificate on a block of the log, and two repairs of a wrong setup.

import { blankSafe, blankSafeNote, SheetDraft, type SheetPlan, type WorkbookPlan } from "../../sheets";
import { crossedRows, wrongTypeRows } from "./wrong-setups";

export function certificateWorkbook(): WorkbookPlan {
  return {
    name: "Certificate and repairs",
    sentence:
      "One sensor's certificate applied to a block of the furnace log; readings logged with the wrong type, or through a crossed extension, put right.",
    invented: true,
    sheets: [certificateSheet(), wrongTypeSheet(), crossedSheet()],
  };
}

/** From scan 401 on: the end of the ramp, with the blank stretch of the log in it. */
const SCANS = { first: 401, rows: 90 };
const [top, bottom] = [8, 7 + SCANS.rows];

function certificateSheet(): SheetPlan {
  const reading = `BEAD.TEMPERATURE(${blankSafe(`B${top}:B${bottom}`)},"K",${blankSafe(`C${top}:C${bottom}`)})`;
  return new SheetDraft(
    "Certificate",
    [
      { width: 152, format: "date-time" },
      { width: 76, format: "mV" },
      { width: 100, format: "temperature" },
      { width: 16 },
      { width: 92, format: "degrees", role: "result" },
      { width: 104, format: "degrees", role: "result" },
      { width: 124, format: "degrees", role: "result" },
      { width: 32 },
      { width: 96, format: "temperature" },
      { width: 108, format: "degrees" },
      { width: 96, format: "degrees" },
    ],
    top - 1,
  )
    .title("One sensor's certificate, applied to a block of the furnace log")
    .notes(
      "A2",
      "INVENTED: Nonesuch Works, furnace 3, load 0417; the sensor of CH1 and its certificate do not exist.",
      "E8: the reading from mV. F8: reading + correction, straight between the points. G8: standard uncertainty of the correction alone.",
      "Below 200 °C and above 1000 °C the certificate says nothing: such readings would be #N/A, never a guess.",
      blankSafeNote,
    )
    .heading("I6", "Certificate of CH1, type K")
    .headers("A7", [
      ["time", "date-time"],
      ["CH1 mV", "mV"],
      ["terminal °C", "temperature"],
    ])
    .headers("E7", [
      ["reading °C", "degrees"],
      ["corrected °C", "degrees"],
      ["u(correction) °C", "degrees"],
    ])
    .headers("I7", [
      ["reading °C", "temperature"],
      ["correction °C", "degrees"],
      ["U (k = 2) °C", "degrees"],
    ])
    .log(`A${top}`, { file: "furnace-log.csv", ...SCANS, take: [0, 1, 5] })
    .inputs(
      "I8",
      [
        [200, 0.6, 1],
        [400, -0.3, 1],
        [600, -0.9, 1.2],
        [800, -1.4, 1.4],
        [1000, -2.1, 1.6],
      ],
      ["temperature", "degrees", "degrees"],
    )
    .labels("I14", "Coverage factor of U", "Drift allowance, ± °C")
    .inputs("K14", [[2], [0.5]], ["degrees"])
    .notes(
      "I17",
      "correction = true − reading",
      "u = √((U/k)² + drift²/3), U the larger",
      "of the two points beside the reading",
    )
    .spill("E8", `=${reading}`, SCANS.rows)
    .spill("F8", `=BEAD.CORRECTED(${reading},I8:I12,J8:J12)`, SCANS.rows)
    .spill("G8", `=BEAD.CORRECTIONU(${reading},I8:I12,K8:K12,K14,K15)`, SCANS.rows)
    .plan();
}

function wrongTypeSheet(): SheetPlan {
  const rows = wrongTypeRows();
  const last = 7 + rows.length;
  const range = (column: string) => blankSafe(`${column}8:${column}${last}`);
  return new SheetDraft(
    "Wrong type set",
    [
      { width: 152, format: "date-time" },
      { width: 128, format: "temperature" },
      { width: 100, format: "temperature" },
      { width: 16 },
      { width: 92, format: "degrees", role: "result" },
      { width: 16 },
      { width: 128, format: "mV", role: "result" },
      { width: 128, format: "mV", role: "result" },
    ],
    7,
  )
    .title("Logged with the instrument set to J on a type K couple")
    .notes(
      "A2",
      "INVENTED: Nonesuch Works, furnace 3, load 0421; no such log exists.",
      "E8: the same EMF read as type K. Adding a number of degrees would be wrong: what is lost is EMF, and it differs at each temperature.",
      "G8 and H8 are the check: the EMF behind the logged reading as J, and behind the repaired one as K, must be the same.",
      blankSafeNote,
    )
    .headers("A7", [
      ["time", "date-time"],
      ["logged as J °C", "temperature"],
      ["terminal °C", "temperature"],
    ])
    .headers("E7", [["true °C", "degrees"]])
    .headers("G7", [
      ["EMF as J mV", "mV"],
      ["EMF as K mV", "mV"],
    ])
    .inputs("A8", rows, ["date-time", "temperature", "temperature"])
    .spill("E8", `=BEAD.RETYPE(${range("B")},"J","K",${range("C")})`, rows.length)
    .spill("G8", `=BEAD.EMF(${range("B")},"J",${range("C")})`, rows.length)
    .spill("H8", `=BEAD.EMF(E8:E${last},"K",${range("C")})`, rows.length)
    .plan();
}

function crossedSheet(): SheetPlan {
  const rows = crossedRows();
  const last = 7 + rows.length;
  const range = (column: string) => blankSafe(`${column}8:${column}${last}`);
  return new SheetDraft(
    "Crossed extension",
    [
      { width: 152, format: "date-time" },
      { width: 92, format: "temperature" },
      { width: 76, format: "temperature" },
      { width: 100, format: "temperature" },
      { width: 16 },
      { width: 84, format: "degrees", role: "result" },
      { width: 32 },
      { width: 320, format: "text", role: "result" },
      { width: 108, format: "degrees", role: "result" },
      { width: 100, format: "degrees", role: "result" },
    ],
    7,
  )
    .title("Logged through an extension pair crossed at both ends")
    .notes(
      "A2",
      "INVENTED: Nonesuch Works, furnace 3, load 0422; no such log exists.",
      "F8: the readings put right. The log still rises and falls with the furnace, only too low, by twice the EMF between head and terminals.",
      "H14: how it was found. Each fault with the true temperature that it would mean; the one next to what is expected stands first.",
      blankSafeNote,
    )
    .headers("A7", [
      ["time", "date-time"],
      ["logged °C", "temperature"],
      ["head °C", "temperature"],
      ["terminal °C", "temperature"],
    ])
    .headers("F7", [["true °C", "degrees"]])
    .inputs("A8", rows, ["date-time", "temperature", "temperature", "temperature"])
    .spill("F8", `=BEAD.UNREVERSE(${range("B")},"K","both",${range("D")},${range("C")})`, rows.length)
    .heading("H7", "One suspicious reading")
    .labels("H8", "Logged °C", "Expected: second couple in the same well °C", "Head °C", "Terminal °C")
    .result("I8", `=B${last}`, "temperature")
    .inputs("I9", [[926.8]], ["temperature"])
    .result("I10", `=C${last}`, "temperature")
    .result("I11", `=D${last}`, "temperature")
    .heading("H13", "What would explain it")
    .table("H14", '=BEAD.DIAGNOSE(I8,I9,"K",I11,I10)', {
      rows: DIAGNOSED,
      formats: ["text", "degrees", "degrees"],
      hasHeader: true,
    })
    .notes(
      `H${15 + DIAGNOSED}`,
      "A likely fault is a place to look, not a finding. Isolate and lock off before",
      "work on furnace wiring; local codes and licensed practice come first.",
    )
    .plan();
}

/** Rows of DIAGNOSE's table for this reading, header included. */
const DIAGNOSED = 21;
