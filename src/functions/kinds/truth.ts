import { Refusal, wrongKind } from "../../core";
import { type Kind, readNumber, shown } from "./kind";

/** TRUE or FALSE, or the words. A number is refused: an empty cell would be read as FALSE. */
export const truth: Kind<boolean> = {
  name: "TRUE or FALSE",
  options: ["TRUE", "FALSE"],
  read(cell, label) {
    const word = String(cell).trim().toUpperCase();
    if (word === "TRUE" || word === "FALSE") return word === "TRUE";
    const given = typeof cell === "number" ? readNumber(cell, label) : `"${shown(word)}"`;
    return given instanceof Refusal ? given : wrongKind`${label}: ${given} is neither TRUE nor FALSE`;
  },
};
