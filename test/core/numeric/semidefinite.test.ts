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
