import { thermistor } from "../../core";
import { column, each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { number, resistance as resistanceInOhms } from "../kinds/numbers";
import { temperatureResult } from "../results";

/**
 * Temperature of a thermistor, such as the one at a logger's terminals, from its resistance.
 * @customfunction NTCTEMPERATURE
 * @category Compensate
 * @param resistance Measured resistance in Ω, one cell or a range.
 * @param coefficients Three cells A, B, C of the Steinhart–Hart equation, or two: resistance at 25 °C in Ω and beta in K.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Temperature in the call's unit. Coefficients that no thermistor has are refused.
 * @equation 1/T = A + B·ln R + C·(ln R)³; with two coefficients 1/T = 1/298.15 K + ln(R/R25)/beta
 * @standard Steinhart and Hart (1968)
 * @keywords thermistor, NTC, Steinhart-Hart, beta, terminal temperature, cold junction sensor
 * @related PRTEMPERATURE, TEMPERATURE
 * @example =BEAD.NTCTEMPERATURE(10000,{10000,3950}) → 25.00
 */
export function NTCTEMPERATURE(
  resistance: unknown[][],
  coefficients: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return ntctemperature({ resistance, coefficients, unit });
}

const ntctemperature = cellwise(NTCTEMPERATURE, {
  arguments: { resistance: each(resistanceInOhms), coefficients: column(number), unit: unitOption },
  result: temperatureResult,
  prepare: ({ coefficients }) => thermistor(coefficients),
  cell: ({ resistance }, sensor) => sensor.temperature(resistance),
});
