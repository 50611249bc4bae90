/** Reference function of industrial platinum resistance sensors. */
import type { PublicationId } from "../publications";

export interface PlatinumFunction {
  readonly publication: PublicationId;
  readonly evidence: string;
  /** °C */
  readonly from: number;
  /** °C */
  readonly to: number;
  /** per °C */
  readonly a: number;
  /** per °C² */
  readonly b: number;
  /** per °C⁴, below 0 °C only */
  readonly c: number;
}

export const platinum: PlatinumFunction = {
  publication: "iec60751",
  evidence: "five copies agree",
  from: -200,
  to: 850,
  a: 3.9083e-3,
  b: -5.775e-7,
  c: -4.183e-12,
};
