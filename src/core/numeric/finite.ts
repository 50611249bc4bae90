import { noAnswer, type Refusal } from "../errors";

/** The value itself, or a refusal where it passed the largest number there is. */
export const finite = (value: number, what: string): number | Refusal =>
  Number.isFinite(value) ? value : noAnswer`${what} is too large for a number`;
