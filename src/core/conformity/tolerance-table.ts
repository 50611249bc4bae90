/**
 * The published tolerances of new wire and of sensors, as data. Nothing in such a
 * record is computed; tolerance-class.ts evaluates it.
 */
import type { PublicationId } from "../publications";

/** Names of classes in the order in which they are shown. */
export const toleranceClassNames = ["1", "2", "3", "standard", "special", "AA", "A", "B", "C"] as const;

export type ToleranceClassName = (typeof toleranceClassNames)[number];

export interface ToleranceTable {
  readonly standard: PublicationId;
  /** Where in the standard. Titles, where the number of the clause was not seen in print. */
  readonly clause: string;
  /** By designation of the couple, or "Pt" for the resistance sensor at the reference junction. */
  readonly sensors: Readonly<Record<string, SensorTolerances>>;
}

export interface SensorTolerances {
  /** How sure we are of the digits. */
  readonly evidence: string;
  readonly note?: string;
  /** Each class in adjoining parts, rising in temperature. */
  readonly classes: Readonly<Partial<Record<ToleranceClassName, readonly TolerancePart[]>>>;
}

/**
 * ± limit in °C at t °C from `from` to `to`: the larger of `constant` and `proportion`·|t|;
 * but where `beyond` is given, `constant` + `proportion`·(|t| − beyond), the second term
 * for |t| above `beyond` only.
 */
export interface TolerancePart {
  readonly from: number;
  readonly to: number;
  readonly constant: number;
  readonly proportion: number;
  readonly beyond?: number;
  /** Where it differs from that of the sensor. */
  readonly evidence?: string;
}
