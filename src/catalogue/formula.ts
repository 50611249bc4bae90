/**
 * Reads the formulas of documented examples: one call of one function with constants
 * for arguments. Enough to run an example without a spreadsheet, and no more: cell
 * references and nested calls are for the sheet's own engine.
 */
export type Constant = number | string | boolean;

export interface ExampleCall {
  readonly id: string;
  /** Each argument as the matrix that a function is handed; null where it is left out. */
  readonly given: readonly (Constant[][] | null)[];
}

/** Numbers, texts with doubled quotes, names, and the marks between them. */
const TOKEN =
  /\s*(?:(-?\d+(?:\.\d+)?(?:[eE][+-]?\d+)?)|"((?:[^"]|"")*)"|(TRUE|FALSE)|([{};,()])|(=[A-Z]+\.[A-Z0-9]+))/y;

type Token = { readonly constant: Constant } | { readonly mark: string } | { readonly name: string };

function tokens(formula: string): Token[] {
  const found: Token[] = [];
  const pattern = new RegExp(TOKEN);
  while (pattern.lastIndex < formula.trimEnd().length) {
    const at = pattern.lastIndex;
    const match = pattern.exec(formula);
    if (match === null) throw new Error(`cannot read "${formula.slice(at)}" in ${formula}`);
    const [, number, text, truth, mark, name] = match;
    if (number !== undefined) found.push({ constant: Number(number) });
    else if (text !== undefined) found.push({ constant: text.replaceAll('""', '"') });
    else if (truth !== undefined) found.push({ constant: truth === "TRUE" });
    else if (name !== undefined) found.push({ name: name.slice(name.indexOf(".") + 1) });
    else found.push({ mark: mark as string });
  }
  return found;
}

/** Takes tokens one by one from the front. */
class Reader {
  private at = 0;
  constructor(private readonly all: readonly Token[]) {}

  peek(mark: string): boolean {
    const token = this.all[this.at];
    return token !== undefined && "mark" in token && token.mark === mark;
  }

  take(mark: string): boolean {
    if (!this.peek(mark)) return false;
    this.at++;
    return true;
  }

  need(mark: string): void {
    if (!this.take(mark)) throw new Error(`"${mark}" expected`);
  }

  constant(): Constant {
    const token = this.all[this.at++];
    if (token === undefined || !("constant" in token)) throw new Error("a constant expected");
    return token.constant;
  }

  name(): string {
    const token = this.all[this.at++];
    if (token === undefined || !("name" in token)) throw new Error("a function expected");
    return token.name;
  }

  end(): void {
    if (this.at < this.all.length) throw new Error("more than one call");
  }
}

function matrix(reader: Reader): Constant[][] {
  if (!reader.take("{")) return [[reader.constant()]];
  const rows: Constant[][] = [[]];
  for (;;) {
    (rows[rows.length - 1] as Constant[]).push(reader.constant());
    if (reader.take("}")) return rows;
    if (reader.take(";")) rows.push([]);
    else reader.need(",");
  }
}

/** `=BEAD.EMF({100;200},"K",,"F")` as a call. */
export function parseExample(formula: string): ExampleCall {
  const reader = new Reader(tokens(formula));
  const id = reader.name();
  reader.need("(");
  const given: (Constant[][] | null)[] = [];
  if (!reader.take(")")) {
    for (;;) {
      given.push(reader.peek(",") || reader.peek(")") ? null : matrix(reader));
      if (reader.take(")")) break;
      reader.need(",");
    }
  }
  reader.end();
  return { id, given };
}

/** What an example prints as its result. */
export interface PrintedResult {
  readonly rows: readonly (readonly PrintedCell[])[];
  /** Ended by "…": the function gives more rows than are printed. */
  readonly more: boolean;
}

export interface PrintedCell {
  readonly value: Constant;
  /** Digits after the point, to which a number is printed. */
  readonly decimals: number;
}

/** A printed result: `99.974`, `"text"`, `{1,2;3,4}`, or `{"first";…}` where more rows follow. */
export function parseResult(result: string): PrintedResult {
  const more = result.endsWith(";…}");
  const printed = more ? `${result.slice(0, -3)}}` : result;
  const reader = new Reader(tokens(printed));
  const values = matrix(reader);
  reader.end();
  const digits = [...printed.matchAll(NUMBER)].map(([, fraction]) => fraction?.length ?? 0);
  let next = 0;
  const rows = values.map((row) =>
    row.map((value) => ({ value, decimals: typeof value === "number" ? (digits[next++] ?? 0) : 0 })),
  );
  return { rows, more };
}

/** Numbers outside quotes; the group holds the digits after the point. */
const NUMBER = /(?<!["\w.])-?\d+(?:\.(\d+))?(?=[,;}]|$)/g;
