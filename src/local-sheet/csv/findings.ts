import { make } from "../../taskpane/dom";
import { type Log, maxColumns, maxRows } from "./read-log";
import { rowsThatFit } from "./to-sheet";
import { count, counted } from "./words";

/** Why a log cannot be opened as it is read now; undefined where it can. */
export function refusalOf(log: Log): string | undefined {
  if (log.rows.length === 0) return "There are no rows of readings.";
  if (log.kinds.length <= maxColumns) return undefined;
  return `${count(log.kinds.length)} columns are more than a sheet holds (${count(maxColumns)}).`;
}

/** In sentences, what was found and what will not arrive; nothing is left out in silence. */
export function findings(log: Log, characters: string): HTMLElement {
  const list = make("ul", { class: "findings" });
  const say = (text: string) => list.append(make("li", {}, text));
  const warn = (text: string) => list.append(make("li", { class: "warn" }, text));
  const refusal = refusalOf(log);
  if (refusal) warn(refusal);
  say(
    `${counted(log.rows.length, "row")}, ${counted(log.kinds.length, "column")}, characters ${characters}.`,
  );
  const cut = log.rows.length - rowsThatFit(log);
  if (cut > 0) {
    warn(
      `A sheet holds ${count(maxRows)} rows: the last ${counted(cut, "row")} of the file would stay out. Split it.`,
    );
  }
  if (log.kinds.length === 1) warn("Only one column was found. Is the column separator right?");
  if (log.leftAsText > 0) warn(`${counted(log.leftAsText, "field")} among numbers or times will stay text.`);
  for (const fault of log.faults.slice(0, 3)) warn(`Fault in the file, ${fault}.`);
  if (log.faults.length > 3) warn(`${counted(log.faults.length - 3, "more fault")} of this kind.`);
  if (log.notes.length > 0)
    say(`${counted(log.notes.length, "line")} of remarks above the table will be kept.`);
  return list;
}
