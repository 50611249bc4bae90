/** √(Σ xᵢ²), scaled by the largest, so that no square overflows or vanishes. */
export function rootSumSquare(values: ArrayLike<number>): number {
  let largest = 0;
  for (let i = 0; i < values.length; i++) largest = Math.max(largest, Math.abs(values[i] as number));
  if (largest === 0 || largest === Number.POSITIVE_INFINITY) return largest;
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += ((values[i] as number) / largest) ** 2;
  return largest * Math.sqrt(sum);
}
