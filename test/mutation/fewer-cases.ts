/**
 * A mutant meets fewer random cases than the code does in `npm test`, and its counterexample is not made smaller: what
 * survives 100 cases may still be killed by 2000, so the score is on the low side.
 */
import { vi } from "vitest";

const CASES = 100;

vi.mock("fast-check", async (original) => {
  const { default: fc } = await original<{ default: typeof import("fast-check") }>();
  const fewer: typeof fc.assert = (property, parameters = {}) =>
    fc.assert(property as never, {
      ...(parameters as object),
      numRuns: Math.min((parameters as { numRuns?: number }).numRuns ?? CASES, CASES),
      endOnFailure: true,
    });
  return { ...fc, default: { ...fc, assert: fewer } };
});
