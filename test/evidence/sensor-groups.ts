/** Sensors at the reference junction, and the two temperature scales. */
import { toIts90 } from "../../src/core";
import { platinumResistance, type Thermistor, thermistor } from "../../src/core/junction";
import { platinumTable } from "../published/platinum";
import { printedDifferences, printedRadiationDifferences } from "../published/scale-differences";
import { manualCoefficients, manualTable } from "../published/thermistor";
import { type Group, row } from "./group";

const ntc = thermistor(manualCoefficients) as Thermistor;

/** t90 − t68 where t90 is what the printed difference makes of it. */
const differenceAt = (t90: number, printed: number): number => {
  const t68 = t90 - printed;
  const found = toIts90(t68);
  return typeof found === "number" ? found - t68 : Number.NaN;
};

export const sensorGroups: readonly Group[] = [
  {
    source: "IEC 60751:2008, R0 = 100 Ω (three copies)",
    compared: "resistance in Ω, to half a unit of the last printed digit",
    rows: platinumTable.map(([t, printed]) => row(`${t} °C`, printed, platinumResistance(t, 100), 2)),
  },
  {
    source: "a data logger's manual, 10 kΩ thermistor",
    compared: "temperature in °C from the printed resistance, to 0.005 °C",
    rows: manualTable.map(([t, ohms]) => row(`${ohms} Ω`, t, ntc.temperature(ohms), 2)),
  },
  {
    source: "ITS-90 less IPTS-68, a handbook's table",
    compared:
      "difference in °C: 1.5 mK below 0 °C and 1 mK above for the stated fit, 0.5 mK for the rounding",
    rows: printedDifferences.map(([t90, printed]) =>
      row(`${t90} °C`, printed, differenceAt(t90, printed), 3, (t90 < 0 ? 0.0015 : 0.001) + 0.0005),
    ),
  },
  {
    source: "ITS-90 less IPTS-68 above the gold point, a handbook",
    compared: "difference in °C, printed to 10 mK",
    rows: printedRadiationDifferences.map(([t90, printed]) =>
      row(`${t90} °C`, printed, differenceAt(t90, printed), 2, 0.006),
    ),
  },
];
