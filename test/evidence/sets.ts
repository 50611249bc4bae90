/** Every set of published values that the tests hold, in the order of the page. */
import { calibrationSets } from "../published/calibration";
import { conversionSets } from "../published/conversions";
import { decisionSets } from "../published/decision-rules";
import { distributionSets } from "../published/distributions";
import { eaSets } from "../published/ea-4-02";
import { emfSets } from "../published/emf-tables";
import { gumSets } from "../published/gum";
import { gumH1Sets } from "../published/gum-h1";
import { gumH2Sets } from "../published/gum-h2";
import { conformitySets } from "../published/jcgm-106";
import { landmarkSets } from "../published/landmarks";
import { lethalitySets } from "../published/lethality";
import { platinumSets } from "../published/platinum";
import type { PublishedSet } from "../published/published-value";
import { scaleSets } from "../published/scale-differences";
import { surveySets } from "../published/survey";
import { tableG2Sets } from "../published/table-g2";
import { thermistorSets } from "../published/thermistor";
import { toleranceSets } from "../published/tolerance-sets";
import { wiringSets } from "../published/wiring";

export const publishedSets: readonly PublishedSet[] = [
  ...emfSets,
  ...landmarkSets,
  ...conversionSets,
  ...wiringSets,
  ...platinumSets,
  ...thermistorSets,
  ...scaleSets,
  ...toleranceSets,
  ...decisionSets,
  ...conformitySets,
  ...gumSets,
  ...gumH1Sets,
  ...gumH2Sets,
  ...calibrationSets,
  ...tableG2Sets,
  ...eaSets,
  ...lethalitySets,
  ...surveySets,
  ...distributionSets,
];
