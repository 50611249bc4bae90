/** The tolerance of a survey: one number, or two cells. */
import { type Tolerance, wrongKind } from "../../core";
import type { NumberKind } from "../kinds/kind";
import type { Argument } from "./argument";
import { failed, withoutBlanks } from "./column";

/** Above and below the same, or below and above in two cells. That both are above 0 is the core's to say. */
export const tolerance = (kind: NumberKind): Argument<Tolerance, "column", false> => ({
  shape: "column",
  kind,
  optional: false,
  read(given, label, unit) {
    const values = withoutBlanks(kind)(given, label, unit);
    if (failed(values)) return values;
    if (values.length > 2)
      return wrongKind`${label}: one number, or two cells (below, above), not ${values.length}`;
    const [below, above = below] = values as readonly [number, number?];
    return { below, above };
  },
});
