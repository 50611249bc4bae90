/**
 * Times several pieces of work in turn, so that whatever disturbs the machine disturbs them all alike, and keeps the
 * best of each. Processor time and not the clock: what other programs take of the processor does not count.
 */
export interface Work {
  readonly name: string;
  /** Calls in a row that are timed as one. */
  readonly calls?: number;
  run(): void;
}

export function processorTime(run: () => void): number {
  const before = process.cpuUsage();
  run();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
}

/** Milliseconds a call; no new round is begun when all have together taken `enough` milliseconds. */
export function bestTimes(
  works: readonly Work[],
  rounds: number,
  enough = Number.POSITIVE_INFINITY,
): (name: string) => number {
  const best = new Map<string, number>();
  let spent = 0;
  for (let round = 0; round < rounds && spent < enough; round++) {
    for (const { name, calls = 1, run } of works) {
      const time = processorTime(() => {
        for (let call = 0; call < calls; call++) run();
      });
      spent += time;
      best.set(name, Math.min(best.get(name) ?? Number.POSITIVE_INFINITY, time / calls));
    }
  }
  return (name) => best.get(name) as number;
}

/** Runs until the compiler has had its say; returns how many calls fill so many milliseconds. */
export function warmUp(run: () => void, milliseconds: number): number {
  let calls = 0;
  for (let spent = 0; spent < milliseconds; calls++) spent += processorTime(run);
  return calls;
}
