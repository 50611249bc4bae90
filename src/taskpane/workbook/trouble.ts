/** What went wrong, in a sentence for the user: what, and what to do. Never a stack. */
export class Trouble extends Error {
  override readonly name = "Trouble";
}

const unknown = "The sheet could not do this now. Finish what is open in it, then try again.";

/** The sentence behind a failure; the words of an unknown one are not the user's matter. */
export const sentenceOf = (failure: unknown): string =>
  failure instanceof Trouble ? failure.message : unknown;
