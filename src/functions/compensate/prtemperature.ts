import { platinumTemperature } from "../../core";
import { each, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { resistance as resistanceInOhms } from "../kinds/numbers";
import { temperatureResult } from "../results";

/**
 * Temperature of a platinum resistance sensor, such as the one at the reference junction, from its resistance.
 * @customfunction PRTEMPERATURE
 * @category Compensate
 * @param resistance Measured resistance in Ω, one cell or a range.
 * @param [r0] Resistance at 0 °C in Ω; 100 when left out.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Temperature in the call's unit, −200 °C to 850 °C.
 * @equation R = R0·(1 + A·t + B·t² + C·(t − 100)·t³), C only below 0 °C, solved for t
 * @assumes A sensor with the coefficients of the standard (temperature coefficient 0.003851/°C).
 * @standard IEC 60751:2008
 * @keywords RTD, PRT, resistance thermometer, Pt 100, terminal temperature, cold junction sensor
 * @related PRTRESISTANCE, TEMPERATURE
 * @example =BEAD.PRTEMPERATURE(138.51) → 100.0
 * @example =BEAD.PRTEMPERATURE({60.26;84.27;109.73}) → {-100.0;-40.0;25.0}
 */
export function PRTEMPERATURE(resistance: unknown[][], r0?: unknown[][], unit?: unknown[][]): unknown[][] {
  return prtemperature({ resistance, r0, unit });
}

const prtemperature = cellwise(PRTEMPERATURE, {
  arguments: {
    resistance: each(resistanceInOhms),
    r0: orElse(once(resistanceInOhms), 100, "100 Ω"),
    unit: unitOption,
  },
  result: temperatureResult,
  cell: ({ resistance, r0 }) => platinumTemperature(resistance, r0),
});
