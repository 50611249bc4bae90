/**
 * Σ (xᵢ − shift), with a rounding error that does not grow with the number of terms: A. Neumaier,
 * Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen, ZAMM 54 (1974) 39–51.
 */
export function compensatedSum(values: ArrayLike<number>, shift = 0): number {
  let sum = 0;
  let lost = 0;
  for (let i = 0; i < values.length; i++) {
    const term = (values[i] as number) - shift;
    const next = sum + term;
    lost += Math.abs(sum) >= Math.abs(term) ? sum - next + term : term - next + sum;
    sum = next;
  }
  return sum + lost;
}
