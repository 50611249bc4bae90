/**
 * The rules by which a record has a step, once more and the plain way: every row tried as the start of the response, τ
 * found by trying them all, sums over plain arrays.
 */
import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import { timeConstant } from "../../../src/core/log";
import { grid, jitter } from "./record";

const sum = (list: readonly number[]): number => list.reduce((total, x) => total + x, 0);
const about = (list: readonly number[]): number => {
  const mean = sum(list) / list.length;
  return sum(list.map((x) => (x - mean) ** 2));
};

/** Least squares of a + b·exp(−t/τ) over a and b, and what is left. */
function straight(t: readonly number[], y: readonly number[], tau: number) {
  const g = t.map((x) => Math.exp(-(x - t[0]!) / tau));
  const [mg, my] = [sum(g) / g.length, sum(y) / y.length];
  const b = sum(g.map((x, i) => (x - mg) * (y[i]! - my))) / sum(g.map((x) => (x - mg) ** 2));
  const left = sum(g.map((x, i) => (y[i]! - my - b * (x - mg)) ** 2));
  return { tau, a: my - b * mg, b, left };
}

/** The best τ between the bounds: a fine scan, then narrowed threefold again and again. */
function curve(t: readonly number[], y: readonly number[], shortest: number, longest: number) {
  let best = straight(t, y, shortest);
  let factor = 1.15;
  for (let tau = shortest; tau < longest; tau *= factor) {
    const tried = straight(t, y, tau);
    if (tried.left < best.left) best = tried;
  }
  for (; factor > 1 + 1e-9; factor = Math.sqrt(factor)) {
    for (const tau of [best.tau / factor, best.tau * factor]) {
      const tried = straight(t, y, Math.min(Math.max(tau, shortest), longest));
      if (tried.left < best.left) best = tried;
    }
  }
  return best;
}

/** "no step", "at once", or the row at which the response starts, with the fit from there. */
function plain(times: readonly number[], y: readonly number[]) {
  const n = y.length;
  const steps = times.slice(1).map((t, i) => t - times[i]!);
  const shortest = Math.min(...steps.filter((step) => step > 0)) / 5;
  const longest = 10 * (times[n - 1]! - times[0]!);
  const changes = y.slice(1).map((x, i) => Math.abs(x - y[i]!));
  // A logger that writes steps leaves a rectangle's variance, a twelfth of a step squared, in every reading.
  const least = (n * Math.min(...changes.filter((change) => change > 1e-9)) ** 2) / 12;
  const from = (row: number) => {
    const fit = curve(times.slice(row), y.slice(row), shortest, longest);
    return { row, fit, left: Math.max((row > 0 ? about(y.slice(0, row)) : 0) + fit.left, least) };
  };
  const whole = from(0);
  let best = whole;
  for (let row = 1; row <= n - 5; row++) {
    const tried = from(row);
    if (tried.left < best.left) best = tried;
  }
  // Two more parameters (row and level) must lower the squares by an F of more than 20.
  const start = n > 5 && (whole.left - best.left) / 2 / (best.left / (n - 5)) > 20 ? best : whole;
  const parameters = start.row > 0 ? 4 : 2;
  const total = about(y);
  const explained = total - start.left;
  if (!(explained > 0.8 * total && explained / parameters > (50 * start.left) / (n - 1 - parameters)))
    return "no step";
  const response = y.slice(start.row);
  const left = Math.max(start.fit.left, (least * response.length) / n);
  const follows = (about(response) - left) / 2 > (20 * left) / (response.length - 3);
  if (start.fit.tau <= shortest || !follows) return "at once";
  return { ...start, level: sum(y.slice(0, start.row)) / start.row };
}

/** Seconds, every tenth scan twice as long. */
const clock = (count: number): number[] => {
  let now = 1000;
  return Array.from({ length: count }, (_, i) => (now += i % 10 === 7 ? 2 : 1));
};
const record = (times: number[], before: number, tau: number, size: number, noise: number): number[] =>
  times.map(
    (t, i) =>
      20 + size * (i < before ? 0 : 1 - Math.exp(-(t - times[before]!) / tau)) + noise * jitter(1 + 3 * i),
  );

