/** The order in which a log writes its dates; "none" leaves them as text. */
export type DateOrder = "ymd" | "dmy" | "mdy" | "none";

const date = /^(\d{1,4})([-/.])(\d{1,2})\2(\d{1,4})/;
const time = /^(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,](\d{1,6}))?)?$/;

/**
 * A date, a time of day, or both as a date-time serial: days since 1899-12-30, so that 61 is 1900-03-01. Undefined
 * where the text is no such date. Earlier dates stay text: spreadsheets count a 29 February 1900 that never was.
 * A text with a time zone stays text as well: dropping the zone would shift the log unseen.
 */
export function readDateTime(field: string, order: DateOrder): number | undefined {
  if (order === "none") return undefined;
  const text = field.trim();
  const found = date.exec(text);
  if (!found) return readTime(text);
  const day = readDate(found, order);
  if (day === undefined) return undefined;
  const rest = text.slice(found[0].length);
  if (rest === "") return day;
  if (!/^[T ]/.test(rest)) return undefined;
  const fraction = readTime(rest.slice(1).trim());
  return fraction === undefined ? undefined : day + fraction;
}

function readDate(found: RegExpExecArray, order: Exclude<DateOrder, "none">): number | undefined {
  const parts = [found[1]!, found[3]!, found[4]!];
  const [year, month, day] = [order.indexOf("y"), order.indexOf("m"), order.indexOf("d")].map(
    (i) => parts[i]!,
  );
  if (year!.length !== 4 || month!.length > 2 || day!.length > 2) return undefined;
  const moment = new Date(Date.UTC(Number(year), Number(month) - 1, Number(day)));
  if (moment.getUTCMonth() !== Number(month) - 1 || moment.getUTCDate() !== Number(day)) return undefined;
  const serial = moment.getTime() / 86_400_000 + 25_569;
  return serial >= 61 ? serial : undefined;
}

function readTime(text: string): number | undefined {
  const found = time.exec(text);
  if (!found) return undefined;
  const [hour, minute, second] = [found[1], found[2], found[3] ?? "0"].map(Number);
  if (hour! > 23 || minute! > 59 || second! > 59) return undefined;
  return (hour! * 3600 + minute! * 60 + Number(`${second}.${found[4] ?? "0"}`)) / 86_400;
}

/**
 * The order that fits every date of the sample. Where day and month could both be meant, the day comes first, and
 * the dialog shows the choice.
 */
export function sniffDateOrder(fields: string[]): DateOrder {
  const dates = fields.filter((field) => date.test(field.trim()));
  if (dates.length === 0)
    return fields.some((field) => readTime(field.trim()) !== undefined) ? "ymd" : "none";
  const orders: DateOrder[] = ["ymd", "dmy", "mdy"];
  const fits = (order: DateOrder) => dates.filter((field) => readDateTime(field, order) !== undefined).length;
  const best = orders.reduce((winner, order) => (fits(order) > fits(winner) ? order : winner));
  return fits(best) > 0 ? best : "none";
}
