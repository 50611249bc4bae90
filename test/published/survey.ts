/**
 * SAE AMS2750 as printed: uniformity by furnace class, in °F and in °C, and a worked example.
 */

/**
 * Class, ± °F, ± °C. Written down from copies in print and from memory; the two are not told apart row by row.
 */
export const uniformityByClass: readonly (readonly [
  furnaceClass: number,
  fahrenheit: number,
  celsius: number,
])[] = [
  [1, 5, 3],
  [2, 10, 6],
  [3, 15, 8],
  [4, 20, 10],
  [5, 25, 14],
  [6, 50, 28],
];

/** Found in print: set 1900 °F, survey 1887 to 1913 °F, that is ± 13 °F: class 3. */
export const workedClass = { setpoint: 1900, lowest: 1887, highest: 1913, furnaceClass: 3 };
