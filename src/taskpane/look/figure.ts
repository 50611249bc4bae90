/** What a picture shows, whatever draws it; the table beneath is made from the same. */
export interface Figure {
  /** States the finding. */
  readonly title: string;
  readonly x: Axis & { readonly values: readonly number[] };
  /** Shown from one value to another where not all of it is. */
  readonly y: Axis & { readonly from?: number; readonly to?: number };
  readonly lines: readonly Line[];
  readonly bands: readonly Band[];
  /** A thin dashed line across, with its name. */
  readonly level?: { readonly value: number; readonly label: string };
  /** A stretch of x that is marked, with its name. */
  readonly stretch?: { readonly from: number; readonly to: number; readonly label: string };
}

export interface Axis {
  /** With its unit. */
  readonly label: string;
  readonly isTime?: boolean;
}

export type Role = "ember" | "slate" | "muted";

export interface Line {
  readonly label: string;
  readonly values: readonly (number | null)[];
  readonly role: Role;
  /** Whether its name stands at its end. */
  readonly named: boolean;
}

export interface Band {
  readonly low: readonly (number | null)[];
  readonly high: readonly (number | null)[];
  readonly label: string;
  readonly role: Role;
}

/** A picture that is drawn in the pane, for those that show it elsewhere. */
export interface DrawnFigure {
  readonly figure: Figure;
  /** Whether it shows the sheet's own readings rather than a published function. */
  readonly ofSheet: boolean;
}
