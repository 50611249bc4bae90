import { type FormulaWord, formulaWords, wordAfter } from "./formula-words";
import { prefixes } from "./prefixed-functions";

/** How Excel stores the namespace of our functions: BEAD.EMF( as _xldudf_BEAD_EMF(. */
const namespace = "BEAD.";
const storedNamespace = "_xldudf_BEAD_";

/** A formula as it is typed, in the form in which workbook files hold it. */
export function toStored(formula: string): string {
  const words = formulaWords(formula.replace(/^=/, ""));
  const variables = variablesOf(words);
  return words.map((each, index) => storedWord(each, words, index, variables)).join("");
}

function storedWord(
  { kind, word }: FormulaWord,
  words: readonly FormulaWord[],
  index: number,
  variables: ReadonlySet<string>,
): string {
  if (kind !== "name") return word;
  const [before, after] = [words[index - 1]?.word, words[index + 1]?.word];
  const name = word.toUpperCase();
  if (variables.has(name) && before !== "$" && after !== "$" && after !== "!") return `_xlpm.${word}`;
  if (wordAfter(words, index) !== "(") return word;
  if (name.startsWith(namespace)) {
    return storedNamespace + name.slice(namespace.length).replaceAll(".", "_");
  }
  return `${prefixes.get(name) ?? ""}${word}`;
}

/** The names that LET and LAMBDA give: each argument but the last, of LET every second. */
function variablesOf(words: readonly FormulaWord[]): Set<string> {
  const found = new Set<string>();
  const open: { by: string; argument: number }[] = [];
  words.forEach(({ kind, word }, index) => {
    if (word === "(" || word === "{")
      open.push({ by: words[index - 1]?.word.toUpperCase() ?? "", argument: 0 });
    else if (word === ")" || word === "}") open.pop();
    else if (word === ",") open.at(-1)!.argument++;
    else if (kind === "name" && wordAfter(words, index) === ",") {
      const { by, argument } = open.at(-1) ?? { by: "", argument: 0 };
      const begins = /^[,(\s]$/.test(words[index - 1]?.word ?? "");
      if (begins && (by === "LAMBDA" || (by === "LET" && argument % 2 === 0))) found.add(word.toUpperCase());
    }
  });
  return found;
}

/** A stored formula as it is typed, with its "=". */
export const fromStored = (stored: string): string =>
  `=${formulaWords(stored)
    .map(({ kind, word }) => (kind === "name" ? typedName(word) : word))
    .join("")}`;

const typedName = (word: string): string =>
  word.replace(/^(_xlfn\.|_xlws\.|_xlpm\.)+/i, "").replace(/^_xldudf_BEAD_/i, namespace);

/** These give one value of plain ranges. */
const summing = /\b(MIN|MAX|SUM|AVERAGE|COUNT|COUNTA|COUNTBLANK)\([\w.!$:,]*\)/gi;

/**
 * Whether a formula could fill more than one cell. Excel stores such a one as a dynamic array; stored as an ordinary
 * formula it would come back with an @ before each function of ours, which takes one cell of a block.
 */
export function couldSpill(formula: string): boolean {
  const bare = formulaWords(formula)
    .filter(({ kind }) => kind !== "text" && kind !== "sheet")
    .map(({ word }) => word)
    .join("");
  return /[\w.]\(|[:{#]/.test(bare.replace(summing, "1"));
}
