/** What a survey comes to. */

export type SurveyVerdict = "Fail" | "Incomplete" | "Short" | "Pass";

/** A survey must last so many minutes, unless the caller says otherwise. */
export const REQUIRED_MINUTES = 30;

export interface Evidence {
  /** A reading of the period is out of band, or one before it overshot above the band. */
  readonly outOfBand: boolean;
  /** A reading of the period is missing, or the log has a gap in it. */
  readonly incomplete: boolean;
  /** A single scan lasts no time and is always short. */
  readonly short: boolean;
}

/** The first that applies: Fail, Incomplete, Short, Pass. */
export function surveyVerdict({ outOfBand, incomplete, short }: Evidence): SurveyVerdict {
  if (outOfBand) return "Fail";
  if (incomplete) return "Incomplete";
  return short ? "Short" : "Pass";
}
