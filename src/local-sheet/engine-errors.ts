/** What the sheet itself means by an error that no function of ours explains: what, and what to do. */
const meanings: Record<string, string> = {
  "#SPILL!": "the result needs more cells than are free. Clear the cells below and to the right.",
  "#NAME?": "a name in the formula is not known. Check its spelling.",
  "#REF!": "the formula points to a cell that is not there. Choose the range again.",
  "#DIV/0!": "a division by zero or by an empty cell.",
  "#NUM!": "a number the calculation cannot use.",
  "#NULL!": "the ranges in the formula do not meet.",
  "#CALC!": "the formula has nothing to calculate.",
  "#CYCLE!": "the formula depends on its own cell.",
  "#VALUE!": "a wrong kind of value in the formula, or an error in a cell that it uses.",
  "#N/A": "no value, or an error in a cell that the formula uses.",
};

export const engineErrorMessage = (code: string): string | undefined => meanings[code];
