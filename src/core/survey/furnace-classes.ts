/**
 * Temperature uniformity by furnace class: SAE AMS2750 (revision H of July 2024 is the latest known here), the table of
 * furnace classes. The °F row and the °C row are both the standard's own, no conversions of each other: 10 °F is
 * 5.56 °C, the standard says 6 °C. Evidence: found in print in part, the rest from memory.
 */
export interface FurnaceClass {
  readonly class: number;
  /** ± °F */
  readonly fahrenheit: number;
  /** ± °C */
  readonly celsius: number;
}

// biome-ignore format: one class a line
export const furnaceClasses: readonly FurnaceClass[] = [
  { class: 1, fahrenheit:  5, celsius:  3 },
  { class: 2, fahrenheit: 10, celsius:  6 },
  { class: 3, fahrenheit: 15, celsius:  8 },
  { class: 4, fahrenheit: 20, celsius: 10 },
  { class: 5, fahrenheit: 25, celsius: 14 },
  { class: 6, fahrenheit: 50, celsius: 28 },
];
