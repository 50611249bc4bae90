// Sample 5: a steriliser load with the F value of each probe.

import {
  blankSafe,
  blankSafeNote,
  columnName,
  SheetDraft,
  type SheetPlan,
  type WorkbookPlan,
} from "../../sheets";
import { LOAD_LOG_FILE, LOAD_LOG_NOTES, LOAD_SCANS } from "./steriliser-load";

export function steriliserWorkbook(): WorkbookPlan {
  return {
    name: "Steriliser load",
    sentence:
      "Six probes in a load: the F value of each, the minutes at temperature, and what six silent scans of one probe cost.",
    invented: true,
    sheets: [valuesSheet(), logSheet()],
  };
}

const PROBES = Array.from({ length: 6 }, (_, i) => `P${i + 1}`);
const LAST_COLUMN = columnName(PROBES.length);
const TOP = 6;
const BOTTOM = TOP + LOAD_SCANS - 1;
const onLog = (range: string) => blankSafe(`'Load log'!${range}`);
const TIMES = onLog(`A${TOP}:A${BOTTOM}`);
const READINGS = onLog(`B${TOP}:${LAST_COLUMN}${BOTTOM}`);

function valuesSheet(): SheetPlan {
  const across = (format: "minutes" | "text") => ({ rows: 1, formats: PROBES.map(() => format) });
  return new SheetDraft(
    "F values",
    [{ width: 360, format: "text" }, ...PROBES.map(() => ({ width: 84 }) as const)],
    6,
  )
    .title("F values of a steriliser load")
    .notes(
      "A2",
      "INVENTED: Nonesuch Works, steriliser 1; no such load exists. The readings stand on the sheet Load log.",
      "For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.",
      "For F0, reference temperatures of 121, 121.1 and 121.11 °C are all in print: take that of your protocol.",
      blankSafeNote,
    )
    .heading("A7", "What the protocol says (invented)")
    .labels(
      "A8",
      "Reference temperature °C",
      "z °C",
      "Readings below this add nothing °C",
      "F asked for, minutes",
    )
    .inputs("B8", [[121.1], [10], [100]], ["temperature"])
    .inputs("B11", [[18]], ["minutes"])
    .headers("A13", [["probe", "text"], ...PROBES.map((name) => [name, "minutes"] as const)])
    .labels(
      "A14",
      "F value, minutes",
      "Minutes at or above the reference temperature",
      "Minutes with readings missing: they add nothing",
      "F reaches what is asked for",
    )
    .table("B14", `=BEAD.LETHALITY(${TIMES},${READINGS},B8,B9,B10)`, across("minutes"))
    .table("B15", `=BEAD.TIMEABOVE(${TIMES},${READINGS},B8)`, across("minutes"))
    .table("B16", `=BEAD.LETHALITY(${TIMES},${READINGS},B8,B9,B10,,,,"missing_minutes")`, across("minutes"))
    .table("B17", `=IF(B14:${LAST_COLUMN}14>=B11,"yes","no")`, {
      rows: 1,
      formats: PROBES.map(() => "general" as const),
      verdicts: PROBES.map((_, i) => i),
    })
    .labels("A19", "Least F of the load, minutes", "Probe with the least F")
    .result("B19", `=MIN(B14:${LAST_COLUMN}14)`, "minutes")
    .result("B20", `=INDEX(B13:${LAST_COLUMN}13,1,MATCH(B19,B14:${LAST_COLUMN}14,0))`, "general", "verdict")
    .notes(
      "A22",
      "P4 lies deepest in the pack: it follows last and gathers least. The load is no better than its slowest place.",
      "P5 was silent for six scans of the hold. The time is left out, never guessed: its F value is a lower bound.",
    )
    .plan();
}

function logSheet(): SheetPlan {
  return new SheetDraft(
    "Load log",
    [
      { width: 152, format: "date-time" },
      ...PROBES.map(() => ({ width: 72, format: "temperature" }) as const),
      { width: 24 },
      ...PROBES.map(() => ({ width: 84, format: "minutes", role: "result" }) as const),
    ],
    TOP - 1,
  )
    .title("Log of the load")
    .notes("A2", ...LOAD_LOG_NOTES)
    .headers("A5", [["time", "date-time"], ...PROBES.map((name) => [`${name} °C`, "temperature"] as const)])
    .heading("I4", "F up to each scan, from one formula in I6")
    .headers(
      "I5",
      PROBES.map((name) => [`${name} F min`, "minutes"] as const),
    )
    .log(`A${TOP}`, { file: LOAD_LOG_FILE, first: 1, rows: LOAD_SCANS })
    .spill(
      `I${TOP}`,
      `=BEAD.LETHALITY(${[TIMES, READINGS].map((range) => range.replaceAll("'Load log'!", "")).join(",")},'F values'!B8,'F values'!B9,'F values'!B10,,,,"running")`,
      LOAD_SCANS,
      PROBES.length,
    )
    .plan();
}
