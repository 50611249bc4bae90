/** The pair between head and terminals: another type, or copper. */
import { type Lead, Refusal, wrongKind } from "../../core";
import { couple, designations } from "./couple";
import type { Kind } from "./kind";

/** Compensating cables (IEC 60584-3: a C after the type's letter) have a tolerance and no function of their own. */
const COMPENSATING = /^(K|N|R|S|B)C[AB]?$/;

/** Extension cables are of the type's own alloys: KX is a run of type K. */
const EXTENSION = /^([BCEJKNRST])X$/;

export const lead: Kind<Lead> = {
  name: "lead",
  options: ["copper", ...designations],
  read(cell, label, unit) {
    const name = String(cell).trim().toUpperCase();
    if (name === "COPPER") return "copper";
    if (COMPENSATING.test(name)) {
      return wrongKind`lead "${name}" is a compensating cable: it has no reference function, only a tolerance (CABLETOLERANCE)`;
    }
    const found = couple.read(EXTENSION.exec(name)?.[1] ?? cell, label, unit);
    return found instanceof Refusal ? found.and`, or copper` : found;
  },
};
