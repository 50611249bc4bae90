/** Finds a couple by what people type for it. */
import { furtherCouples, letterTypes } from "./couples";
import type { ReferenceFunction } from "./reference-function";
import { Thermocouple } from "./thermocouple";

/** Upper or lower case, spaces and a leading word "type" make no difference. */
const plain = (name: string): string =>
  name
    .toLowerCase()
    .replace(/\s/g, "")
    .replace(/^type(?=.)/, "");

const references = new Map<string, ReferenceFunction>();
for (const reference of [...letterTypes, ...furtherCouples]) {
  for (const name of [reference.designation, ...reference.otherNames]) references.set(plain(name), reference);
}

const prepared = new Map<ReferenceFunction, Thermocouple>();

/** The couple of that name, prepared once and remembered; undefined when there is none. */
export function thermocouple(name: string): Thermocouple | undefined {
  const reference = references.get(plain(name));
  if (reference === undefined) return undefined;
  let couple = prepared.get(reference);
  if (couple === undefined) {
    couple = new Thermocouple(reference);
    prepared.set(reference, couple);
  }
  return couple;
}

/** "type K" for a letter, the conductors alone for the others, and "Pt". */
export const inWords = (designation: string): string =>
  /^[A-Z](-\d)?$/.test(designation) ? `type ${designation}` : designation;

export const spoken = ({ designation }: Thermocouple): string => inWords(designation);

/** Designations in the order in which they are shown: letter types first. */
export const letterDesignations: readonly string[] = letterTypes.map(({ designation }) => designation);
export const furtherDesignations: readonly string[] = furtherCouples.map(({ designation }) => designation);
