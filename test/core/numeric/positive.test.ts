import { describe, expect, it } from "vitest";
import { degreesApart } from "../../../src/core";
import { finite } from "../../../src/core/numeric/finite";
import { refusedUnlessPositive } from "../../../src/core/numeric/positive";

describe("a number that must be above 0", () => {
  it("is refused at 0 and below it, in its unit where it has one", () => {
    expect(refusedUnlessPositive(1e-300, "U")).toBeUndefined();
    expect(refusedUnlessPositive(0, "U")?.message()).toBe("U is 0 or an empty cell");
    expect(refusedUnlessPositive(-2, "U")?.message()).toBe("U -2 is below 0");
    expect(refusedUnlessPositive(-2, "U", degreesApart)?.message()).toBe("U -2 °C is below 0");
  });
});

describe("a result that must be a number", () => {
  it("is refused past the largest there is", () => {
    expect(finite(1.5, "sum")).toBe(1.5);
    for (const beyond of [Number.POSITIVE_INFINITY, Number.NaN]) {
      expect(finite(beyond, "sum")).toMatchObject({ kind: "no answer" });
      expect((finite(beyond, "sum") as { message(): string }).message()).toBe(
        "sum is too large for a number",
      );
    }
  });
});
