/**
 * As much of Excel as the pane asks for, with its discipline: a property is there only after `load` and `sync`, a
 * write happens at `sync`, and a refusal is an error with a code.
 */
import {
  addressOn,
  type Block,
  blockName,
  overlap,
  parseAddress,
  parseBlock,
} from "../../src/taskpane/workbook/address";

type Input = string | number | boolean;

export interface FakeCell {
  formula: Input;
  value: Input;
  format: string;
}

export class FakeSheet {
  readonly cells = new Map<string, FakeCell>();
  /** Anchor cell to the block that its results fill. */
  readonly spills = new Map<string, string>();
  isProtected = false;
  tables: string[] = [];
  merged: string[] = [];

  put(cell: string, formula: Input, value: Input = formula): this {
    this.cells.set(cell, { formula, value, format: "General" });
    return this;
  }
}

export class FakeExcel {
  readonly sheets = new Map<string, FakeSheet>([["Sheet1", new FakeSheet()]]);
  active = "Sheet1";
  selection = "Sheet1!A1";
  /** The code that the next sync fails with. */
  refusal: string | undefined;
  syncs = 0;
  /** The API versions that this Excel has. */
  version = 1.17;
  decimal = ".";
  startup: string | undefined;

  sheet(name = "Sheet1"): FakeSheet {
    return this.sheets.get(name)!;
  }

  install(): void {
    Object.assign(globalThis, {
      Excel: {
        run: async (work: (context: unknown) => Promise<unknown>) => work(this.#context()),
        PageOrientation: { landscape: "Landscape" },
      },
      Office: {
        HostType: { Excel: "Excel" },
        onReady: async () => ({ host: "Excel" }),
        context: { requirements: { isSetSupported: (_: string, version: string) => this.#has(version) } },
        StartupBehavior: { load: "Load" },
        addin: {
          setStartupBehavior: async (behavior: string) => {
            this.startup = behavior;
          },
        },
      },
    });
  }

  #has(version: string): boolean {
    return Number(version.split(".")[1]) <= Math.round((this.version - 1) * 100);
  }

  #context() {
    const queue: (() => void)[] = [];
    const context = {
      sync: async () => {
        this.syncs++;
        if (this.refusal) throw Object.assign(new Error("stack and all"), { code: this.refusal });
        for (const each of queue.splice(0)) each();
      },
      application: {
        cultureInfo: { numberFormat: loadable(queue, () => ({ numberDecimalSeparator: this.decimal })) },
      },
      workbook: {
        getSelectedRange: () => this.#range(queue, this.selection),
        worksheets: {
          getItem: (name: string) => this.#worksheet(queue, name),
          getActiveWorksheet: () => this.#worksheet(queue, this.active),
          add: (name: string) => {
            queue.push(() => this.sheets.set(name, this.sheets.get(name) ?? new FakeSheet()));
            this.sheets.set(name, new FakeSheet());
            return this.#worksheet(queue, name);
          },
        },
      },
    };
    Object.defineProperties(
      context.workbook.worksheets,
      Object.getOwnPropertyDescriptors(
        loadable(queue, () => ({ items: [...this.sheets.keys()].map((name) => ({ name })) })),
      ),
    );
    return context;
  }

  #worksheet(queue: (() => void)[], name: string) {
    return {
      getRange: (address: string) => this.#range(queue, addressOn(name, address)),
      getUsedRangeOrNullObject: () => this.#range(queue, this.#used(name)),
      protection: loadable(queue, () => ({ protected: this.sheet(name).isProtected })),
      freezePanes: { freezeRows() {} },
      pageLayout: {},
      activate: () => queue.push(() => (this.active = name)),
      delete: () => queue.push(() => this.sheets.delete(name)),
    };
  }

