// Sample 4: a uniformity survey, from the logger's file to the figures of a report.

import {
  blankSafe,
  blankSafeNote,
  columnName,
  SheetDraft,
  type SheetPlan,
  type WorkbookPlan,
} from "../../sheets";
import { CORRECTIONS, SETPOINT, SURVEY_LOG_FILE, SURVEY_LOG_NOTES, SURVEY_SCANS } from "./uniformity-survey";

export function surveyWorkbook(): WorkbookPlan {
  return {
    name: "Uniformity survey",
    sentence:
      "Nine sensors in a furnace, one that overshoots and one that is lost for three scans: what the summary says, what sets the class, and why it is not a Pass.",
    invented: true,
    sheets: [summarySheet(), logSheet()],
  };
}

const SENSORS = CORRECTIONS.map((_, i) => `S${i + 1}`);
const LAST_COLUMN = columnName(SENSORS.length);
const TOP = 8;
const BOTTOM = TOP + SURVEY_SCANS - 1;
const on = (range: string) => `'Survey log'!${range}`;
const TIMES = blankSafe(on(`A${TOP}:A${BOTTOM}`));
const READINGS = blankSafe(on(`B${TOP}:${LAST_COLUMN}${BOTTOM}`));
const CORRECTED = on(`B6:${LAST_COLUMN}6`);
const NAMES = on(`B7:${LAST_COLUMN}7`);
const INPUTS = `${TIMES},${READINGS},B8,B9,${CORRECTED}`;

/** Rows of SURVEY's table, header included, that hold something else than degrees. */
const METRIC_FORMATS = {
  2: "general",
  3: "time",
  5: "general",
  6: "time",
  11: "general",
  12: "general",
  15: "time",
  16: "time",
  17: "minutes",
  18: "count",
  20: "count",
  21: "general",
} as const;

const METRICS = {
  rows: 22,
  formats: ["text", "degrees"],
  hasHeader: true,
  rowFormats: METRIC_FORMATS,
} as const;

/** Correction, minimum, mean, maximum, both deviations and stability: as wide as their names need. */
const FIGURE_WIDTHS = [88, 84, 80, 88, 124, 132, 80];

function summarySheet(): SheetPlan {
  return new SheetDraft(
    "Survey",
    [
      { width: 184, format: "text" },
      { width: 92 },
      { width: 24 },
      { width: 160, format: "text" },
      { width: 92 },
      { width: 24 },
      { width: 128, format: "text", role: "result" },
      ...FIGURE_WIDTHS.map((width) => ({ width, format: "degrees", role: "result" }) as const),
      { width: 72, format: "share", role: "result" },
      { width: 72, format: "count", role: "result" },
      { width: 100, format: "text", role: "result" },
    ],
    6,
  )
    .title("Uniformity survey of furnace 3 at 900 °C")
    .notes(
      "A2",
      "INVENTED: Nonesuch Works, furnace 3; no such furnace and no such survey exist. The readings stand on the sheet Survey log.",
      "For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.",
      "Left: the whole survey, which a lost sensor leaves Incomplete. Middle: from the time in B11 on. Whether a shorter period may be reported is for your procedure to say.",
      "Deviations and spread in °C, drift in °C per hour, times as in the log, durations in minutes.",
      blankSafeNote,
    )
    .heading("A7", "What was asked for")
    .labels("A8", "Set point °C", "Tolerance ± °C", "Required minutes", "Shorter period from")
    .inputs("B8", [[SETPOINT], [10], [30]], ["count"])
    .inputs("B11", [[46_090 + (9 * 60 + 42) / 1440]], ["time"])
    .heading("D7", "In short")
    .labels("D8", "Verdict, whole survey", "Verdict from B11 on", "Class met", "Readings missing")
    .result("E8", "=B35", "general", "verdict")
    .result("E9", "=E35", "general", "verdict")
    .result("E10", "=B34", "count")
    .result("E11", "=B32", "count")
    .heading("A13", "Whole survey, °C")
    .table("A14", `=BEAD.SURVEY(${INPUTS},${NAMES},,,B10)`, METRICS)
    .heading("D13", "From B11 on, °C")
    .table("D14", `=BEAD.SURVEY(${INPUTS},${NAMES},B11,,B10)`, METRICS)
    .heading("G7", "Sensor by sensor, whole survey, °C")
    .table("G8", `=BEAD.SURVEYSENSORS(${INPUTS},${NAMES})`, {
      rows: 1 + SENSORS.length,
      formats: ["text", ...FIGURE_WIDTHS.map(() => "degrees" as const), "share", "count", "text"],
      hasHeader: true,
      verdicts: [10],
    })
    .heading("G20", "Furnace class by each figure alone (AMS2750 uniformity limits)")
    .labels("G21", "plus deviation", "minus deviation", "overshoot")
    .result("I21", "=BEAD.SURVEYCLASS(B21)", "count")
    .result("I22", "=BEAD.SURVEYCLASS(B22)", "count")
    .result("I23", "=BEAD.SURVEYCLASS(B28)", "count")
    .notes(
      "K21",
      "Both deviations alone meet a better class:",
      "the overshoot of S5, before the soak, sets it.",
    )
    .heading("G26", "Longest stretch with every sensor present and in band, °C")
    .table("G27", `=BEAD.SOAK(${INPUTS})`, {
      rows: 7,
      formats: ["text", "degrees"],
      hasHeader: true,
      rowFormats: { 1: "time", 2: "time", 3: "minutes", 4: "minutes", 6: "count" },
    })
    .plan();
}

function logSheet(): SheetPlan {
  return new SheetDraft(
    "Survey log",
    [
      { width: 152, format: "date-time" },
      ...SENSORS.map(() => ({ width: 68, format: "temperature" }) as const),
      { width: 24 },
      ...SENSORS.slice(0, 4).map(() => ({ width: 76, format: "degrees", role: "result" }) as const),
    ],
    TOP - 1,
  )
    .title("Log of the survey, °C")
    .notes(
      "A2",
      ...SURVEY_LOG_NOTES,
      "S7 was lost for three scans; the logger wrote “open”. S5 stands by the burner: 911.8 at 09:02, within ±10 only by its correction.",
    )
    .labels("A6", "correction °C")
    .inputs(
      "B6",
      [CORRECTIONS],
      SENSORS.map(() => "temperature"),
    )
    .headers("A7", [["time", "date-time"], ...SENSORS.map((name) => [name, "temperature"] as const)])
    .heading("L6", "Corrected, per scan, for a chart")
    .log(`A${TOP}`, { file: SURVEY_LOG_FILE, first: 1, rows: SURVEY_SCANS })
    .table("L7", `=BEAD.ENVELOPE(${READINGS.replaceAll("'Survey log'!", "")},B6:${LAST_COLUMN}6)`, {
      rows: 1 + SURVEY_SCANS,
      formats: ["degrees", "degrees", "degrees", "degrees"],
      hasHeader: true,
    })
    .plan();
}
