import { expect, it } from "vitest";
import { fittingPattern } from "../../src/local-sheet/fitting-pattern";

it.each([
  [0, undefined],
  [25, undefined],
  [25.83, undefined],
  [25.832552610386557, "0.00000"],
  [-1234.567890123, "0.000"],
  [1234567.890123, "0"],
  [0.000012345678901, "0.000E+00"],
  [12345678901.5, "0.000E+00"],
])("%d in the general format is shown as %s", (value, pattern) => {
  expect(fittingPattern(value)).toBe(pattern);
});
