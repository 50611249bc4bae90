/** Tolerance tables, decision rules and probabilities of conformity. */
import {
  cableToleranceDegrees,
  cableToleranceUv,
  conformityProbability,
  type DecisionRule,
  decisionRule,
  largestPassRisk,
  tolerance,
} from "../../src/core/conformity";
import { jcgmTable1, recomputedRisks } from "../published/decision-rules";
import {
  printedAstm,
  printedAstmCables,
  printedAstmMicrovolts,
  printedIec,
  printedIecCables,
  printedPlatinum,
} from "../published/tolerances";
import { type Group, row, significant } from "./group";

const iec: Group = {
  source: "IEC 60584-1:2013, tolerance classes (three makers' tables)",
  compared: "± °C at both ends of each printed line and in its middle; breakpoints are printed to 1 °C",
  rows: printedIec.flatMap(({ type, name, from, to, constant, proportion }) =>
    [from, (from + to) / 2, to].map((t) =>
      row(
        `${type}, class ${name}, ${t} °C`,
        constant ?? (proportion as number) * Math.abs(t),
        tolerance(type, name, t),
        3,
        0.006,
      ),
    ),
  ),
};

const cables: Group = {
  source: "IEC 60584-3, extension and compensating cables (an instrument maker's manual, two further pages)",
  compared: "± µV",
  rows: printedIecCables.map(([cable, name, uv]) =>
    row(`${cable}, class ${name}`, uv, cableToleranceUv(cable, name), 0),
  ),
};

const astmCables: Group = {
  source: "ASTM E230/E230M, extension and compensating cables (three makers' tables; µV from memory)",
  compared: "± °C and ± µV",
  rows: [
    ...printedAstmCables.flatMap(([cable, standard, special]) => [
      row(`${cable}, standard, °C`, standard, cableToleranceDegrees(cable, "standard"), 1),
      row(`${cable}, special, °C`, special, cableToleranceDegrees(cable, "special"), 1),
    ]),
    ...printedAstmMicrovolts.flatMap(([cable, degrees, uv]) => [
      row(`${cable}, standard, °C`, degrees, cableToleranceDegrees(cable, "standard"), 1),
      row(`${cable}, standard, µV`, uv, cableToleranceUv(cable, "standard"), 0),
    ]),
  ],
};

export const judgementGroups: readonly Group[] = [
  iec,
  {
    source: "ASTM E230/E230M, tolerances on initial values (a summary sheet and four makers' tables)",
    compared: "± °C",
    rows: printedAstm.map(([type, name, t, limit]) =>
      row(`${type}, ${name}, ${t} °C`, limit, tolerance(type, name, t), 3),
    ),
  },
  {
    source: "IEC 60751:2008, tolerances of sensors (five copies)",
    compared: "± °C",
    rows: printedPlatinum.map(([name, t, limit]) =>
      row(`class ${name}, ${t} °C`, limit, tolerance("Pt", name, t), 2),
    ),
  },
  cables,
  astmCables,
  {
    source: "ILAC-G8:09/2019, specific risk at the acceptance limit (recomputed with 40 digits)",
    compared: "probability, to 1E-10 of it",
    rows: recomputedRisks.map(([rule, k, risk]) =>
      significant(
        `"${rule}", k = ${k}`,
        risk,
        largestPassRisk(1000, 1, decisionRule(rule) as DecisionRule, k, "none"),
        1e-10,
      ),
    ),
  },
  {
    source: "JCGM 106:2012, table 1 (from memory)",
    compared: "probability of conformity at z printed to two decimals",
    rows: jcgmTable1.map(([z, p]) => row(`z = ${z}`, p, conformityProbability(-z, 0, 1, "none"), 3, 0.0014)),
  },
];
