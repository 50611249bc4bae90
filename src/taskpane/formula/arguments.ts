import type { CatalogueParameter } from "../../catalogue/catalogue";
import { blankSafe } from "../../sheets";
import { columnsOf, parseAddress, parseBlock, rowsOf } from "../workbook/address";
import { isOneArgument, parse } from "./syntax";

/** Kinds whose values are words: what is typed into their field is quoted. */
const WORDS: ReadonlySet<string> = new Set(["option", "thermocouple type", "lead", "cable", "text"]);

/** What a field holds as it stands in a formula. */
export function argumentText(field: string, parameter: CatalogueParameter, keepBlanks: boolean): string {
  const text = field.trim().replace(/^=/, "");
  if (text === "") return "";
  const read = parse(text);
  if (read.kind === "range") return keepBlanks && isManyCells(text) ? blankSafe(text) : text;
  if (read.kind === "other" && WORDS.has(parameter.kind)) return `"${text.replaceAll('"', '""')}"`;
  return text;
}

const KEPT = /^IF\(ISBLANK\(([^()]+)\),"",\1\)$/i;

/** An argument of a formula as its field shows it. */
export function fieldOf(
  argument: string,
  parameter: CatalogueParameter,
): { text: string; blankSafe: boolean } {
  const kept = KEPT.exec(argument.replaceAll(" ", ""));
  if (kept) {
    const range = KEPT.exec(argument)?.[1] ?? kept[1]!;
    return { text: range, blankSafe: true };
  }
  const read = parse(argument);
  if (read.kind === "constant" && typeof read.value === "string" && WORDS.has(parameter.kind)) {
    return { text: read.value, blankSafe: false };
  }
  return { text: argument, blankSafe: false };
}

/** What keeps a field from being an argument, in a sentence. */
export function fieldFault(field: string, parameter: CatalogueParameter): string | undefined {
  const text = field.trim();
  if (text === "") return parameter.optional ? undefined : "Needed.";
  if (/^[-+]?\d+,\d+$/.test(text) && !WORDS.has(parameter.kind)) {
    return `Write numbers with a point here: ${text.replace(",", ".")}.`;
  }
  return isOneArgument(text) || WORDS.has(parameter.kind)
    ? undefined
    : "A bracket or a quote is open, or a comma stands too many.";
}

export function isManyCells(address: string): boolean {
  const block = parseBlock(parseAddress(address).range);
  return rowsOf(block) * columnsOf(block) > 1;
}

/** The formula of a call; arguments left out at the end are dropped with their commas. */
export function callText(namespace: string, id: string, given: readonly string[]): string {
  let last = given.length;
  while (last > 0 && given[last - 1] === "") last--;
  return `${namespace}.${id}(${given.slice(0, last).join(",")})`;
}
