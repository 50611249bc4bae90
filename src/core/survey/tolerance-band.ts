/** The band about a set point in which every reading of a survey must lie. */
import { degreesApart, type Refusal } from "../errors";
import { refusedSetting } from "../numeric/above-zero";
import { exceeds, type RoundedLimit, roundedLimit } from "../numeric/rounded-limit";
import { celsius, type TemperatureUnit } from "../units";

/** Distances from the set point, °C, both above 0. */
export interface Tolerance {
  readonly below: number;
  readonly above: number;
}

export class ToleranceBand {
  private readonly over: RoundedLimit;
  private readonly under: RoundedLimit;

  /** `unit` is the call's: differences and limits are rounded to 1E-9 of its degree before they are compared. */
  constructor(
    readonly setpoint: number,
    readonly tolerance: Tolerance,
    unit: TemperatureUnit = celsius,
  ) {
    this.over = roundedLimit(tolerance.above, unit.degree);
    this.under = roundedLimit(tolerance.below, unit.degree);
  }

  /** 1 above the band, −1 below it, 0 inside or at a limit. */
  side(temperature: number): -1 | 0 | 1 {
    return this.sideOf(temperature - this.setpoint);
  }

  /** The same for a deviation from the set point. */
  sideOf(deviation: number): -1 | 0 | 1 {
    if (exceeds(deviation, this.over)) return 1;
    return exceeds(-deviation, this.under) ? -1 : 0;
  }

  get width(): number {
    return this.tolerance.below + this.tolerance.above;
  }

  /** Middle of the band: not the set point where the tolerance is uneven. */
  get centre(): number {
    return this.setpoint + (this.tolerance.above - this.tolerance.below) / 2;
  }

  /** Distance of the nearer of two extremes from its limit; below 0 when one lies outside. */
  margin(lowest: number, highest: number): number {
    const { below, above } = this.tolerance;
    return Math.min(above - (highest - this.setpoint), lowest - this.setpoint + below);
  }
}

/** Refuses a tolerance that is not above 0. */
export function toleranceBand(
  setpoint: number,
  tolerance: Tolerance,
  unit: TemperatureUnit = celsius,
): ToleranceBand | Refusal {
  for (const side of [tolerance.below, tolerance.above]) {
    const refused = refusedSetting(side, "tolerance", degreesApart);
    if (refused !== undefined) return refused;
  }
  return new ToleranceBand(setpoint, tolerance, unit);
}
