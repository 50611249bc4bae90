// Sample 1: the furnace log with its temperatures beside it, the job that all of this is for.

import { blankSafe, SheetDraft, type WorkbookPlan } from "../../sheets";
import { SCANS } from "./furnace";
import { CHANNEL_COUNT, LOG_NOTES } from "./furnace-log";

const channels = Array.from({ length: CHANNEL_COUNT }, (_, i) => `CH${i + 1}`);
const [first, last] = [8, 7 + SCANS];

export function furnaceLogWorkbook(): WorkbookPlan {
  const sheet = new SheetDraft(
    "Furnace log",
    [
      { width: 152, format: "date-time" },
      ...channels.map(() => ({ width: 76, format: "mV" }) as const),
      { width: 108, format: "temperature" },
      { width: 16 },
      ...channels.map(() => ({ width: 80, format: "degrees", role: "result" }) as const),
    ],
    first - 1,
  )
    .title("Furnace log of an invented works")
    .notes(
      "A2",
      ...LOG_NOTES,
      'H8: one formula gives all temperatures. IF(ISBLANK(r),"",r) is for Excel, which hands empty cells over as 0, a reading like any other.',
    )
    .headers("A7", [
      ["time", "date-time"],
      ...channels.map((name) => [`${name} mV`, "mV"] as const),
      ["terminal °C", "temperature"],
    ])
    .headers(
      "H7",
      channels.map((name) => [`${name} °C`, "degrees"] as const),
    )
    .log(`A${first}`, { file: "furnace-log.csv", first: 1, rows: SCANS })
    .spill(
      `H${first}`,
      `=BEAD.TEMPERATURE(${blankSafe(`B${first}:E${last}`)},"K",${blankSafe(`F${first}:F${last}`)})`,
      SCANS,
      channels.length,
    );
  return {
    name: "Furnace log",
    sentence:
      "2 000 scans of four type K couples in mV, turned into temperatures by one formula, with the faults that real logs have.",
    invented: true,
    sheets: [sheet.plan()],
  };
}
