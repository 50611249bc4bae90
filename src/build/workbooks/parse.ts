// Reads the formulas of the sample workbooks into trees. Of the spreadsheet's grammar it knows what the samples use,
// and refuses everything else instead of guessing.

import { parseCell } from "../../sheets";

export interface Area {
  /** Undefined for the formula's own sheet. */
  sheet: string | undefined;
  top: number;
  left: number;
  rows: number;
  columns: number;
}

export type Expression =
  | { kind: "value"; value: number | string | boolean }
  | { kind: "array"; rows: (number | string)[][] }
  | { kind: "area"; area: Area }
  | { kind: "negative"; of: Expression }
  | { kind: "operation"; sign: string; left: Expression; right: Expression }
  | { kind: "call"; name: string; given: (Expression | undefined)[] };

const pattern =
  /\s*(?:(?<text>"(?:[^"]|"")*")|(?<area>(?:(?:'(?:[^']|'')+'|[A-Za-z_]\w*)!)?\$?[A-Z]{1,3}\$?\d+(?::\$?[A-Z]{1,3}\$?\d+)?(?![\w.(]))|(?<name>[A-Z][A-Z0-9.]*)|(?<number>\d+\.?\d*(?:E[+-]?\d+)?)|(?<sign><=|>=|<>|[-+*/^&=<>(),{};%]))/y;

/** From the loosest to the tightest. */
const levels = [["=", "<>", "<", ">", "<=", ">="], ["&"], ["+", "-"], ["*", "/"], ["^"]];

export function parse(formula: string): Expression {
  return new Reader(formula).whole();
}

class Reader {
  readonly #formula: string;
  readonly #words: { kind: string; word: string }[] = [];
  #at = 0;

  constructor(formula: string) {
    this.#formula = formula;
    pattern.lastIndex = 1;
    while (pattern.lastIndex < formula.length) {
      const found = pattern.exec(formula);
      if (!found?.groups) throw this.#unknown();
      const [kind, word] = Object.entries(found.groups).find(([, each]) => each !== undefined)!;
      this.#words.push({ kind, word: word! });
    }
  }

  whole(): Expression {
    const read = this.#operation(0);
    if (this.#at < this.#words.length) throw this.#unknown();
    return read;
  }

  #operation(level: number): Expression {
    const signs = levels[level];
    if (!signs) return this.#single();
    let left = this.#operation(level + 1);
    for (let sign = this.#peek(); sign && signs.includes(sign); sign = this.#peek()) {
      this.#at++;
      left = { kind: "operation", sign, left, right: this.#operation(level + 1) };
    }
    return left;
  }

  #single(): Expression {
    const next = this.#words[this.#at++];
    if (!next) throw this.#unknown();
    const { kind, word } = next;
    if (kind === "text") return { kind: "value", value: unquoted(word, '"') };
    if (kind === "number") return { kind: "value", value: Number(word) };
    if (kind === "area") return { kind: "area", area: readArea(word) };
    if (kind === "name" && this.#peek() === "(") return { kind: "call", name: word, given: this.#given() };
    if (word === "TRUE" || word === "FALSE") return { kind: "value", value: word === "TRUE" };
    if (word === "-") return { kind: "negative", of: this.#single() };
    if (word === "{") return { kind: "array", rows: this.#array() };
    if (word !== "(") throw this.#unknown();
    const inner = this.#operation(0);
    this.#expect(")");
    return inner;
  }

  #given(): (Expression | undefined)[] {
    this.#expect("(");
    if (this.#peek() === ")") {
      this.#at++;
      return [];
    }
    const given: (Expression | undefined)[] = [];
    do given.push([",", ")"].includes(this.#peek() ?? "") ? undefined : this.#operation(0));
    while (this.#words[this.#at++]?.word === ",");
    if (this.#words[this.#at - 1]?.word !== ")") throw this.#unknown();
    return given;
  }

  #array(): (number | string)[][] {
    const rows: (number | string)[][] = [[]];
    for (;;) {
      const item = this.#single();
      const negative =
        item.kind === "negative" && item.of.kind === "value" ? -Number(item.of.value) : undefined;
      if (item.kind === "value" && typeof item.value !== "boolean") rows.at(-1)!.push(item.value);
      else if (negative !== undefined) rows.at(-1)!.push(negative);
      else throw this.#unknown();
      const after = this.#words[this.#at++]?.word;
      if (after === ";") rows.push([]);
      else if (after === "}") return rows;
      else if (after !== ",") throw this.#unknown();
    }
  }

  #peek(): string | undefined {
    const next = this.#words[this.#at];
    return next?.kind === "sign" ? next.word : undefined;
  }

  #expect(sign: string): void {
    if (this.#words[this.#at++]?.word !== sign) throw this.#unknown();
  }

  #unknown(): Error {
    return new Error(`The samples' reader of formulas cannot read ${this.#formula}`);
  }
}

const unquoted = (word: string, quote: string): string => word.slice(1, -1).replaceAll(quote + quote, quote);

function readArea(word: string): Area {
  const at = word.lastIndexOf("!");
  const written = at < 0 ? undefined : word.slice(0, at);
  const [first, last] = word.slice(at + 1).split(":");
  const from = parseCell(first!);
  const to = parseCell(last ?? first!);
  return {
    sheet: written?.startsWith("'") ? unquoted(written, "'") : written,
    top: from.row,
    left: from.column,
    rows: to.row - from.row + 1,
    columns: to.column - from.column + 1,
  };
}
