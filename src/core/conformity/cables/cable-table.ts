/** The published tolerances of extension and compensating cables, as data. */
import type { PublicationId } from "../../publications";

/** Names of classes in the order in which they are shown. */
export const cableClassNames = ["1", "2", "standard", "special"] as const;

export interface CableTable {
  readonly standard: PublicationId;
  readonly clause: string;
  readonly evidence: string;
  /** By designation. */
  readonly cables: Readonly<Record<string, Cable>>;
}

export interface Cable {
  /** The letter of the couple that it serves. */
  readonly couple: string;
  /** The cable's own temperature, °C. */
  readonly from: number;
  readonly to: number;
  readonly classes: Readonly<Partial<Record<(typeof cableClassNames)[number], CableTolerance>>>;
  readonly note?: string;
}

/** ± limits as printed. */
export interface CableTolerance {
  /** µV; absent where the standard specifies degrees of the cable's own junctions only. */
  readonly uv?: number;
  /** °C, for a measuring junction at `at` °C where a µV figure stands beside it. */
  readonly degrees: number;
  readonly at?: number;
  /** Where it differs from that of the table. */
  readonly evidence?: string;
}
