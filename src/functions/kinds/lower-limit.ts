import { type LowerLimit, wrongKind } from "../../core";
import { type Kind, readNumber, shown } from "./kind";

/** The lower of two limits: a number, or "none" where there is only an upper one. */
export const lowerLimit: Kind<LowerLimit> = {
  name: "number",
  options: ["none"],
  read(cell, label) {
    if (typeof cell !== "string") return readNumber(cell, label);
    if (cell.trim().toLowerCase() === "none") return "none";
    return wrongKind`${label}: "${shown(cell)}" is neither a number nor none`;
  },
};
