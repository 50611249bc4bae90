import { systemCheck } from "../../core";
import { each } from "../arguments";
import { cellwise } from "../cellwise";
import { sheetDifference, sheetTemperature } from "../kinds/numbers";
import { sheetDifferenceResult } from "../results";

/**
 * System accuracy test: what the furnace's instrument indicates, less what a test sensor beside its own one says after
 * both corrections.
 * @customfunction SYSTEMCHECK
 * @category Survey
 * @param indicated What the furnace's instrument indicates, one cell or a range, in whatever degrees the sheet holds.
 * @param testReading Reading of the test instrument.
 * @param sensorCorrection Correction to add for the test sensor; type 0 for none.
 * @param instrumentCorrection Correction to add for the test instrument; type 0 for none.
 * @returns Difference in degrees of the sheet; give it to VERDICT with the limit of the furnace's class.
 * @equation difference = indicated − (test reading + sensor correction + instrument correction)
 * @definition Corrections of the furnace's own sensor have no part in it.
 * @standard SAE AMS2750, comparison system accuracy test
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords SAT, system accuracy test, comparison, probe check, AMS2750, CQI-9
 * @related VERDICT, SURVEYCLASS, CORRECTION
 * @example =BEAD.SYSTEMCHECK(900,901.5,-0.5,0.2) → -1.2
 */
export function SYSTEMCHECK(
  indicated: unknown[][],
  testReading: unknown[][],
  sensorCorrection: unknown[][],
  instrumentCorrection: unknown[][],
): unknown[][] {
  return systemcheck({ indicated, testReading, sensorCorrection, instrumentCorrection });
}

const systemcheck = cellwise(SYSTEMCHECK, {
  arguments: {
    indicated: each(sheetTemperature),
    testReading: each(sheetTemperature),
    sensorCorrection: each(sheetDifference),
    instrumentCorrection: each(sheetDifference),
  },
  result: sheetDifferenceResult,
  cell: ({ indicated, testReading, sensorCorrection, instrumentCorrection }) =>
    systemCheck(indicated, testReading, sensorCorrection, instrumentCorrection),
});
