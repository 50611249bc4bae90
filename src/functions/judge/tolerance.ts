import { tolerance as toleranceOf, toleranceUv, wrongKind } from "../../core";
import { each, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { choice } from "../kinds/kind";
import { sensor } from "../kinds/sensor";
import { temperature } from "../kinds/temperature";
import { toleranceClass } from "../kinds/tolerance-class";
import { differenceResult, microvoltResult } from "../results";

/**
 * The limit ± of new thermocouple wire at a temperature, or of a platinum sensor, by its tolerance class.
 * @customfunction TOLERANCE
 * @category Judge
 * @param temperature Temperature of the measuring junction, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A; or Pt for a platinum resistance sensor.
 * @param toleranceClass 1, 2 or 3 (IEC 60584-1), standard or special (ASTM E230); for Pt AA, A, B or C (IEC 60751).
 * @param [expressedIn] degrees (default), or uV: the same limit times the Seebeck coefficient at the temperature.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns The limit, to be read with ±, in degrees of the call's unit or in µV.
 * @equation Most classes: the larger of a constant and a percentage of |t| in °C. Types R and S class 1 above 1100 °C: 1 + 0.003·(t − 1100)
 * @equation Pt: constant + fraction·|t| in °C
 * @definition The classes hold for new wire as delivered; use and heat change it. Pt: the ranges of wire-wound sensors.
 * @standard IEC 60584-1:2013; ASTM E230/E230M; IEC 60751:2008
 * @keywords class 1, class 2, special limits of error, standard limits, accuracy, Pt100
 * @related CHECKTABLE, CLASSMET, CABLETOLERANCE, VERDICT
 * @example =BEAD.TOLERANCE(900,"K",1) → 3.6
 * @example =BEAD.TOLERANCE({0;500;1000},"K",2) → {2.5;3.75;7.5}
 * @example =BEAD.TOLERANCE(100,"Pt","A") → 0.35
 */
export function TOLERANCE(
  temperature: unknown[][],
  type: unknown[][],
  toleranceClass: unknown[][],
  expressedIn?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return tolerance({ temperature, type, toleranceClass, expressedIn, unit });
}

const noEmf = wrongKind`Pt is a resistance sensor and has no EMF: leave uV out`;

const tolerance = cellwise(TOLERANCE, {
  arguments: {
    temperature: each(temperature),
    type: each(sensor),
    toleranceClass: each(toleranceClass),
    expressedIn: orElse(once(choice(["degrees", "uV"])), "degrees", "degrees"),
    unit: unitOption,
  },
  result: differenceResult,
  resultOf: ({ expressedIn }) => (expressedIn === "uV" ? microvoltResult : differenceResult),
  cell({ temperature, type, toleranceClass, expressedIn }) {
    if (type === "Pt") return expressedIn === "uV" ? noEmf : toleranceOf("Pt", toleranceClass, temperature);
    return expressedIn === "uV"
      ? toleranceUv(type, toleranceClass, temperature)
      : toleranceOf(type.designation, toleranceClass, temperature);
  },
});
