/** The test of published values: one for each row. */
import { describe, expect, it } from "vitest";
import { judged, type PublishedSet } from "./published-value";

export function eachAgrees(sets: readonly PublishedSet[]): void {
  describe.each(sets)("$source", ({ values }) => {
    it.each(values)("$what: $published $unit", (value) => {
      expect(judged(value)).toMatchObject({ holds: true });
    });
  });
}
