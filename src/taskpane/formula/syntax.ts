/**
 * As much of a formula's grammar as the pane needs: constants, arrays, ranges, calls. Anything else is `other`: it
 * may stand in an argument, but only the sheet can calculate it.
 */
export type Constant = number | string | boolean;

export type Expression =
  | { readonly kind: "constant"; readonly value: Constant }
  | { readonly kind: "array"; readonly rows: Constant[][] }
  | { readonly kind: "range"; readonly address: string }
  | { readonly kind: "call"; readonly name: string; readonly given: readonly (Expression | null)[] }
  | { readonly kind: "other" };

const NUMBER = /^[-+]?(?:\d+\.?\d*|\.\d+)(?:E[-+]?\d+)?$/i;
const TEXT = /^"(?:[^"]|"")*"$/;
const CELL = String.raw`\$?[A-Z]{1,3}\$?[1-9]\d*`;
const RANGE = new RegExp(
  String.raw`^(?:(?:'(?:[^']|'')+'|[\p{L}_][\p{L}\p{N}_.]*)!)?(?:${CELL}(?::${CELL})?|\$?[A-Z]{1,3}:\$?[A-Z]{1,3})$`,
  "iu",
);
const CALL = /^([A-Z_][A-Z0-9._]*)\(([\s\S]*)\)$/i;

const other: Expression = { kind: "other" };

export function parse(text: string): Expression {
  const trimmed = text.trim();
  const constant = parseConstant(trimmed);
  if (constant !== undefined) return { kind: "constant", value: constant };
  if (RANGE.test(trimmed)) return { kind: "range", address: trimmed };
  if (trimmed.startsWith("{") && trimmed.endsWith("}")) return parseArray(trimmed.slice(1, -1));
  const call = CALL.exec(trimmed);
  // The bracket that closes the call must be the last one: `F(1)+G(2)` is no call.
  if (!call || closingBracket(trimmed, call[1]!.length) !== trimmed.length - 1) return other;
  const inside = call[2]!;
  const given =
    inside.trim() === "" ? [] : split(inside, ",").map((each) => (each.trim() === "" ? null : parse(each)));
  return { kind: "call", name: call[1]!.toUpperCase(), given };
}

function parseConstant(text: string): Constant | undefined {
  if (NUMBER.test(text)) return Number(text);
  if (TEXT.test(text)) return text.slice(1, -1).replaceAll('""', '"');
  return /^(TRUE|FALSE)$/i.test(text) ? text.toUpperCase() === "TRUE" : undefined;
}

function parseArray(inside: string): Expression {
  const rows: Constant[][] = [];
  for (const row of split(inside, ";")) {
    const values = split(row, ",").map((each) => parseConstant(each.trim()));
    if (values.some((value) => value === undefined)) return other;
    rows.push(values as Constant[]);
  }
  return { kind: "array", rows };
}

/** Splits at a mark that stands outside quotes and brackets. */
export function split(text: string, mark: string): string[] {
  const parts: string[] = [];
  let start = 0;
  for (const { at, depth } of outsideQuotes(text)) {
    if (depth === 0 && text[at] === mark) {
      parts.push(text.slice(start, at));
      start = at + 1;
    }
  }
  return [...parts, text.slice(start)];
}

/** Each character outside quotes, with the number of brackets that are open around it. */
function* outsideQuotes(text: string): Generator<{ at: number; depth: number }> {
  let quote = "";
  let depth = 0;
  for (let at = 0; at < text.length; at++) {
    const character = text[at]!;
    if (quote !== "") {
      if (character === quote) quote = "";
    } else if (character === '"' || character === "'") quote = character;
    else {
      if (")}]".includes(character)) depth--;
      yield { at, depth };
      if ("({[".includes(character)) depth++;
    }
  }
}

function closingBracket(text: string, opening: number): number {
  for (const { at, depth } of outsideQuotes(text)) if (at > opening && depth === 0) return at;
  return -1;
}

/** Whether quotes and brackets close, and no comma stands outside them: else a text would not stay one argument. */
export function isOneArgument(text: string): boolean {
  let depth = 0;
  for (const { at, depth: before } of outsideQuotes(text)) {
    if (before < 0 || (before === 0 && (text[at] === "," || text[at] === ";"))) return false;
    depth = before + ("({[".includes(text[at]!) ? 1 : 0);
  }
  return depth <= 0 && (text.match(/"/g) ?? []).length % 2 === 0;
}

/** A call of one of our functions inside a formula, with what stands around it. */
export interface FoundCall {
  readonly before: string;
  readonly id: string;
  /** As written; "" where an argument is left out. */
  readonly given: readonly string[];
  readonly after: string;
}

/** The first call of a function of the namespace in a formula. */
export function findCall(formula: string, namespace: string): FoundCall | undefined {
  const start = `${namespace}.`;
  for (const { at } of outsideQuotes(formula)) {
    if (!formula.startsWith(start, at) || /[A-Z0-9._]/i.test(formula[at - 1] ?? "")) continue;
    const name = /^[A-Z0-9_]+(?=\()/i.exec(formula.slice(at + start.length))?.[0];
    if (name === undefined) continue;
    const opening = at + start.length + name.length;
    const closing = closingBracket(formula.slice(at), opening - at) + at;
    if (closing < opening) return undefined;
    const inside = formula.slice(opening + 1, closing);
    const given = inside.trim() === "" ? [] : split(inside, ",").map((each) => each.trim());
    return {
      before: formula.slice(0, at),
      id: name.toUpperCase(),
      given,
      after: formula.slice(closing + 1),
    };
  }
  return undefined;
}
