import { describe, expect, it } from "vitest";
import { differs, misprints } from "./misprints";
import { judged } from "./published-value";

describe("printed values that we do not follow", () => {
  it.each(misprints)("$what is $published $unit, not $misprinted", (misprint) => {
    expect(judged(misprint)).toMatchObject({ holds: true });
    expect(differs(misprint)).toBe(true);
  });
});
