/** Whatever a worksheet, another program or a careless person can put into a cell or hand over as a range. */
import fc from "fast-check";
import { errorCell } from "../functions/call";

/** Names that an object has without being given them: an option looked up in a plain object would find these. */
const PROTOTYPE_NAMES = ["constructor", "__proto__", "toString", "hasOwnProperty", "valueOf", "prototype"];

const WORDS = [
  ...[
    "K",
    "b",
    " type N ",
    "Au/Pt",
    "L",
    "Pt",
    "KX",
    "copper",
    "C",
    "F",
    "K",
    "R",
    "uV",
    "degrees",
    "1",
    "2",
  ],
  ...[
    "standard",
    "guarded",
    "guarded 0.83",
    "guarded 1e999",
    "guarded -1",
    "none",
    "both",
    "TRUE",
    "h",
    "min",
  ],
  ...["linear", "smooth", "fit3", "correction", "error", "true", "rectangular", "normal", "1%", "covariance"],
  ...[
    "NaN",
    "Infinity",
    "1,5",
    "1e5",
    "−40",
    " ",
    "\t\n",
    "\u0000",
    "\ud800",
    "=1+1",
    "#N/A",
    "<b>",
    "∞",
    "°",
  ],
];

const NUMBERS = [
  ...[0, -0, 1, -1, 0.5, 2, 3, 20, 25, 100, 273.15, -273.15, 1e-9, 5e-324, -5e-324, 2.2250738585072014e-308],
  ...[1e15, 2 ** 53, 2 ** 53 + 2, 1e99, 1e100, 1e150, -1e150, 1e154, 1e200, 1e300, 1.7976931348623157e308],
  // Dates and times as a sheet holds them: 1900, today, the last one, a time of day.
  ...[1, 45000, 45000.75, 2958465.99999, 0.9999884259259259],
];

const errorCodes = [
  "#N/A",
  "#VALUE!",
  "#DIV/0!",
  "#NUM!",
  "#NULL!",
  "#REF!",
  "#NAME?",
  "#SPILL!",
  "constructor",
];

const number = fc.oneof(
  { weight: 3, arbitrary: fc.double({ min: -50, max: 1500, noNaN: true }) },
  { weight: 2, arbitrary: fc.constantFrom(...NUMBERS) },
  { weight: 1, arbitrary: fc.double() },
);

const text = fc.oneof(
  { weight: 6, arbitrary: fc.constantFrom(...WORDS) },
  { weight: 2, arbitrary: fc.constantFrom(...PROTOTYPE_NAMES) },
  { weight: 2, arbitrary: fc.string({ unit: "binary", maxLength: 30 }) },
  // The longest text of a cell, in forms on which a careless pattern would take for ever.
  { weight: 1, arbitrary: fc.constantFrom("x", " ", "1", "guarded ", "type ", "\u00a0", "a/").map(longest) },
);

function longest(part: string): string {
  return part.repeat(Math.ceil(32767 / part.length)).slice(0, 32767);
}

const error = fc
  .constantFrom(...errorCodes)
  .chain((code) =>
    fc.constantFrom<unknown>(
      errorCell(code),
      errorCell(code, "what another add-in said"),
      { code },
      { type: "Error", basicType: "Error", basicValue: code, errorType: code },
    ),
  );

const dataType = fc.constantFrom<unknown>(
  { type: "FormattedNumber", basicType: "Double", basicValue: 21.5, numberFormat: "0.0" },
  { type: "String", basicType: "String", basicValue: "K" },
  { type: "Empty", basicType: "Empty", basicValue: "" },
  {
    type: "Entity",
    basicType: "Error",
    basicValue: "#VALUE!",
    text: "x",
    properties: { a: { basicValue: 1 } },
  },
  { type: "Array", basicType: "Error", basicValue: "#VALUE!", elements: [[{ basicValue: 1 }]] },
);

const junk = fc.constantFrom<unknown>(
  ...[undefined, [], [[]], [[1]], {}, { code: 5 }, { basicValue: {} }, { basicValue: { basicValue: 1 } }],
  ...[new Date(0), 10n, Symbol("cell"), () => 1, Object.create(null), /x/, new Map(), Number.NaN, -1 / 0],
);

export const cell: fc.Arbitrary<unknown> = fc.oneof(
  { weight: 10, arbitrary: number },
  { weight: 4, arbitrary: text },
  { weight: 3, arbitrary: fc.constantFrom<unknown>("", null) },
  { weight: 1, arbitrary: fc.boolean() },
  { weight: 1, arbitrary: error },
  { weight: 1, arbitrary: dataType },
  { weight: 1, arbitrary: junk },
);

const rectangle = fc
  .tuple(fc.integer({ min: 1, max: 7 }), fc.integer({ min: 1, max: 4 }), fc.constantFrom(number, cell))
  .chain(([rows, columns, content]) => {
    const exactly = (length: number) => ({ minLength: length, maxLength: length });
    return fc.array(fc.array(content, exactly(columns)), exactly(rows));
  });

/** What is handed over for one argument: most often a range, else nothing, or no range at all. */
export const argument: fc.Arbitrary<unknown> = fc.oneof(
  { weight: 8, arbitrary: rectangle },
  { weight: 6, arbitrary: cell.map((alone) => [[alone]]) },
  { weight: 3, arbitrary: fc.constantFrom(null, undefined) },
  {
    weight: 1,
    arbitrary: fc.constantFrom<unknown>([], [[]], [[], []], [[1, 2], [3]], [[1], [2, 3]], [1, [2]]),
  },
  { weight: 1, arbitrary: cell },
);