  #used(name: string): string | undefined {
    const all = [...this.sheet(name).cells]
      .filter(([, { value }]) => value !== "")
      .map(([cell]) => parseBlock(cell));
    if (all.length === 0) return undefined;
    const [row, column] = [
      Math.min(...all.map((each) => each.row)),
      Math.min(...all.map((each) => each.column)),
    ];
    const [lastRow, lastColumn] = [
      Math.max(...all.map((each) => each.row)),
      Math.max(...all.map((each) => each.column)),
    ];
    return addressOn(name, blockName({ row, column, lastRow, lastColumn }));
  }

  #range(queue: (() => void)[], address: string | undefined): object {
    if (address === undefined)
      return loadable(queue, () => ({ isNullObject: true, address: "", formulas: [] }));
    const { sheet: name = "", range = "A1" } = parseAddress(address);
    const sheet = () => this.sheet(name);
    const block = parseBlock(range);
    const grid = (pick: (cell: FakeCell | undefined) => Input) =>
      rowsOf(block).map((row) => row.map((cell) => pick(sheet().cells.get(cell))));
    const found = loadable(queue, () => ({
      isNullObject: false,
      address,
      values: sheet() ? grid((cell) => cell?.value ?? "") : [],
      formulas: sheet() ? grid((cell) => cell?.formula ?? "") : [],
      numberFormat: sheet() ? grid((cell) => cell?.format ?? "General") : [],
    }));
    const anchorOf = () => [...sheet().spills].find(([, filled]) => overlap(parseBlock(filled), block));
    const some = (list: string[]) => list.filter((each) => overlap(parseBlock(each), block));
    return Object.defineProperties(
      {
        worksheet: this.#worksheet(queue, name),
        format: { protection: loadable(queue, () => ({ locked: true })), font: {} },
        getEntireColumn: () => ({ format: { font: {} } }),
        getCell: (row: number, column: number) =>
          this.#range(queue, addressOn(name, rowsOf(block)[row]![column]!)),
        getSpillParentOrNullObject: () => this.#range(queue, anchorOf() && addressOn(name, anchorOf()![0])),
        getSpillingToRangeOrNullObject: () => {
          const filled = sheet().spills.get(range);
          return this.#range(queue, filled && addressOn(name, filled));
        },
        getTables: () => loadable(queue, () => ({ items: some(sheet().tables) })),
        getMergedAreasOrNullObject: () =>
          loadable(queue, () => ({ isNullObject: some(sheet().merged).length === 0, address: "" })),
        select: () => queue.push(() => (this.selection = address)),
      },
      {
        ...Object.getOwnPropertyDescriptors(found),
        formulas: written(found, "formulas", (rows) =>
          queue.push(() => this.#write(name, block, rows, "formula")),
        ),
        values: written(found, "values", (rows) =>
          queue.push(() => this.#write(name, block, rows, "formula")),
        ),
        numberFormat: written(found, "numberFormat", (rows) =>
          queue.push(() => this.#write(name, block, rows, "format")),
        ),
      },
    );
  }

  #write(name: string, block: Block, rows: unknown, what: "formula" | "format"): void {
    rowsOf(block).forEach((row, r) => {
      row.forEach((cell, c) => {
        const given = (Array.isArray(rows) ? rows[r]?.[c] : rows) as Input | null;
        if (given === null || given === undefined) return;
        const old = this.sheet(name).cells.get(cell) ?? { formula: "", value: "", format: "General" };
        const text = typeof given === "string" ? given.replace(/^'/, "") : given;
        const isFormula = typeof given === "string" && given.startsWith("=");
        if (what === "format") old.format = String(given);
        else Object.assign(old, { formula: text, value: isFormula ? 0 : text });
        this.sheet(name).cells.set(cell, old);
      });
    });
  }
}

const rowsOf = ({ row, column, lastRow, lastColumn }: Block): string[][] =>
  Array.from({ length: lastRow - row + 1 }, (_, r) =>
    Array.from({ length: lastColumn - column + 1 }, (_, c) =>
      blockName({ row: row + r, column: column + c, lastRow: row + r, lastColumn: column + c }),
    ),
  );

/** An object whose properties can be read only after they were loaded and the queue was worked off. */
function loadable<Properties extends object>(
  queue: (() => void)[],
  read: () => Properties,
): Properties & { load(): void } {
  let loaded: Properties | undefined;
  const object = {
    load() {
      queue.push(() => {
        loaded = read();
      });
    },
  };
  for (const name of Object.keys(read())) {
    Object.defineProperty(object, name, {
      enumerable: true,
      configurable: true,
      get() {
        if (loaded === undefined)
          throw Object.assign(new Error(`${name} was not loaded`), { code: "PropertyNotLoaded" });
        return loaded[name as keyof Properties];
      },
    });
  }
  return object as Properties & { load(): void };
}

const written = (found: object, name: string, set: (rows: unknown) => void): PropertyDescriptor => ({
  enumerable: true,
  configurable: true,
  get: () => (found as Record<string, unknown>)[name],
  set,
});
