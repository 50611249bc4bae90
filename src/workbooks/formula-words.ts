/** A formula cut into words, so that a change of names cannot reach into a text or a sheet's name. */
export interface FormulaWord {
  kind: "text" | "sheet" | "name" | "number" | "sign";
  word: string;
}

const words =
  /(?<text>"(?:[^"]|"")*")|(?<sheet>'(?:[^']|'')*')|(?<name>[\p{L}_\\][\p{L}\p{N}_.\\?]*)|(?<number>(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)|(?<sign>.)/gisu;

export const formulaWords = (formula: string): FormulaWord[] =>
  [...formula.matchAll(words)].map(({ 0: word, groups }) => ({
    kind: Object.entries(groups!).find(([, found]) => found !== undefined)![0] as FormulaWord["kind"],
    word,
  }));

/** The next word that is no white space. */
export function wordAfter(list: readonly FormulaWord[], index: number): string | undefined {
  let at = index + 1;
  while (/^\s$/.test(list[at]?.word ?? "")) at++;
  return list[at]?.word;
}
