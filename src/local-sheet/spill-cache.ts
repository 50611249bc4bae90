/**
 * The grid engine keeps an index "value → rows" of each column for its lookup functions. While a result spills,
 * each written cell first searches every set of that index for its own row: quadratic in the number of distinct
 * values (40 000 rows take 46 s). Without the index the lookup functions walk the cells instead, which is right
 * as well. A test in test/local-sheet notices when the engine's internals no longer look like this.
 */
export interface InvertedIndexCache {
  set: (...entry: never[]) => void;
  setContinueBuildingCache: (...interval: never[]) => void;
}

export function switchOffInvertedIndex(cache: InvertedIndexCache): void {
  if (typeof cache.set !== "function" || typeof cache.setContinueBuildingCache !== "function") {
    throw new Error("The grid engine's index cache has changed: long results may be slow or wrong.");
  }
  cache.set = () => {};
  cache.setContinueBuildingCache = () => {};
}
