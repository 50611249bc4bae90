import { make } from "../../taskpane/dom";
import type { ColumnKind, Log, LogCell } from "./read-log";

const kindNames: Record<ColumnKind, string> = {
  number: "number",
  "date-time": "date and time",
  time: "time of day",
  text: "text",
  empty: "empty",
};

const shownColumns = 12;

/** The first rows as they will arrive in the sheet: numbers to the right, what stays text marked as text. */
export function previewTable(log: Log): HTMLElement {
  const kinds = log.kinds.slice(0, shownColumns);
  const head = make("tr");
  kinds.forEach((kind, column) => {
    head.append(
      make(
        "th",
        { scope: "col", class: isText(kind) ? "" : "value" },
        log.header?.[column] ?? `Column ${column + 1}`,
        make("small", {}, kindNames[kind]),
      ),
    );
  });
  const body = make("tbody");
  for (const row of log.rows.slice(0, 8)) {
    const line = make("tr");
    kinds.forEach((kind, column) => {
      line.append(previewCell(row[column] ?? null, kind));
    });
    body.append(line);
  }
  return make("table", { class: "preview" }, make("thead", {}, head), body);
}

const isText = (kind: ColumnKind) => kind === "text" || kind === "empty";

function previewCell(value: LogCell, kind: ColumnKind): HTMLElement {
  if (value === null) return make("td", { class: "blank" });
  if (typeof value === "string") return make("td", kind === "text" ? {} : { class: "stray" }, value);
  if (kind === "date-time" || kind === "time") return make("td", { class: "value" }, asDateTime(value));
  return make("td", { class: "value" }, String(value));
}

/** The serial as the sheet will show it, to the second. */
function asDateTime(serial: number): string {
  const moment = new Date(Math.round((serial - 25_569) * 86_400) * 1000).toISOString();
  return serial < 1 ? moment.slice(11, 19) : `${moment.slice(0, 10)} ${moment.slice(11, 19)}`;
}
