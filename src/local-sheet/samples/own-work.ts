import { IUndoRedoService } from "@univerjs/core";
import type { Grid } from "../grid";

/** Knows whether somebody has worked on the open workbook: typed, opened a log, inserted a formula. */
export class OwnWork {
  readonly #grid: Grid;
  #found = false;

  constructor(grid: Grid) {
    this.#grid = grid;
    const history = grid.univer.__getInjector().get(IUndoRedoService);
    // What can be undone was somebody's work; calculated results and selections cannot. The list of steps forgets
    // its oldest, so that it may be empty again after much work: once found stays found.
    history.undoRedoStatus$.subscribe(() => {
      if (history.pitchTopUndoElement()?.unitID === this.#workbook()?.getId()) this.#found = true;
    });
  }

  /** Takes over what is being typed into a cell, so that it counts. */
  async isThere(): Promise<boolean> {
    await this.#workbook()?.endEditingAsync(true);
    return this.#found;
  }

  /** For a moment in which nothing can be waited for: what is being typed does not count. */
  get found(): boolean {
    return this.#found;
  }

  /** After another workbook was opened, or this one was saved. */
  forget(): void {
    this.#found = false;
  }

  #workbook() {
    return this.#grid.api.getActiveWorkbook();
  }
}
