/** First-order uncertainty of a temperature converted from an EMF. */
import { degrees, degreesApart, measured, noAnswer, Refusal } from "../errors";
import { finite } from "../numeric/finite";
import { rootSumSquare } from "../numeric/root-sum-square";
import { emfBetween, seebeckAt } from "../thermoelectric/convert";
import { spoken } from "../thermoelectric/designation";
import type { Thermocouple } from "../thermoelectric/thermocouple";

/**
 * Standard uncertainty in °C of the temperature t that a couple indicates:
 * √[(u_emf/S(t))² + (u_ref·S(t_ref)/S(t))² + (h·(E(t) − E(t_ref))/S(t))² + u_other²].
 *
 * `uEmfUv` standard uncertainty of the EMF, µV; `uReference` of the reference junction's
 * temperature and `uOther` of anything else in degrees, °C; `inhomogeneity` h of the wires as a
 * fraction of the EMF. Refused: temperatures outside the couple's range, or where its EMF belongs
 * to two temperatures; an uncertainty below 0.
 */
export function temperatureUncertainty(
  couple: Thermocouple,
  t: number,
  uEmfUv: number,
  uReference: number,
  reference: number,
  uOther = 0,
  inhomogeneity = 0,
): number | Refusal {
  if (uEmfUv < 0) return noAnswer`uncertainty of the EMF ${measured(uEmfUv, "µV")} is below 0`;
  if (uReference < 0) {
    return noAnswer`uncertainty of the reference temperature ${degreesApart(uReference)} is below 0`;
  }
  if (uOther < 0) return noAnswer`other uncertainty ${degreesApart(uOther)} is below 0`;
  if (inhomogeneity < 0) return noAnswer`inhomogeneity ${inhomogeneity} is below 0`;
  const slope = seebeckAt(couple, t);
  if (slope instanceof Refusal) return slope;
  const emf = emfBetween(couple, t, reference);
  if (emf instanceof Refusal) return emf;
  const referenceSlope = seebeckAt(couple, reference);
  if (referenceSlope instanceof Refusal) return referenceSlope;
  if (t < couple.uniqueFrom) {
    return noAnswer`temperature ${degrees(t)}: under ${degrees(couple.uniqueFrom)} an EMF of ${spoken(couple)} belongs to two temperatures`;
  }
  const inMicrovolts = rootSumSquare([uEmfUv, uReference * referenceSlope, inhomogeneity * emf * 1000]);
  return finite(rootSumSquare([inMicrovolts / slope, uOther]), "uncertainty");
}
