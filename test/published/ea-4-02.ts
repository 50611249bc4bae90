/** EA-4/02 M:2013, supplement 1, example S5: calibration of a type N thermocouple at 1000 °C. */
import { type Thermocouple, thermocouple } from "../../src/core";
import { emfAtNominal } from "../../src/core/calibration";
import { type Budget, type BudgetLine, budget, reportValue } from "../../src/core/uncertainty";
import type { PublishedSet, PublishedValue } from "./published-value";

/** C_S, C_S/C_S0 confirmed in copies; C_X and C_X0 from memory, reproduced to 14 digits by the published totals. */
const C_S = 0.077;
const C_X = 0.026;
const C_X0 = 0.039;

/** A line, the unit of its quantity, the printed standard uncertainty and the printed contribution. */
type PrintedLine = readonly [line: BudgetLine, unit: string, u: number, contribution: number];

// biome-ignore format: one line of the budget a line
const furnace: readonly PrintedLine[] = [
  [{ name: "temperature of reference thermometers", value: 0.1, distribution: "standard", dof: 9 }, "°C", 0.1, 0.1],
  [{ name: "voltmeter calibration", value: 2, distribution: "normal", sensitivity: C_S }, "µV", 1, 0.077],
  [{ name: "voltmeter resolution", value: 0.5, distribution: "rectangular", sensitivity: C_S }, "µV", 0.29, 0.022],
  [{ name: "reversing switch", value: 2, distribution: "Rectangular", sensitivity: C_S }, "µV", 1.15, 0.089],
  [{ name: "reference point", value: 0.1, distribution: "rectangular", sensitivity: -0.407 }, "°C", 0.058, 0.024],
  [{ name: "reference thermocouples", value: 0.3, distribution: "NORMAL", divisor: 2 }, "°C", 0.15, 0.15],
  [{ name: "drift of references", value: 0.3, distribution: "rectangular" }, "°C", 0.173, 0.173],
  [{ name: "furnace non-uniformity", value: 1, distribution: "rectangular" }, "°C", 0.577, 0.577],
];

// biome-ignore format: one line of the budget a line
const emf: readonly PrintedLine[] = [
  [{ name: "voltmeter indication", value: 1.6, distribution: "standard", dof: 9 }, "µV", 1.6, 1.6],
  [{ name: "voltmeter calibration", value: 2, distribution: "normal" }, "µV", 1, 1],
  [{ name: "voltmeter resolution", value: 0.5, distribution: "rectangular" }, "µV", 0.29, 0.29],
  [{ name: "reversing switch", value: 2, distribution: "rectangular" }, "µV", 1.15, 1.15],
  [{ name: "compensating cables", value: 5, distribution: "rectangular" }, "µV", 2.9, 2.9],
  // Printed as 24.5, where 0.641 × 38.5 is 24.7.
  [{ name: "furnace", value: 0.641, distribution: "standard", sensitivity: 1 / C_X, dof: 50 }, "°C", 0.641, 24.5],
  [{ name: "reference point", value: 0.1, distribution: "rectangular", sensitivity: -1 / C_X0 }, "°C", 0.058, 1.48],
];

/** The last lines of the second budget are from memory. */
const FOUND_OF_EMF = 4;

const made = (lines: readonly PrintedLine[]): Budget => budget(lines.map(([line]) => line)) as Budget;

/** The furnace's, by the unrounded 0.077/0.189 and the 50 degrees of freedom that a public copy gives each k = 2. */
const asInTheCopy = (): Budget =>
  budget(
    furnace.map(([line]) => ({
      ...line,
      ...(line.sensitivity === -0.407 ? { sensitivity: -0.077 / 0.189 } : {}),
      ...(line.distribution.toLowerCase() === "normal" ? { dof: 50 } : {}),
    })),
  ) as Budget;

/** The print rounds to two digits, and now and then in between. */
const lines = (name: string, printed: readonly PrintedLine[], unit: string): PublishedValue[][] =>
  printed.map(([line, unitOfU, u, contribution], i) => [
    {
      what: `${name}: ${line.name}, u`,
      unit: unitOfU,
      published: u,
      tolerance: 0.01 * u,
      ours: () => made(printed).rows[i]?.standardUncertainty,
    },
    {
      what: `${name}: ${line.name}, contribution`,
      unit,
      published: contribution,
      tolerance: 0.025 * contribution,
      ours: () => made(printed).rows[i]?.contribution,
    },
  ]);

const ofFurnace = lines("furnace", furnace, "°C");
const ofEmf = lines("EMF", emf, "µV");

const source = "EA-4/02 M:2013, supplement 1, example S5, type N at 1000 °C";
const compared =
  "standard uncertainties within 1 %, contributions within 2.5 % of their rounded print; what a copy prints unrounded to all its digits";

export const eaSets: readonly PublishedSet[] = [
  {
    source,
    origin: "print",
    compared,
    values: [
      ...ofFurnace.flat(),
      {
        what: "furnace: combined",
        unit: "°C",
        published: 0.641,
        decimals: 3,
        ours: () => made(furnace).combined,
      },
      {
        what: "furnace: combined, unrounded in a copy",
        unit: "°C",
        published: 0.640870516811861,
        tolerance: 5e-14,
        ours: () => asInTheCopy().combined,
      },
      {
        what: "furnace: effective degrees of freedom, in a copy",
        unit: "",
        published: 7688,
        decimals: 0,
        tolerance: 0,
        ours: () => Math.floor(asInTheCopy().dof),
      },
      { what: "furnace: k", unit: "", published: 2, decimals: 2, ours: () => made(furnace).k },
      {
        what: "furnace: result in °C",
        unit: "",
        published: "1000.5 ± 1.3",
        ours: () => reportValue(1000.5, made(furnace).expanded),
      },
      ...ofEmf.slice(0, FOUND_OF_EMF).flat(),
      { what: "EMF: combined", unit: "µV", published: 25, decimals: 1, ours: () => made(emf).combined },
      {
        // The copy carries 0.641 °C over from the first budget.
        what: "EMF: combined, unrounded in a copy",
        unit: "µV",
        published: 24.96625063622077,
        tolerance: 5e-12,
        ours: () => made(emf).combined,
      },
      {
        what: "EMF: effective degrees of freedom, in a copy, which takes 50 for the furnace",
        unit: "",
        published: 52,
        decimals: 0,
        tolerance: 0,
        ours: () => Math.floor(made(emf).dof),
      },
    ],
  },
  {
    source: `${source}: further lines`,
    origin: "memory",
    compared,
    values: [
      ...ofEmf.slice(FOUND_OF_EMF).flat(),
      {
        what: "EMF: 36 248 µV at 1000.5 °C moved to 1000 °C, in print by 0.026 °C/µV, which is rounded",
        unit: "µV",
        published: 36229,
        decimals: 0,
        tolerance: 1,
        ours: () => 1000 * (emfAtNominal(thermocouple("N") as Thermocouple, 36.248, 1000.5, 1000) as number),
      },
      {
        what: "EMF: result in µV",
        unit: "",
        published: "36229 ± 50",
        ours: () => reportValue(36228.77, 2 * made(emf).combined),
      },
    ],
  },
];
