/** Plain clock time as a logger writes it; counted in UTC so that the machine's own zone plays no part. */
export function logTime(start: number, seconds: number): string {
  return new Date(start + seconds * 1000).toISOString().slice(0, 19).replace("T", " ");
}

/** The same as a worksheet counts it: days since 1899-12-30. */
export const serialTime = (start: number, seconds: number): number =>
  (start / 1000 + seconds) / 86_400 + 25_569;
