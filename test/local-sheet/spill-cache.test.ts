import { CELL_INVERTED_INDEX_CACHE } from "@univerjs/engine-formula";
import { describe, expect, it } from "vitest";
import { switchOffInvertedIndex } from "../../src/local-sheet/spill-cache";

describe("the grid engine's index of cell values", () => {
  it("still has the internals that are switched off, and answers as empty after that", () => {
    const cache = CELL_INVERTED_INDEX_CACHE;
    cache.set("unit", "sheet", 0, "x", 3, true);
    expect(cache.getCellPositions("unit", "sheet", 0, "x", [[0, 9]])?.matchingRows).toEqual([3]);
    cache.clear();
    switchOffInvertedIndex(cache);
    cache.set("unit", "sheet", 0, "x", 3, true);
    cache.setContinueBuildingCache("unit", "sheet", 0, 0, 9);
    expect(cache.getCellPositions("unit", "sheet", 0, "x", [[0, 9]])).toBeUndefined();
    // Nothing in the index, so the lookup functions walk every row themselves.
    expect(cache.canUseCache("unit", "sheet", 0, 0, 9)).toEqual({ rowsInCache: [], rowsNotInCache: [] });
  });

  it("is refused when a later engine has other internals", () => {
    expect(() => switchOffInvertedIndex({} as never)).toThrow(/index cache has changed/);
  });
});
