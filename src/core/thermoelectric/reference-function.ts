/**
 * The published reference function of a couple, as data: EMF in mV over the
 * temperature of the measuring junction in °C, reference junction at 0 °C.
 * Nothing in such a record is computed; code only evaluates it.
 */
import type { PublicationId } from "../publications";

export interface ReferenceFunction {
  /** The name a sheet uses: a letter of IEC 60584-1, or the conductors, positive one first. */
  readonly designation: string;
  /** Further spellings that are understood. */
  readonly otherNames: readonly string[];
  /** Positive / negative conductor. */
  readonly conductors: string;
  /** Temperature scale of t. */
  readonly scale: string;
  /** The standard that specifies the couple. */
  readonly standard: PublicationId;
  /** Where the coefficients were printed. */
  readonly publication: PublicationId;
  /** How sure we are of the digits: how many printed copies were compared, what is from memory. */
  readonly evidence: string;
  /** What a careful reader should know of this function. */
  readonly note?: string;
  /** Adjoining, rising in temperature. */
  readonly segments: readonly PublishedSegment[];
}

export interface PublishedSegment {
  /** °C */
  readonly from: number;
  /** °C */
  readonly to: number;
  /** mV per °Cⁱ, ascending. */
  readonly coefficients: readonly number[];
  /** a0·exp(a1·(t − a2)²), added to the polynomial. */
  readonly exponential?: { readonly a0: number; readonly a1: number; readonly a2: number };
}
