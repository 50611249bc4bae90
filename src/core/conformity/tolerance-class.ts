/** A tolerance class of a sensor: its ± limit at a temperature, and where it applies. */
import { degrees, noAnswer, type Refusal } from "../errors";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import type { PublicationId } from "../publications";
import { inWords } from "../thermoelectric/designation";
import type { ToleranceClassName, TolerancePart } from "./tolerance-table";

export class ToleranceClass {
  readonly from: number;
  readonly to: number;

  constructor(
    readonly designation: string,
    readonly name: ToleranceClassName,
    readonly standard: PublicationId,
    private readonly parts: readonly TolerancePart[],
  ) {
    this.from = (parts[0] as TolerancePart).from;
    this.to = (parts[parts.length - 1] as TolerancePart).to;
  }

  covers(t: number): boolean {
    const rounded = toNinthDecimal(t);
    return rounded >= this.from && rounded <= this.to;
  }

  /** ± limit in °C at `t` °C. */
  limit(t: number): number | Refusal {
    if (!this.covers(t)) {
      return noAnswer`temperature ${degrees(t)} is outside class ${this.name} of ${inWords(this.designation)}, ${degrees(this.from)} to ${degrees(this.to)}`;
    }
    const part = this.parts.find(({ to }) => t <= to) ?? (this.parts[this.parts.length - 1] as TolerancePart);
    const size = Math.abs(t);
    return part.beyond === undefined
      ? Math.max(part.constant, part.proportion * size)
      : part.constant + part.proportion * Math.max(0, size - part.beyond);
  }
}
