/**
 * Thermistor at the reference junction.
 *
 * J. S. Steinhart, S. R. Hart, Deep-Sea Res. 15 (1968) 497–503:
 * 1/T = A + B ln(R/Ω) + C ln³(R/Ω), T in K. The beta equation,
 * 1/T = 1/298.15 K + ln(R/R25)/β, is the same with C = 0.
 */
import { degrees, measured, noAnswer, type Refusal, wrongKind } from "../errors";
import { signChange } from "../numeric/root";

const ZERO_CELSIUS = 273.15;
const ROOM = 25;

/** No thermistor is used beyond these, °C: a resistance that says so is an open or a shorted sensor. */
const COLDEST = -100;
const HOTTEST = 350;

/** From here to there, °C, the curve of a believable set of coefficients must not turn back. */
const SURELY_FROM = -40;
const SURELY_TO = 125;

/** What thermistors are made with, and room to spare: resistance in Ω at 25 °C, and beta in K. */
const LEAST_R25 = 1;
const MOST_R25 = 1e8;
const LEAST_BETA = 1000;
const MOST_BETA = 8000;

/** ln(R/Ω) of any resistance that could be measured, 1 mΩ to 1 TΩ. */
const LEAST_LOG = Math.log(1e-3);
const MOST_LOG = Math.log(1e12);

/** A thermistor whose coefficients have been believed. */
export class Thermistor {
  /** ln R between which the resistance falls with the temperature. */
  private readonly fallsFrom: number;
  private readonly fallsTo: number;

  constructor(
    private readonly a: number,
    private readonly b: number,
    private readonly c: number,
  ) {
    // The slope B + 3C ln²R passes zero at ± this.
    const turn = Math.sqrt(-b / (3 * c));
    this.fallsFrom = b <= 0 ? Math.max(turn, LEAST_LOG) : c < 0 ? Math.max(-turn, LEAST_LOG) : LEAST_LOG;
    this.fallsTo = c < 0 ? Math.min(turn, MOST_LOG) : MOST_LOG;
  }

  /**
   * Temperature in °C from a resistance in Ω. Refuses a resistance that is not above 0,
   * and one whose temperature would lie outside −100 to 350 °C or past a turn of the curve.
   */
  temperature(resistance: number): number | Refusal {
    if (!(resistance > 0)) {
      return resistance === 0
        ? noAnswer`resistance is 0 or an empty cell`
        : noAnswer`resistance ${measured(resistance, "Ω")} is not above 0`;
    }
    const log = Math.log(resistance);
    if (log >= this.fallsFrom && log <= this.fallsTo) {
      const t = 1 / this.reciprocal(log) - ZERO_CELSIUS;
      if (t >= COLDEST && t <= HOTTEST) return t;
    }
    return noAnswer`resistance ${measured(resistance, "Ω")} is outside what this thermistor can have from ${degrees(COLDEST)} to ${degrees(HOTTEST)}`;
  }

  /** ln(R/Ω) at `t` °C; undefined where no resistance gives that temperature. */
  logResistance(t: number): number | undefined {
    const wanted = 1 / (t + ZERO_CELSIUS);
    const missing = (log: number): number => this.reciprocal(log) - wanted;
    // Written so that coefficients which make no curve at all fail too.
    if (!(missing(this.fallsFrom) < 0 && missing(this.fallsTo) > 0)) return undefined;
    return signChange(missing, this.fallsFrom, this.fallsTo);
  }

  /** Beta at a place of the curve, d ln R/d(1/T), K. */
  beta(log: number): number {
    return 1 / (this.b + 3 * this.c * log * log);
  }

  private reciprocal(log: number): number {
    return this.a + log * (this.b + this.c * log * log);
  }
}

/**
 * A thermistor by its coefficients: three, A, B and C of Steinhart and Hart for R in Ω
 * and T in K, or two, the resistance at 25 °C in Ω and beta in K. Refuses a set that no
 * thermistor has: a resistance at 25 °C outside 1 Ω to 100 MΩ, a beta there outside
 * 1000 to 8000 K, or a curve that turns back between −40 and 125 °C.
 */
export function thermistor(coefficients: readonly number[]): Thermistor | Refusal {
  if (coefficients.length === 2) {
    const [r25, beta] = coefficients as [number, number];
    const slope = 1 / beta;
    const offset = 1 / (ROOM + ZERO_CELSIUS) - slope * Math.log(r25);
    return disbelieved(r25, beta) ?? new Thermistor(offset, slope, 0);
  }
  if (coefficients.length !== 3) {
    return wrongKind`thermistor coefficients: ${coefficients.length} given, not 3 (A, B, C) or 2 (resistance at 25 °C and beta)`;
  }
  const sensor = new Thermistor(...(coefficients as [number, number, number]));
  const log25 = sensor.logResistance(ROOM);
  if (log25 === undefined) {
    return wrongKind`thermistor coefficients: no resistance gives ${degrees(ROOM)}; A, B and C are needed in this order, for Ω and K`;
  }
  const refusal = disbelieved(Math.exp(log25), sensor.beta(log25));
  if (refusal !== undefined) return refusal;
  const turnsAt = [SURELY_FROM, SURELY_TO].find((t) => sensor.logResistance(t) === undefined);
  return turnsAt === undefined
    ? sensor
    : wrongKind`thermistor coefficients: the curve turns back before it reaches ${degrees(turnsAt)}`;
}

/** Why no thermistor has these, if none has. */
function disbelieved(r25: number, beta: number): Refusal | undefined {
  if (!(r25 >= LEAST_R25 && r25 <= MOST_R25)) {
    return wrongKind`thermistor coefficients: no thermistor has ${measured(r25, "Ω")} at ${degrees(ROOM)}`;
  }
  if (!(beta >= LEAST_BETA && beta <= MOST_BETA)) {
    return wrongKind`thermistor coefficients: no thermistor has a beta of ${measured(beta, "K")} at ${degrees(ROOM)}`;
  }
  return undefined;
}
