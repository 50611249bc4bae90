/** Times several pieces of work in turn, so that a noisy machine disturbs them all alike, and keeps the best of each. */
export interface Work {
  readonly name: string;
  run(): void;
}

export function bestTimes(works: readonly Work[], rounds: number): Map<string, number> {
  const best = new Map<string, number>();
  for (let round = 0; round < rounds; round++) {
    for (const { name, run } of works) {
      const start = performance.now();
      run();
      const elapsed = performance.now() - start;
      best.set(name, Math.min(best.get(name) ?? Number.POSITIVE_INFINITY, elapsed));
    }
  }
  return best;
}
