/** Tolerances of extension and compensating cables. */
import { degrees, measured, noAnswer, Refusal, wrongKind } from "../errors";
import { seebeckAt } from "../thermoelectric/convert";
import { thermocouple } from "../thermoelectric/designation";
import type { Thermocouple } from "../thermoelectric/thermocouple";
import { astmE230Cables } from "./cables/astm-e230";
import { type Cable, type CableTable, type CableTolerance, cableClassNames } from "./cables/cable-table";
import { iec60584_3 } from "./cables/iec-60584-3";
import { toleranceClassName, unknownClass } from "./tolerance";

const tables: readonly CableTable[] = [iec60584_3, astmE230Cables];

/** Designations as they are shown, each once. */
export const cableDesignations: readonly string[] = [
  ...new Set(tables.flatMap(({ cables }) => Object.keys(cables))),
];

interface Found {
  readonly designation: string;
  readonly cable: Cable;
  readonly tolerance: CableTolerance;
}

/** The row of one cable and class in the standard that has this class. */
function find(designation: string, className: string): Found | Refusal {
  const name = designation.toUpperCase().replace(/\s/g, "");
  if (!cableDesignations.includes(name)) {
    return wrongKind`cable "${designation.trim().slice(0, 30)}" is unknown: ${cableDesignations.join(" ")}`;
  }
  const wanted = toleranceClassName(className);
  const asked = cableClassNames.find((known) => known === wanted);
  if (asked === undefined) return unknownClass(className, cableClassNames);
  const offered: string[] = [];
  for (const { cables } of tables) {
    const cable = Object.hasOwn(cables, name) ? cables[name] : undefined;
    if (cable === undefined) continue;
    const tolerance = cable.classes[asked];
    if (tolerance !== undefined) return { designation: name, cable, tolerance };
    offered.push(...cableClassNames.filter((known) => cable.classes[known] !== undefined));
  }
  return noAnswer`${name} has no class ${asked}: it has class ${offered.join(", ")}`;
}

/**
 * ± limit in µV of a new cable, as specified. ASTM specifies its base-metal cables in degrees
 * of their own junctions: for them `temperature`, that of the head in °C and within the
 * cable's range, is needed, and the limit is the degrees times the Seebeck coefficient there;
 * for all others it is of no account.
 * Refused: an unknown cable or class (wrong kind); a class that the cable does not have.
 */
export function cableToleranceUv(
  designation: string,
  className: string,
  temperature?: number,
): number | Refusal {
  const found = find(designation, className);
  if (found instanceof Refusal) return found;
  const { cable, tolerance } = found;
  if (tolerance.uv !== undefined) return tolerance.uv;
  if (temperature === undefined) {
    return noAnswer`${found.designation} is specified in degrees of its own junctions: for µV give the temperature of the head, ${degrees(cable.from)} to ${degrees(cable.to)}`;
  }
  if (!(temperature >= cable.from && temperature <= cable.to)) {
    return noAnswer`temperature of the head ${degrees(temperature)} is outside the range of ${found.designation}, ${degrees(cable.from)} to ${degrees(cable.to)}`;
  }
  // The range of a cable lies inside the reference function of its couple.
  return tolerance.degrees * ((thermocouple(cable.couple) as Thermocouple).seebeck(temperature) * 1000);
}

/**
 * ± limit in °C that the cable adds to a measured temperature: as printed when `temperature`
 * is left out (for the measuring-junction temperature of the standard), otherwise the µV of the
 * specification over the Seebeck coefficient at the measuring junction's `temperature` °C.
 * Refused: an unknown cable or class (wrong kind); a class that the cable does not have; a
 * temperature outside the couple's range, or given for a cable that is not specified in µV.
 */
export function cableToleranceDegrees(
  designation: string,
  className: string,
  temperature?: number,
): number | Refusal {
  const found = find(designation, className);
  if (found instanceof Refusal) return found;
  const { cable, tolerance } = found;
  if (temperature === undefined) return tolerance.degrees;
  if (tolerance.uv === undefined) {
    return noAnswer`${found.designation} is specified in degrees of its own junctions, not in µV: leave the temperature out`;
  }
  const slope = seebeckAt(thermocouple(cable.couple) as Thermocouple, temperature);
  if (typeof slope !== "number") return slope;
  if (!(slope > 0)) {
    return noAnswer`${measured(tolerance.uv, "µV")} is no temperature at ${degrees(temperature)}: type ${cable.couple} hardly gives EMF there`;
  }
  return tolerance.uv / slope;
}
