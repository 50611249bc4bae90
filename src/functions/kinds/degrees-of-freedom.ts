import { INFINITE_DOF, wrongKind } from "../../core";
import { type NumberKind, plainNumber, readNumber, shown } from "./kind";

/** A count that may be fractional; 1E+99 stands for infinite. */
export const degreesOfFreedom: NumberKind = {
  ...plainNumber("number"),
  read(cell, label) {
    if (typeof cell === "string" && /^\s*(∞|inf)/i.test(cell))
      return wrongKind`${label}: "${shown(cell)}" is text, not a number: 1E+99 stands for infinite`;
    const count = readNumber(cell, label);
    return typeof count === "number" ? Math.min(count, INFINITE_DOF) : count;
  },
};
