/** A data logger's manual: table of a 10 kΩ thermistor, and the coefficients that read it. */
export const manualCoefficients = [1.129241e-3, 2.341077e-4, 8.775468e-8];

// biome-ignore format: one row a line
export const manualTable: readonly (readonly [t: number, resistance: number])[] = [
  [-40, 336103.2],
  [-35, 242430.2],
  [-30, 176804.8],
  [-25, 130307.6],
  [-20, 97006.9],
  [-15, 72911.1],
  [-10, 55303.9],
  [-5, 42316.7],
  [0, 32650.9],
  [1, 31030.8],
];
