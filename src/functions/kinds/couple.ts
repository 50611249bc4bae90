/** A thermocouple type: a letter, or the conductors of a couple that has none. */
import {
  furtherDesignations,
  letterDesignations,
  type Refusal,
  type Thermocouple,
  thermocouple,
  wrongKind,
} from "../../core";
import { type Kind, shown } from "./kind";

/** Single letters that name different couples in different standards are not guessed. */
const AMBIGUOUS: ReadonlyMap<string, string> = new Map([
  ["L", "Chromel/Copel"],
  ["M", "Cu/Copel"],
]);

function unknown(text: string): Refusal {
  const meant = AMBIGUOUS.get(text.trim().toUpperCase());
  if (meant !== undefined) {
    return wrongKind`type "${text.trim()}" means different couples in different standards: write "${meant}" for that of GOST R 8.585`;
  }
  return wrongKind`type "${shown(text)}" is unknown: ${letterDesignations.join(" ")}, or conductors such as Au/Pt`;
}

export const designations = [...letterDesignations, ...furtherDesignations];

export const couple: Kind<Thermocouple> = {
  name: "thermocouple type",
  options: designations,
  read(cell) {
    return thermocouple(String(cell)) ?? unknown(String(cell));
  },
};
