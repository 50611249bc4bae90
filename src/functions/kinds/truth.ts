import { wrongKind } from "../../core";
import { type Kind, shown } from "./kind";

/** TRUE or FALSE, or the words. A number is refused: an empty cell would be read as FALSE. */
export const truth: Kind<boolean> = {
  name: "TRUE or FALSE",
  options: ["TRUE", "FALSE"],
  read(cell, label) {
    if (typeof cell === "boolean") return cell;
    const word = String(cell).trim().toUpperCase();
    if (typeof cell === "string" && (word === "TRUE" || word === "FALSE")) return word === "TRUE";
    return wrongKind`${label}: ${typeof cell === "number" ? String(cell) : `"${shown(word)}"`} is neither TRUE nor FALSE`;
  },
};
