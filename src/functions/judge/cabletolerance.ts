import { cableToleranceDegrees, cableToleranceUv } from "../../core";
import { each, ifGiven, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { choice } from "../kinds/kind";
import { temperature } from "../kinds/temperature";
import { cable, cableClass } from "../kinds/tolerance-class";
import { differenceResult, microvoltResult } from "../results";

/**
 * The limit ± that a new extension or compensating cable adds. ASTM specifies base-metal cables in degrees of their
 * own junctions: for µV they need the temperature of the head.
 * @customfunction CABLETOLERANCE
 * @category Judge
 * @param cable Cable: KX, JX, TX, EX, NX, KCA, KCB, NC, RCA, RCB, SCA, SCB, BC (IEC), or KX, JX, EX, TX, NX, SX, RX, BX, CX (ASTM).
 * @param toleranceClass 1 or 2 (IEC 60584-3), or standard or special (ASTM E230).
 * @param [expressedIn] uV (default), or degrees that the cable adds to a reading.
 * @param [temperature] For degrees: of the measuring junction, the standard's own when left out. For uV: of the head, needed for base-metal cables of ASTM only.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns The limit, to be read with ±, in µV or in degrees of the call's unit.
 * @equation degrees = µV / S(measuring junction)
 * @equation Base-metal cables of ASTM: µV = degrees · S(head)
 * @definition The standard's own temperatures of the measuring junction: 300 °C for TX; 500 °C for JX and EX; 900 °C for types K and N; 1000 °C for R and S; 1400 °C for B (ASTM 870 °C and 1000 °C).
 * @assumes The cable within its own range of temperatures.
 * @standard IEC 60584-3:2007; ASTM E230/E230M
 * @keywords extension cable, compensating cable, extension grade, KX, KCA
 * @related TOLERANCE, LEADERROR, RELEAD
 * @example =BEAD.CABLETOLERANCE("KX",1) → 60
 * @example =BEAD.CABLETOLERANCE({"KX";"RCA"},2,"degrees") → {2.5;2.5}
 */
export function CABLETOLERANCE(
  cable: unknown[][],
  toleranceClass: unknown[][],
  expressedIn?: unknown[][],
  temperature?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return cabletolerance({ cable, toleranceClass, expressedIn, temperature, unit });
}

const cabletolerance = cellwise(CABLETOLERANCE, {
  arguments: {
    cable: each(cable),
    toleranceClass: each(cableClass),
    expressedIn: orElse(once(choice(["uV", "degrees"])), "uV", "uV"),
    temperature: ifGiven(each(temperature)),
    unit: unitOption,
  },
  result: microvoltResult,
  resultOf: ({ expressedIn }) => (expressedIn === "uV" ? microvoltResult : differenceResult),
  cell: ({ cable, toleranceClass, expressedIn, temperature }) =>
    (expressedIn === "uV" ? cableToleranceUv : cableToleranceDegrees)(cable, toleranceClass, temperature),
});
