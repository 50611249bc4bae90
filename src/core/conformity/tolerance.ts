/** Tolerances of new thermocouple wire and of the platinum sensor at the reference junction. */
import { degrees, noAnswer, type Refusal, wrongKind } from "../errors";
import { inWords } from "../thermoelectric/designation";
import type { Thermocouple } from "../thermoelectric/thermocouple";
import { astmE230 } from "./classes/astm-e230";
import { iec60584_1 } from "./classes/iec-60584-1";
import { iec60751 } from "./classes/iec-60751";
import { ToleranceClass } from "./tolerance-class";
import { type ToleranceClassName, type ToleranceTable, toleranceClassNames } from "./tolerance-table";

const tables: readonly ToleranceTable[] = [iec60584_1, astmE230, iec60751];

/** The classes of a couple (by its designation) or of "Pt", in the order of the standards. */
const classesBySensor = new Map<string, ToleranceClass[]>();
for (const { standard, sensors } of tables) {
  for (const [designation, { classes }] of Object.entries(sensors)) {
    const known = classesBySensor.get(designation) ?? [];
    for (const name of toleranceClassNames) {
      const parts = classes[name];
      if (parts !== undefined) known.push(new ToleranceClass(designation, name, standard, parts));
    }
    classesBySensor.set(designation, known);
  }
}

export const toleranceClassesOf = (designation: string): readonly ToleranceClass[] =>
  classesBySensor.get(designation) ?? [];

const officialNames = new Map(toleranceClassNames.map((name) => [name.toLowerCase(), name]));

/** Upper or lower case, spaces and a leading word "class" make no difference; undefined for what names no class. */
export const toleranceClassName = (text: string): ToleranceClassName | undefined =>
  officialNames.get(
    text
      .toLowerCase()
      .replace(/\s/g, "")
      .replace(/^class(?=.)/, ""),
  );

export const unknownClass = (text: string, known: readonly string[]): Refusal =>
  wrongKind`tolerance class "${text.trim().slice(0, 30)}" is unknown: ${known.join(", ")}`;

/**
 * The class of that name. `designation` is that of a couple, or "Pt" for a platinum
 * resistance sensor (IEC 60751, wire-wound ranges). Refused: a name that is no class
 * (wrong kind), a class that this sensor does not have (no answer, naming those it has).
 */
export function toleranceClass(designation: string, name: string): ToleranceClass | Refusal {
  const official = toleranceClassName(name);
  if (official === undefined) return unknownClass(name, toleranceClassNames);
  const classes = toleranceClassesOf(designation);
  return classes.find((one) => one.name === official) ?? lacking(designation, official, classes);
}

/** "type J has no class 3: it has class 1 from -40 °C to 750 °C, class 2 from …", those of the standard that has the asked one first. */
function lacking(designation: string, name: ToleranceClassName, classes: readonly ToleranceClass[]): Refusal {
  if (classes.length === 0) return noAnswer`no tolerance class is published for ${inWords(designation)}`;
  const home = tables.find(({ sensors }) =>
    Object.values(sensors).some(({ classes: published }) => published[name] !== undefined),
  ) as ToleranceTable;
  const sameStandard = classes.filter(({ standard }) => standard === home.standard);
  let refusal = noAnswer`${inWords(designation)} has no class ${name}: it has`;
  for (const [i, { name: other, from, to }] of (sameStandard.length > 0 ? sameStandard : classes).entries()) {
    refusal = refusal.and`${i === 0 ? " " : ", "}class ${other} from ${degrees(from)} to ${degrees(to)}`;
  }
  return refusal;
}

/**
 * ± limit in °C of new wire, or of a platinum sensor, whose measuring junction is at `t` °C.
 * Refused: a class that is unknown, that the sensor does not have, or that does not reach `t`.
 */
export function tolerance(designation: string, className: string, t: number): number | Refusal {
  const found = toleranceClass(designation, className);
  return found instanceof ToleranceClass ? found.limit(t) : found;
}

/**
 * The same limit in µV: the limit in °C times the Seebeck coefficient at `t`. The standards
 * give degrees; E(t + limit) − E(t) and E(t) − E(t − limit) differ a little and would make
 * two limits of one, so the one slope is used, as the standards do for cables.
 */
export function toleranceUv(couple: Thermocouple, className: string, t: number): number | Refusal {
  const limit = tolerance(couple.designation, className, t);
  if (typeof limit !== "number") return limit;
  // A class lies inside the reference function; past an end of both by rounding, that end counts for both.
  const inside = Math.min(Math.max(t, couple.low), couple.high);
  return limit * (couple.seebeck(inside) * 1000);
}
