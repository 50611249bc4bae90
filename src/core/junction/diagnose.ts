/** Which single fault would explain a suspicious reading. */
import { Refusal } from "../errors";
import { letterDesignations, spoken, thermocouple } from "../thermoelectric/designation";
import { firstOutside } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";
import { rereferenced, retyped } from "./instrument";
import { releaded } from "./lead";
import { unreversed } from "./polarity";

export interface Explanation {
  /** The fault, in words. */
  readonly fault: string;
  /** The true temperature that it would explain, °C. */
  readonly temperature: number;
  /** That temperature less the expected one, °C. */
  readonly residual: number;
}

/** Types whose extension cable is of the couple's own alloys (IEC 60584-3): the runs that can be mistaken. */
const extensionTypes: ReadonlySet<string> = new Set(["E", "J", "K", "N", "T"]);

/**
 * The faults that this family repairs, each with the true temperature that it would
 * explain, best first: least difference from `expected`. "no fault", the reading as it
 * stands, is among them: what comes after it explains nothing. A fault whose temperature
 * cannot exist, outside a reference function, is no explanation and is left out.
 *
 * All temperatures in °C; `reference` is that of the terminals. The faults of the run to
 * the terminals are weighed only where the `head` temperature is given. Assumes one fault,
 * homogeneous wires, and terminals (and head) at one temperature. Refuses an indicated,
 * reference or head temperature outside the couple's reference function.
 */
export function diagnose(
  indicated: number,
  expected: number,
  couple: Thermocouple,
  reference: number,
  head?: number,
): readonly Explanation[] | Refusal {
  if ([indicated, reference, head ?? reference].some((t) => Number.isNaN(couple.emf(t)))) {
    return firstOutside(
      couple,
      ["indicated temperature", indicated],
      ["reference temperature", reference],
      ["head temperature", head ?? reference],
    );
  }
  const candidates = [
    ...instrumentFaults(indicated, couple, reference),
    ...polarityFaults(indicated, couple, reference, head),
    ...(head === undefined ? [] : leadFaults(indicated, couple, reference, head)),
  ];
  const explanations = candidates.flatMap(([fault, temperature]) =>
    temperature instanceof Refusal ? [] : [{ fault, temperature, residual: temperature - expected }],
  );
  return explanations.sort((a, b) => Math.abs(a.residual) - Math.abs(b.residual));
}

type Candidate = readonly [fault: string, temperature: number | Refusal];

function instrumentFaults(indicated: number, couple: Thermocouple, reference: number): Candidate[] {
  return [
    ["no fault", indicated],
    ["reference junction not compensated", rereferenced(indicated, couple, 0, reference)],
    ["reference junction compensated twice", rereferenced(indicated, couple, reference, 0)],
    ...otherLetterTypes(couple).flatMap((other): Candidate[] => [
      [`instrument set to ${spoken(other)}`, retyped(indicated, other, couple, reference)],
      [`couple is ${spoken(other)}`, retyped(indicated, couple, other, reference)],
    ]),
  ];
}

function polarityFaults(
  indicated: number,
  couple: Thermocouple,
  reference: number,
  head: number | undefined,
): Candidate[] {
  return [
    ["crossed at the terminals", unreversed(indicated, couple, "terminals", reference)],
    ["crossed at the head", unreversed(indicated, couple, "head", reference, head)],
    ["extension crossed at both ends", unreversed(indicated, couple, "both", reference, head)],
  ];
}

function leadFaults(indicated: number, couple: Thermocouple, reference: number, head: number): Candidate[] {
  return [
    ["copper from head to terminals", releaded(indicated, couple, "copper", head, reference)],
    ...otherLetterTypes(couple)
      .filter(({ designation }) => extensionTypes.has(designation))
      .map(
        (other): Candidate => [
          `extension of ${spoken(other)}`,
          releaded(indicated, couple, other, head, reference),
        ],
      ),
  ];
}

const otherLetterTypes = (couple: Thermocouple): Thermocouple[] =>
  letterDesignations.flatMap((name) => {
    const other = thermocouple(name);
    return other === undefined || other === couple ? [] : [other];
  });
