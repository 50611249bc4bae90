import { describe, expect, it } from "vitest";
import { thermocouple } from "../../src/core";
import { emfTables } from "./emf-tables";

describe.each(emfTables)("published table: $source", ({ rows }) => {
  it.each(rows)("type %s at %d °C prints %d mV", (type, t, printed, decimals) => {
    const couple = thermocouple(type);
    // Half a unit of the last printed digit, and the rounding of a sum that ends in 5.
    const half = 0.5 * 10 ** -decimals + 1e-9;
    expect(Math.abs((couple?.emf(t) ?? Number.NaN) - printed)).toBeLessThanOrEqual(half);
  });
});
