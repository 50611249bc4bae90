/** The calibrated couples of a call: one for each type that stands in its cells, made when first met. */
import { type CalibratedCouple, calibratedCouple, type Refusal, type Thermocouple } from "../../core";

export function calibratedCouples(
  coefficients: readonly number[],
  low: number,
  high: number,
): (type: Thermocouple) => CalibratedCouple | Refusal {
  const made = new Map<Thermocouple, CalibratedCouple | Refusal>();
  return (type) => {
    let couple = made.get(type);
    if (couple === undefined) {
      couple = calibratedCouple(type, coefficients, low, high);
      made.set(type, couple);
    }
    return couple;
  };
}
