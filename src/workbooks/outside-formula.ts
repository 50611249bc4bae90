import { formulaWords, wordAfter } from "./formula-words";

/**
 * Whether a formula takes something from another file or another program: "[Book.xlsx]Sheet!A1" or, as workbook files
 * number their links, "[1]Sheet!A1"; "program|topic!item", the form by which a sheet starts a program. A table's
 * "[column]" is no such link: no "!" follows it.
 */
export function linksOutside(formula: string): boolean {
  const words = formulaWords(formula);
  if (words.some(({ kind, word }) => kind === "sheet" && /[[\]|]/.test(word))) return true;
  const bare = words
    .map(({ kind, word }) => (kind === "text" ? '""' : kind === "sheet" ? "''" : word))
    .join("");
  return bare.includes("|") || /\][^[\]\s'",()+*/^&=<>{};:-]*!/.test(bare);
}

/** Spreadsheets' functions that ask the web, a server or a library of the machine, or run something there. */
const asking: ReadonlySet<string> = new Set(
  `CALL CUBEKPIMEMBER CUBEMEMBER CUBEMEMBERPROPERTY CUBERANKEDMEMBER CUBESET CUBESETCOUNT CUBEVALUE DDE EVALUATE EXEC IMAGE
  REGISTER REGISTER.ID RTD SQL.REQUEST STOCKHISTORY WEBSERVICE`.split(/\s+/),
);

export function asksOutside(formula: string): boolean {
  const words = formulaWords(formula);
  return words.some(
    ({ kind, word }, index) =>
      kind === "name" && asking.has(word.toUpperCase()) && wordAfter(words, index) === "(",
  );
}
