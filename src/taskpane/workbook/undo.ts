import type { Workbook, Writing } from "./workbook";

/** One thing that the pane wrote, and how to take it back. */
export interface Step {
  /** "Inserted the formula in H8" */
  readonly sentence: string;
  readonly takeBack: () => Promise<void>;
}

/** The pane's own way back: the spreadsheet's does not promise to undo what an add-in wrote. */
export class History {
  readonly #steps: Step[] = [];
  readonly #listeners: (() => void)[] = [];

  onChange(listener: () => void): void {
    this.#listeners.push(listener);
  }

  get last(): Step | undefined {
    return this.#steps.at(-1);
  }

  add(step: Step): void {
    this.#steps.push(step);
    this.#tell();
  }

  /** A step that cannot be taken back now stays, so that it can be tried again. */
  async takeBack(): Promise<Step | undefined> {
    const step = this.#steps.at(-1);
    if (!step) return undefined;
    await step.takeBack();
    this.#steps.splice(this.#steps.indexOf(step), 1);
    this.#tell();
    return step;
  }

  /** What was written into a workbook that is closed cannot be taken back from another. */
  clear(): void {
    this.#steps.length = 0;
    this.#tell();
  }

  #tell(): void {
    for (const listener of this.#listeners) listener();
  }
}

/** Writes, and notes what stood there before. */
export async function writeWithWayBack(
  workbook: Workbook,
  history: History,
  sentence: string,
  writings: readonly Writing[],
): Promise<void> {
  const before = await Promise.all(writings.map(({ range }) => workbook.getContents(range)));
  await workbook.write(writings);
  history.add({
    sentence,
    takeBack: async () => {
      // Results that spilled go first, so that none lies over a cell that is put back.
      await workbook.write(
        writings.flatMap(({ range, inputs }) => (inputs ? [{ range, inputs: emptied(inputs) }] : [])),
      );
      await workbook.write(
        writings.map(({ range, inputs }, index) => {
          const { inputs: old, formats } = before[index]!;
          return inputs ? { range, inputs: old, formats } : { range, formats };
        }),
      );
    },
  });
}

const emptied = (inputs: NonNullable<Writing["inputs"]>): string[][] =>
  inputs.map((row) => row.map(() => ""));
