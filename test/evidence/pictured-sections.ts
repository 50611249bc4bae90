/** The sections with pictures: residuals of the inverse, published bands, certified digits. */
import { short } from "../published/published-value";
import type { Evidence } from "./collect";
import { PROMISED_DEGREES, PROMISED_MILLIVOLTS } from "./residuals";
import { figure, type Section, text, verdict, verdictColumn } from "./section";
import { CERTIFIED_SOURCE, originInWords } from "./totals";

export const residualSection = ({ residuals }: Evidence): Section => ({
  id: "residuals",
  level: 2,
  title: "The inverse over each couple's whole range",
  text: [
    "Each couple at 401 temperatures, evenly over its range: its EMF by our function, turned back into a temperature by our inverse, and held against an evaluation of the published function with 50 digits. The pictures show the size of the residual on a logarithmic scale that begins at 1E-15 °C; the pale band is what we promise. The table gives the largest residual of the inverse, in °C and in mV, and the largest error of E(t) itself.",
    `Promised are ${short(PROMISED_DEGREES)} °C or, where a couple hardly responds and a double cannot tell temperatures so near apart, ${short(PROMISED_MILLIVOLTS)} mV.`,
  ],
  plots: "residuals",
  table: {
    columns: [
      text("couple"),
      figure("from °C"),
      figure("to °C"),
      figure("inverse, °C"),
      figure("inverse, mV"),
      figure("E(t), mV"),
      text("promise kept in"),
      verdictColumn,
    ],
    rows: residuals.map((one) => [
      one.name,
      String(Number(one.low.toFixed(3))),
      String(one.high),
      short(one.worstDegrees),
      short(one.worstMillivolts),
      short(one.worstEmf),
      one.byDegrees ? "°C" : "mV",
      verdict(one.holds),
    ]),
  },
});

export const bandSection = ({ bands }: Evidence): Section => ({
  id: "bands",
  level: 2,
  title: "NIST's inverse approximations",
  text: [
    "NIST SRD 60 prints, for the types of its Monograph 175, polynomials that give the temperature from the EMF roughly, each with the band in which its error lies. In the pictures that band is pale, and the curve is the polynomial as printed less our exact inverse. It must stay within that band, to half a unit of the band's last digit: an inverse that is wrong by more than that would show.",
  ],
  plots: "bands",
  table: {
    columns: [
      text("type"),
      figure("from mV"),
      figure("to mV"),
      figure("printed band, °C"),
      figure("found, °C"),
      figure("rounding of the band, °C"),
      verdictColumn,
    ],
    rows: bands.map(({ type, emfRange: [from, to], errorBand, rounding, least, most, holds }) => {
      const places = -Math.floor(Math.log10(2 * rounding)) + 2;
      return [
        type,
        String(from),
        String(to),
        `${errorBand[0]} to ${errorBand[1]}`,
        `${least.toFixed(places)} to ${most.toFixed(places)}`,
        `± ${rounding}`,
        verdict(holds),
      ];
    }),
  },
});

/** As many digits as are certified, without an exponent where there need be none. */
const fifteen = (value: number): string =>
  value === 0 ? "0" : String(Number(value.toPrecision(15))).replace("e", "E");

export const certifiedSection = ({ certified }: Evidence): Section => ({
  id: "certified",
  level: 2,
  title: CERTIFIED_SOURCE,
  text: [
    "Polynomial fits and univariate statistics by our functions, beside NIST's certified values: the digits that agree, of 15, rounded down. More than 13 are asked for; more than 9 of the largest y where 0 is certified; and so many as the readings leave once they are doubles, 9 and 8, for the standard deviations of NumAcc3 and NumAcc4. Each dot is a value; slate ones are those of which fewer are asked.",
  ],
  plots: "digits",
  table: {
    columns: [
      text("set"),
      text("what"),
      text("from"),
      figure("certified"),
      figure("ours"),
      figure("digits"),
      figure("asked: more than"),
      verdictColumn,
    ],
    rows: certified.map((one) => [
      one.set,
      one.what,
      originInWords[one.origin],
      fifteen(one.certified),
      one.certified === 0 ? short(one.ours) : fifteen(one.ours),
      one.digits.toFixed(1),
      String(one.asked),
      verdict(one.holds),
    ]),
  },
});
