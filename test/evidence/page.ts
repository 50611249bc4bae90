/** What the page says, section by section. */
import type { Evidence, JudgedSet } from "./collect";
import { bandSection, certifiedSection, residualSection } from "./pictured-sections";
import { figure, type Section, text, verdict, verdictColumn } from "./section";
import { BANDS_SOURCE, CERTIFIED_SOURCE, originInWords, totals } from "./totals";

export const introduction = [
  "Every value that a test checks against a source outside this program, beside ours. Made by `npm run evidence`; a test fails when a value falls short and when this page is stale.",
  'Each source says where its values come from. "Print": found in a printed or published copy. "Memory": known to the authors but not found in print, or partly so. "Independent computation": from another program, or from another algorithm with more digits, where no print gives enough of them.',
  "A value agrees when ours, unrounded, lies no farther from it than the column “allowed” says: half a unit of the last printed digit unless the source states a bound or rounds on the way. Not on this page, but held by tests: sums worked by hand, properties such as round trips, verdicts in words, and refusals.",
];

const ofSource = (i: number): string => `source-${i + 1}`;

function sources(evidence: Evidence): Section {
  const each = totals(evidence);
  const links = each.map(({ source }, i) =>
    source === BANDS_SOURCE ? "bands" : source.startsWith(CERTIFIED_SOURCE) ? "certified" : ofSource(i),
  );
  return {
    id: "totals",
    level: 2,
    title: "Totals by source",
    text: [],
    table: {
      columns: [text("source"), text("from"), figure("values"), figure("agree")],
      rows: each.map(({ source, origin, values, agreeing }) => [
        source,
        originInWords[origin],
        String(values),
        String(agreeing),
      ]),
      links,
    },
  };
}

const misprintSection = ({ misprints }: Evidence): Section => ({
  id: "misprints",
  level: 2,
  title: "Printed values that we do not follow",
  text: [
    "Misprints, superseded tables and worked examples with a wrong answer. A sheet that was checked against one of them differs from ours, and should. They are not counted above.",
  ],
  table: {
    columns: [
      text("what"),
      text("unit"),
      figure("not"),
      figure("but"),
      figure("ours"),
      text("where it stands"),
      text("why"),
      verdictColumn,
    ],
    rows: misprints.map((one) => [
      one.what,
      one.unit,
      one.misprinted,
      one.right,
      one.ours,
      one.where,
      one.why,
      verdict(one.holds),
    ]),
  },
});

const setSection = ({ source, origin, compared, rows }: JudgedSet, i: number): Section => ({
  id: ofSource(i),
  level: 3,
  title: source,
  text: [`Compared: ${compared}. From ${originInWords[origin]}.`],
  table: {
    columns: [
      text("what"),
      text("unit"),
      figure(origin === "computed" ? "computed" : "published"),
      figure("ours"),
      figure("difference"),
      figure("allowed"),
      verdictColumn,
    ],
    rows: rows.map((one) => [
      one.what,
      one.unit,
      one.published,
      one.ours,
      one.difference,
      one.allowed,
      verdict(one.holds),
    ]),
  },
});

export const sections = (evidence: Evidence): Section[] => [
  sources(evidence),
  residualSection(evidence),
  bandSection(evidence),
  certifiedSection(evidence),
  misprintSection(evidence),
  { id: "values", level: 2, title: "Every value, source by source", text: [] },
  ...evidence.sets.map(setSection),
];
