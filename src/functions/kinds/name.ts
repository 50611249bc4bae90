import { wrongKind } from "../../core";
import type { Kind } from "./kind";

/** What something is called: a text, or a number that is kept as one. */
export const name: Kind<string | number> = {
  name: "text",
  read: (cell, label) =>
    typeof cell === "boolean" ? wrongKind`${label}: ${cell ? "TRUE" : "FALSE"}, not a name` : cell,
};
