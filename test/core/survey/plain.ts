/**
 * The survey's figures once more, scan by scan and with nothing shared with the code under test: the definitions of
 * the catalogue written as plain loops over plain arrays.
 */
import type { SurveyQuestion } from "../../../src/core/survey";

const near = (x: number): number => Math.round(x * 1e9);

export function plainSurvey(q: SurveyQuestion) {
  const times = [...q.times];
  const sensors = q.readings.map((column, s) => [...column].map((x) => x + (q.corrections?.[s] ?? 0)));
  const rows = times.map((_, i) => sensors.map((column) => column[i] as number));
  const missing = (x: number) => Number.isNaN(x);
  const above = (x: number) => near(x - q.setpoint) > near(q.tolerance.above);
  const below = (x: number) => near(q.setpoint - x) > near(q.tolerance.below);
  const inBand = (x: number) => !missing(x) && !above(x) && !below(x);
  const steps = times.slice(1).map((t, i) => t - (times[i] as number));
  const rising = steps.filter((step) => step > 0).sort((a, b) => a - b);
  const half = rising.length / 2;
  const median =
    rising.length % 2 === 1
      ? (rising[Math.floor(half)] as number)
      : ((rising[half - 1] as number) + (rising[half] as number)) / 2;
  const maxGap = q.maxGap ?? 3 * median;

  const good = rows.flatMap((row, i) => (row.every(inBand) ? [i] : []));
  const first = q.start === undefined ? good[0]! : times.findIndex((t) => t >= q.start!);
  const last = q.end === undefined ? good.at(-1)! : times.filter((t) => t <= q.end!).length - 1;
  const period = Array.from({ length: last - first + 1 }, (_, k) => first + k);
  const seen = period.flatMap((i) =>
    rows[i]!.flatMap((x, s) => (missing(x) ? [] : [{ scan: i, sensor: s, time: times[i]!, x }])),
  );
  const highest = Math.max(...seen.map(({ x }) => x));
  const lowest = Math.min(...seen.map(({ x }) => x));
  let minutes = 0;
  let gaps = 0;
  for (const i of period.slice(1)) {
    if (near(steps[i - 1]!) > near(maxGap)) gaps++;
    else if (!rows[i]!.some(missing) && !rows[i - 1]!.some(missing)) minutes += steps[i - 1]!;
  }

  const bySensor = sensors.map((_, s) => seen.filter(({ sensor }) => sensor === s));
  const mean = (values: number[]) => values.reduce((sum, x) => sum + x, 0) / values.length;
  const means = bySensor.map((list) => mean(list.map(({ x }) => x)));
  let products = 0;
  let squares = 0;
  for (const list of bySensor) {
    const t0 = mean(list.map(({ time }) => time));
    const x0 = mean(list.map(({ x }) => x));
    for (const { time, x } of list) {
      products += (time - t0) * (x - x0);
      squares += (time - t0) ** 2;
    }
  }
  const full = means.flatMap((m, s) => (bySensor[s]!.length >= 0.9 * period.length ? [{ m, s }] : []));

  const allBelow = rows.map((row, i) => i < first && row.every(below)).lastIndexOf(true);
  const way =
    allBelow < 0
      ? []
      : rows
          .slice(allBelow + 1, first)
          .flat()
          .filter((x) => !missing(x));
  const overshoot = Math.max(0, ...way.map((x) => x - q.setpoint));
  const count = period.length * sensors.length - seen.length;
  const out = seen.some(({ x }) => !inBand(x)) || near(overshoot) > near(q.tolerance.above);
  const required = q.requiredMinutes ?? 30;
  return {
    summary: {
      highest,
      highestSensor: seen.find(({ x }) => x === highest)!.sensor,
      highestScan: seen.find(({ x }) => x === highest)!.scan,
      lowest,
      lowestSensor: seen.find(({ x }) => x === lowest)!.sensor,
      lowestScan: seen.find(({ x }) => x === lowest)!.scan,
      plusDeviation: highest - q.setpoint,
      minusDeviation: lowest - q.setpoint,
      spread: Math.max(
        ...period.map((i) => {
          const row = rows[i]!.filter((x) => !missing(x));
          return row.length === 0 ? 0 : Math.max(...row) - Math.min(...row);
        }),
      ),
      drift: (60 * products) / squares,
      hottestSensor: full.reduce((a, b) => (b.m > a.m ? b : a)).s,
      coldestSensor: full.reduce((a, b) => (b.m < a.m ? b : a)).s,
      centringShift: q.setpoint + (q.tolerance.above - q.tolerance.below) / 2 - (highest + lowest) / 2,
      overshoot,
      first,
      last,
      minutes,
      missing: count,
      margin: Math.min(
        ...seen.map(({ x }) =>
          Math.min(q.setpoint + q.tolerance.above - x, x - (q.setpoint - q.tolerance.below)),
        ),
      ),
      verdict: out
        ? "Fail"
        : count > 0 || gaps > 0
          ? "Incomplete"
          : near(minutes) < near(required)
            ? "Short"
            : "Pass",
    },
    table: bySensor.map((list, s) => {
      const values = list.map(({ x }) => x);
      return {
        correction: q.corrections?.[s] ?? 0,
        minimum: Math.min(...values),
        mean: means[s]!,
        maximum: Math.max(...values),
        plusDeviation: Math.max(...values) - q.setpoint,
        minusDeviation: Math.min(...values) - q.setpoint,
        stability: Math.max(...values) - Math.min(...values),
        inBand: values.filter(inBand).length / values.length,
        missing: period.length - values.length,
      };
    }),
  };
}
