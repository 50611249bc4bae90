import { platinumResistance } from "../../core";
import { each, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { resistance } from "../kinds/numbers";
import { temperature as temperatureKind } from "../kinds/temperature";
import { resistanceResult } from "../results";

/**
 * Resistance of a platinum resistance sensor at a temperature.
 * @customfunction PRTRESISTANCE
 * @category Compensate
 * @param temperature Temperature, one cell or a range, −200 °C to 850 °C.
 * @param [r0] Resistance at 0 °C in Ω; 100 when left out.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Resistance in Ω.
 * @equation R = R0·(1 + A·t + B·t² + C·(t − 100)·t³), C only below 0 °C
 * @assumes A sensor with the coefficients of the standard (temperature coefficient 0.003851/°C).
 * @standard IEC 60751:2008
 * @keywords RTD, PRT, resistance thermometer, Pt 100, simulate
 * @related PRTEMPERATURE
 * @example =BEAD.PRTRESISTANCE({-200;0;100;850}) → {18.52;100.00;138.51;390.48}
 */
export function PRTRESISTANCE(temperature: unknown[][], r0?: unknown[][], unit?: unknown[][]): unknown[][] {
  return prtresistance({ temperature, r0, unit });
}

const prtresistance = cellwise(PRTRESISTANCE, {
  arguments: {
    temperature: each(temperatureKind),
    r0: orElse(once(resistance), 100, "100 Ω"),
    unit: unitOption,
  },
  result: resistanceResult,
  cell: ({ temperature, r0 }) => platinumResistance(temperature, r0),
});
