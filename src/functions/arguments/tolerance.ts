/** The tolerance of a survey: one number, or two cells. */
import { type Tolerance, wrongKind } from "../../core";
import type { NumberKind } from "../kinds/kind";
import type { Argument } from "./argument";
import { column, failed } from "./column";

/** Above and below the same, or below and above in two cells. That both are above 0 is the core's to say. */
export const tolerance = (kind: NumberKind): Argument<Tolerance, "column", false> => ({
  shape: "column",
  kind,
  optional: false,
  read(given, label, unit) {
    const values = column(kind).read(given, label, unit);
    if (failed(values)) return values;
    const [below, above = below, ...more] = values;
    if (below === undefined || above === undefined || more.length > 0)
      return wrongKind`${label}: one number, or two cells (below, above), not ${values.length}`;
    return { below, above };
  },
});
