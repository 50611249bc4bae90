import { publications } from "../../core";
import { ifGiven, once } from "../arguments";
import { choice } from "../kinds/kind";
import { wordResult } from "../results";
import { version } from "../version";
import { whole } from "../whole";

/**
 * Version of the functions that calculated this cell, and the standards and publications behind them.
 * @customfunction PROVENANCE
 * @category Record
 * @param [metric] One part: version, or publications (a column).
 * @returns Rows of subject and detail, or the part asked for.
 * @standard The standards and publications that it lists
 * @keywords version, audit, traceability, editions
 * @related TYPEINFO
 * @example =BEAD.PROVENANCE("version") → "0.1.0"
 */
export function PROVENANCE(metric?: unknown[][]): unknown[][] {
  return provenance({ metric });
}

const sources = Object.values(publications);

const provenance = whole(PROVENANCE, {
  arguments: { metric: ifGiven(once(choice(["version", "publications"]))) },
  result: { subject: wordResult, detail: wordResult },
  cells({ metric }) {
    if (metric === "version") return [[version]];
    if (metric === "publications") return sources.map(({ citation }) => [citation]);
    return [
      ["subject", "detail"],
      ["version", version],
      ...sources.map(({ citation, title }) => [citation, title]),
    ];
  },
});
