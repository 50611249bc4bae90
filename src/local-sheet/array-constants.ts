import { ArrayValueObject } from "@univerjs/engine-formula";

const number = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

/** "{-0.4;-1.0}" as "{-0.4;-1}". */
export const withPlainNumbers = (constant: string): string =>
  `{${constant
    .slice(1, -1)
    .split(/([;,])/)
    .map((part) => (number.test(part.trim()) ? String(Number(part)) : part))
    .join("")}}`;

/**
 * The engine takes a number in an array constant for a text when JavaScript would print it otherwise: "-1.0",
 * "+2", "1E3". Excel reads all of them as numbers, so they are rewritten before the engine reads them.
 */
export function readNumbersInArrayConstants(): void {
  const create = ArrayValueObject.create.bind(ArrayValueObject);
  ArrayValueObject.create = (value) => create(typeof value === "string" ? withPlainNumbers(value) : value);
}
