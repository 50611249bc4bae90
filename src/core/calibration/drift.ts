/** What two calibrations of one sensor say of its drift. */
import { degreesApart, noAnswer, type Refusal, wrongKind } from "../errors";
import { countRefused, orderRefused } from "./points";

const DAYS_A_YEAR = 365.25;

/** Differences in °C are compared after rounding to this. */
const ROUNDING = 1e9;

/** Serial of 9999-12-31, the last day that a worksheet knows. */
const LAST_DAY = 2_958_465;

/** One calibration: its day, as a date serial, and the correction or error in °C at each point. */
export interface Calibration {
  readonly date: number;
  readonly values: readonly number[];
}

export interface PointDrift {
  /** °C */
  readonly point: number;
  /** Second less first value, °C. */
  readonly drift: number;
  /** °C per year of 365.25 days. */
  readonly perYear: number;
  /** Date serial at which the value reaches its limit, at this rate. */
  readonly leavesLimitOn: number | Refusal;
}

/**
 * Drift at each point (°C) between two calibrations of one sensor, and the date at which
 * its value would leave ± its limit (°C; one for all points, or one for each) if it went
 * on at the same rate from the second calibration.
 *
 * No date where it never would (no drift, or only after the year 9999), where it is
 * already out, or without a limit. Refuses points that do not rise or fall strictly,
 * columns of different length, limits not above 0, and a second date not after the first.
 */
export function calibrationDrift(
  points: readonly number[],
  first: Calibration,
  second: Calibration,
  limits?: readonly number[],
): readonly PointDrift[] | Refusal {
  const refusal =
    countRefused(points, first.values, "first values") ??
    countRefused(points, second.values, "second values") ??
    orderRefused(points) ??
    limitsRefused(points, limits);
  if (refusal !== undefined) return refusal;
  const days = second.date - first.date;
  if (!(days > 0)) return wrongKind`the second date is not after the first`;
  const rows = points.map((point, i) => {
    const value = second.values[i] as number;
    const drift = value - (first.values[i] as number);
    const limit = limits?.length === 1 ? limits[0] : limits?.[i];
    return {
      point,
      drift,
      perYear: (drift / days) * DAYS_A_YEAR,
      leavesLimitOn: leavingDate(value, drift / days, limit, second.date),
    };
  });
  const finite = rows.every(({ perYear }) => Number.isFinite(perYear));
  return finite ? rows : noAnswer`the drift per year is too large`;
}

function leavingDate(
  value: number,
  perDay: number,
  limit: number | undefined,
  from: number,
): number | Refusal {
  if (limit === undefined) return noAnswer`no limit is given`;
  if (Math.round((Math.abs(value) - limit) * ROUNDING) > 0) {
    return noAnswer`already outside its limit: ${degreesApart(value)} against ± ${degreesApart(limit)}`;
  }
  if (perDay === 0) return noAnswer`no drift: it never leaves its limit`;
  const date = from + Math.max(0, (limit - Math.sign(perDay) * value) / Math.abs(perDay));
  return date <= LAST_DAY ? date : noAnswer`at this drift it does not leave its limit before the year 10000`;
}

function limitsRefused(
  points: readonly number[],
  limits: readonly number[] | undefined,
): Refusal | undefined {
  if (limits === undefined) return undefined;
  const bad = limits.findIndex((limit) => !(limit > 0));
  if (bad >= 0) {
    const limit = limits[bad] as number;
    return limit === 0
      ? wrongKind`limit ${bad + 1} is 0 or an empty cell`
      : wrongKind`limit ${bad + 1} is ${degreesApart(limit)}, not above 0`;
  }
  return limits.length === 1 ? undefined : countRefused(points, limits, "limits");
}
