/** System accuracy test: what the furnace's instrument shows against a test instrument beside its sensor. */
import type { Refusal } from "../errors";
import { finite } from "../numeric/finite";

/**
 * Difference of a system accuracy test, °C: indicated − (test reading + correction of the test sensor + correction of
 * the test instrument). The furnace sensor's own correction has no part in it. All in °C, corrections to be added.
 * Refused: a difference too large for a number. Source: SAE AMS2750, comparison system accuracy test.
 */
export const systemCheck = (
  indicated: number,
  testReading: number,
  sensorCorrection: number,
  instrumentCorrection: number,
): number | Refusal =>
  finite(indicated - (testReading + sensorCorrection + instrumentCorrection), "the difference");
