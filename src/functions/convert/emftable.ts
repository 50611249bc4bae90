import { emfBetween, Refusal, seebeckAt, temperatureGrid } from "../../core";
import { ifGiven, once, unit as unitOption } from "../arguments";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { emfResult, gridTemperatureResult, seebeckResult } from "../results";
import { table } from "../whole";

/**
 * Table of EMF and Seebeck coefficient over temperature, reference junction at 0 °C, spilled with a header row.
 * @customfunction EMFTABLE
 * @category Convert
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param start First temperature.
 * @param end Last temperature; below start the table runs downward.
 * @param [step] Distance of two rows, above 0; 1 degree when left out.
 * @param [column] One column without its header: temperature, emf or seebeck_uv.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of temperature, EMF in mV and Seebeck coefficient in µV per degree.
 * @equation emf = E(t), S(t) = dE/dt
 * @standard IEC 60584-1:2013; NIST Monograph 175; ASTM E1751; GOST R 8.585-2001
 * @keywords reference table, printed table, look-up
 * @related EMF, SEEBECK, TYPEINFO
 * @example =BEAD.EMFTABLE("K",0,30,10,"emf") → {0;0.397;0.798;1.203}
 */
export function EMFTABLE(
  type: unknown[][],
  start: unknown[][],
  end: unknown[][],
  step?: unknown[][],
  column?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return emftable({ type, start, end, step, column, unit });
}

const emftable = table(EMFTABLE, {
  arguments: {
    type: once(couple),
    start: once(temperature),
    end: once(temperature),
    step: ifGiven(once(temperatureDifference)),
    column: ifGiven(once(choice(["temperature", "emf", "seebeck_uv"]))),
    unit: unitOption,
  },
  result: { temperature: gridTemperatureResult, emf: emfResult, seebeck_uv: seebeckResult },
  rows({ type, start, end, step, unit }) {
    const grid = temperatureGrid(start, end, step ?? unit.degree);
    if (grid instanceof Refusal) return grid;
    return grid.map((t) => ({ temperature: t, emf: emfBetween(type, t, 0), seebeck_uv: seebeckAt(type, t) }));
  },
});
