/** The distribution that a stated value is taken from. */
import { type Distribution, distribution as distributionNamed, distributions, noAnswer } from "../../core";
import type { Kind } from "./kind";

export const distribution: Kind<Distribution> = {
  name: "option",
  options: distributions,
  // The desktop hands an empty cell over as 0.
  read: (cell, label) =>
    cell === 0 ? noAnswer`${label} is 0 or an empty cell` : distributionNamed(String(cell)),
};