const said = (y: number[], times: number[]) => {
  const found = timeConstant(grid(Float64Array.from(times, (t) => t / 60)), Float64Array.from(y));
  if (!(found instanceof Refusal)) return found;
  const message = found.message();
  if (message.startsWith("no step stands out")) return "no step";
  if (message.startsWith("the step is over within")) return "at once";
  return message;
};

function agree(y: number[], times: number[]): string {
  const [found, expected] = [said(y, times), plain(times, y)];
  if (typeof expected === "string") {
    expect(found).toBe(expected);
    return expected;
  }
  // A step that is told, but whose time constant is not, is a matter of its uncertainty.
  if (typeof found === "string") {
    expect(found).toMatch(/^the record (does not fix|ends before)/);
    return "unsure";
  }
  expect(found.timeConstant / expected.fit.tau).toBeCloseTo(1, 5);
  expect(found.final).toBeCloseTo(expected.fit.a, 3);
  expect(found.initial).toBeCloseTo(expected.row > 0 ? expected.level : expected.fit.a + expected.fit.b, 3);
  return expected.row > 0 ? "later" : "from the first";
}

describe("a record, with more and more scatter,", () => {
  it.each([
    ["that starts with the step", 0, 9],
    ["with a level before the step", 12, 6],
    ["with a fast step", 17, 1.2],
    ["with a step near its end", 33, 2],
    ["with few readings before it", 2, 8],
  ])("%s: has what the plain rules say", (_, before, tau) => {
    const times = clock(45);
    const answers = new Set<string>();
    for (let noise = 0.5; noise < 300; noise *= 1.25) {
      answers.add(agree(record(times, before, tau, 80, noise), times));
    }
    expect(answers).toContain("no step");
    expect(answers.size).toBeGreaterThan(1);
  });

  it.each([6, 7, 8, 9, 10])("of %d readings has what the plain rules say", (count) => {
    const times = clock(count);
    for (let noise = 0.01; noise < 100; noise *= 1.4) agree(record(times, 0, 2, 80, noise), times);
    for (let noise = 0.01; noise < 100; noise *= 1.4) agree(record(times, 1, 1.5, 80, noise), times);
  });
});

describe("the row at which a response starts", () => {
  it.each([131, 144, 217, 288])("is found in a long record as if every row had been tried: %d", (before) => {
    const times = clock(300);
    expect(agree(record(times, before, 2, 80, 0.3), times)).toBe("later");
  });

  it("is never one of the last four", () => {
    const times = clock(60);
    expect(agree(record(times, 56, 1, 80, 0.1), times)).not.toBe("later");
  });
});

describe("a step that is over at once", () => {
  it("is told from a response, though one reading was caught on the way", () => {
    const times = clock(60);
    const caught = (noise: number) =>
      times.map((_, i) => (i < 30 ? 20 : i === 30 ? 60 : 100) + noise * jitter(1 + 3 * i));
    // e⁻⁵, of a τ of a fifth of an interval, is 0.7 % of the 40 °C that are left.
    expect(agree(caught(0.01), times)).toBe("at once");
    for (const noise of [0.1, 0.3, 1, 3, 10]) agree(caught(noise), times);
  });
});

describe("the bounds of a time constant", () => {
  it("go by the shortest interval, wherever it stands and whatever the last one is", () => {
    const times = [...clock(40), 1200];
    expect(agree(record(times, 0, 3, 80, 0.05), times)).toBe("from the first");
    const dense = [1000, 1000.2, ...Array.from({ length: 40 }, (_, i) => 1001 + i)];
    expect(agree(record(dense, 0, 3, 80, 0.05), dense)).toBe("from the first");
  });

  it("go by the span of the record and not by its place on the clock", () => {
    const times = clock(60).map((t) => t + 46083 * 86_400);
    const ramp = times.map((_, i) => 3 * i);
    expect(
      said(
        ramp,
        clock(60).map((_, i) => 46083 * 86_400 + i),
      ),
    ).toBe("the record ends before the step begins to settle");
    expect(agree(record(times, 0, 2, 80, 0.05), times)).toBe("from the first");
  });
});
