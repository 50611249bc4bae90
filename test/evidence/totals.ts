/** The head of the page: how many values agree, source by source, and the figures that the README may quote. */
import { letterTypes } from "../../src/core/thermoelectric/couples";
import { ASKED_DIGITS } from "../published/certified";
import { emfTables } from "../published/emf-tables";
import type { Origin } from "../published/published-value";
import type { Evidence } from "./collect";
import { PROMISED_DEGREES, PROMISED_MILLIVOLTS } from "./residuals";

export const originInWords: Readonly<Record<Origin, string>> = {
  print: "print",
  memory: "memory",
  computed: "independent computation",
};

export interface Total {
  readonly source: string;
  readonly origin: Origin;
  readonly values: number;
  readonly agreeing: number;
}

export const BANDS_SOURCE = "NIST SRD 60, inverse approximations";
export const CERTIFIED_SOURCE = "NIST Statistical Reference Datasets";

const agreeing = (rows: readonly { readonly holds: boolean }[]): number =>
  rows.filter(({ holds }) => holds).length;

const total = (source: string, origin: Origin, rows: readonly { readonly holds: boolean }[]): Total => ({
  source,
  origin,
  values: rows.length,
  agreeing: agreeing(rows),
});

export function totals({ sets, bands, certified }: Evidence): Total[] {
  const certifiedFrom = (asked: Origin): typeof certified =>
    certified.filter(({ origin }) => origin === asked);
  return [
    ...sets.map(({ source, origin, rows }) => total(source, origin, rows)),
    total(BANDS_SOURCE, "print", bands),
    total(CERTIFIED_SOURCE, "print", certifiedFrom("print")),
    total(`${CERTIFIED_SOURCE}, sets from memory`, "memory", certifiedFrom("memory")),
  ];
}

/** "1200 of 1200" */
const share = (of: readonly Total[]): string => {
  const sum = (numbers: readonly number[]): number => numbers.reduce((all, one) => all + one, 0);
  return `${sum(of.map((one) => one.agreeing))} of ${sum(of.map(({ values }) => values))}`;
};

const plain = (value: number): string => String(value).replace("e", "E");

const inWords = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];
const tables = new Set(emfTables.map(({ source }) => source));

/** What may be said of the evidence: one sentence for each kind. */
export function findings(evidence: Evidence): string[] {
  const { residuals, certified, bands, misprints } = evidence;
  const each = totals(evidence);
  const from = (asked: Origin): string => share(each.filter(({ origin }) => origin === asked));
  const byDegrees = agreeing(residuals.map((one) => ({ holds: one.holds && one.byDegrees })));
  const fewest = (kind: string): number =>
    // Whole digits; where 0 is certified, and where the readings leave fewer, other counts are asked for.
    Math.floor(
      Math.min(
        ...certified
          .filter((one) => one.kind === kind && one.asked === ASKED_DIGITS)
          .map((one) => one.digits),
      ),
    );
  // The readings of NumAcc3 and 4 are no longer those of the data set once they are doubles.
  const spent = certified
    .filter(({ kind, asked }) => kind === "univariate" && asked < ASKED_DIGITS)
    .map(({ digits }) => Math.floor(digits));
  return [
    `${share(each)} values from outside this program agree with ours within their printed rounding or stated band: ${from("print")} found in print, ${from("memory")} known from memory, ${from("computed")} computed independently. ${share(each.filter(({ source }) => tables.has(source)))} rows of EMF tables are among them.`,
    `The inverse gives a temperature back from its own EMF within ${plain(PROMISED_DEGREES)} °C or, where a couple hardly responds, within ${plain(PROMISED_MILLIVOLTS)} mV, over the whole range of ${agreeing(residuals)} of ${residuals.length} couples (${inWords[letterTypes.length]} letter types and ${residuals.length - letterTypes.length} further): ${byDegrees} keep the first bound everywhere.`,
    `NIST's inverse approximations, less our exact inverse, stay within the error band that NIST prints in ${agreeing(bands)} of ${bands.length} ranges.`,
    `NIST's certified polynomial fits come out to ${fewest("polynomial")} digits or more of 15, means and standard deviations to ${fewest("univariate")}, and to ${spent.join(" and ")} where doubles cannot hold the readings (NumAcc3, NumAcc4).`,
    `${agreeing(misprints)} of ${misprints.length} known misprints and superseded values are told apart from what is right.`,
  ];
}
