import { blankSafe, blankSafeNote } from "../blank-safe";
import { SheetDraft } from "../draft";
import { EXAMPLE_LINE, type Job } from "./job";

const ROWS = 500;
const SENSORS = ["S1", "S2", "S3", "S4", "S5"];
const [top, bottom] = [14, 13 + ROWS];
const range = (first: string, last = first) => blankSafe(`${first}${top}:${last}${bottom}`);

/** A chamber that comes up to 180 °C and stays there, a scan every two minutes. */
const READINGS = Array.from({ length: 45 }, (_, scan) => [
  46_084.3125 + scan / 720,
  ...SENSORS.map((_, sensor) => {
    const lag = 5 + 0.4 * sensor;
    const settled = 180 + 0.8 * (sensor - 2) + 0.4 * Math.sin(scan / 3 + sensor);
    return Math.round(10 * (settled - 155 * Math.exp(-scan / lag))) / 10;
  }),
]);

/** Of the table by sensor from its minimum on: as wide as their names need. */
const FIGURE_WIDTHS = [88, 80, 88, 124, 132, 88, 72, 76, 100];

const METRICS = [
  ["Verdict", "verdict", "general"],
  ["Survey from", "start", "date-time"],
  ["to", "end", "date-time"],
  ["Minutes", "minutes", "minutes"],
  ["Largest deviation above °C", "plus_deviation", "degrees"],
  ["Largest deviation below °C", "minus_deviation", "degrees"],
  ["Greatest spread in one scan °C", "spread", "degrees"],
  ["Hottest sensor", "hottest_sensor", "general"],
  ["Coldest sensor", "coldest_sensor", "general"],
  ["Margin to the nearer limit °C", "margin", "degrees"],
] as const;

const survey = (metric: string) =>
  `=BEAD.SURVEY(${range("A")},${range("B", "F")},B6,B7,B9:F9,B12:F12,,,B8,,,"${metric}")`;

/** Soak and uniformity of a furnace, an oven or a chamber. */
export const surveySummary: Job = {
  name: "Survey summary",
  sentence: "Soak, uniformity and a verdict from the log of a furnace, oven or chamber, sensor by sensor.",
  examples: ["A2", `A${top}:F${bottom}`],
  sheet: (() => {
    const draft = new SheetDraft(
      "Survey",
      [
        { width: 152, format: "date-time" },
        ...SENSORS.map(() => ({ width: 60, format: "temperature" }) as const),
        { width: 16 },
        { width: 224, format: "text", role: "result" },
        { width: 152, format: "degrees", role: "result" },
        ...FIGURE_WIDTHS.map((width) => ({ width, format: "degrees", role: "result" }) as const),
      ],
      13,
    )
      .title("Survey summary")
      .notes(
        "A2",
        EXAMPLE_LINE,
        `Times and readings below row 13, up to row ${bottom}; a sensor's correction (true − reading) into row 9.`,
        `A Pass says what the log shows and releases no furnace or load by itself. ${blankSafeNote}`,
      )
      .labels("A6", "Set point °C", "Tolerance ± °C", "Required minutes", "Correction °C")
      .inputs("B6", [[180]], ["temperature"])
      .inputs("B7", [[5]], ["temperature"])
      .inputs("B8", [[30]], ["count"])
      .inputs(
        "B9",
        [SENSORS.map(() => 0)],
        SENSORS.map(() => "degrees" as const),
      )
      .labels("A12", "Sensor")
      .inputs(
        "B12",
        [SENSORS],
        SENSORS.map(() => "text" as const),
      )
      .headers("A13", [
        ["time", "date-time"],
        ...SENSORS.map((name) => [`${name} °C`, "temperature"] as const),
      ])
      .inputs(`A${top}`, READINGS, ["date-time", ...SENSORS.map(() => "temperature" as const)])
      .heading("H6", "Summary")
      .labels("H7", ...METRICS.map(([label]) => label));
    METRICS.forEach(([, metric, format], row) => {
      draft.result(`I${7 + row}`, survey(metric), format, metric === "verdict" ? "verdict" : "result");
    });
    return draft
      .heading("H19", "Sensor by sensor, from one formula in H20")
      .table("H20", `=BEAD.SURVEYSENSORS(${range("A")},${range("B", "F")},B6,B7,B9:F9,B12:F12)`, {
        rows: 1 + SENSORS.length,
        formats: [
          "text",
          "degrees",
          "degrees",
          "degrees",
          "degrees",
          "degrees",
          "degrees",
          "degrees",
          "share",
          "count",
          "text",
        ],
        hasHeader: true,
        verdicts: [10],
      })
      .plan();
  })(),
};
