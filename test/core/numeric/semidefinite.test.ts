import { describe, expect, it } from "vitest";
import { contradictingRow } from "../../../src/core/numeric/semidefinite";

describe("contradictingRow", () => {
  it("finds none in a positive definite matrix", () => {
    expect(
      contradictingRow([
        [1, 0.5, 0.2],
        [0.5, 1, -0.3],
        [0.2, -0.3, 1],
      ]),
    ).toBe(-1);
  });

  it("finds none where quantities determine each other wholly", () => {
    expect(
      contradictingRow([
        [1, 1, -1],
        [1, 1, -1],
        [-1, -1, 1],
      ]),
    ).toBe(-1);
  });

  it("names the first row that cannot stand with those above it", () => {
    // 1 with 2 and 1 with 3 rise together, so 2 and 3 cannot oppose each other.
    expect(
      contradictingRow([
        [1, 0.9, 0.9],
        [0.9, 1, -0.9],
        [0.9, -0.9, 1],
      ]),
    ).toBe(2);
  });

  it("knows how far two quantities may differ that both follow a third: ab ± √((1 − a²)(1 − b²))", () => {
    // With a = b = 0.6 from −0.28 up; with a = 0.6 and b = 0.8 from 0 to 0.96.
    const given = (a: number, b: number, c: number): number =>
      contradictingRow([
        [1, a, b],
        [a, 1, c],
        [b, c, 1],
      ]);
    expect([-0.29, -0.27].map((c) => given(0.6, 0.6, c))).toEqual([2, -1]);
    expect([-0.01, 0.01, 0.95, 0.97].map((c) => given(0.6, 0.8, c))).toEqual([2, -1, -1, 2]);
  });

  it("names the first row that cannot stand after two that are one", () => {
    expect(
      contradictingRow([
        [1, 1, 0, 0, 0],
        [1, 1, 0, 0, 0],
        [0, 0, 1, 0.9, 0.9],
        [0, 0, 0.9, 1, -0.9],
        [0, 0, 0.9, -0.9, 1],
      ]),
    ).toBe(4);
  });

  it("takes a correlation past 1, or two that differ, by less than anyone types for rounding", () => {
    const r = 1 + 2e-10;
    expect(
      contradictingRow([
        [1, r, 0.5],
        [r, 1, 0.5 + 1e-12],
        [0.5, 0.5 + 1e-12, 1],
      ]),
    ).toBe(-1);
    expect(
      contradictingRow([
        [1, r, 0.5],
        [r, 1, 0.4],
        [0.5, 0.4, 1],
      ]),
    ).toBe(2);
    expect(
      contradictingRow([
        [1, 1.1],
        [1.1, 1],
      ]),
    ).toBe(1);
  });

  it("names a row that correlates otherwise with two that are one", () => {
    expect(
      contradictingRow([
        [1, 1, 0.5],
        [1, 1, 0.4],
        [0.5, 0.4, 1],
      ]),
    ).toBe(2);
  });
});
