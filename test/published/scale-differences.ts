/**
 * t90 − t68 over t90, °C, as printed to 1 mK in a handbook table; the fit of the
 * published polynomial to it is stated as 1.5 mK below 0 °C and 1 mK above.
 */
// biome-ignore format: one row a line
export const printedDifferences: readonly (readonly [t90: number, difference: number])[] = [
  [-180, 0.008],
  [-170, 0.01],
  [-160, 0.012],
  [-150, 0.013],
  [-140, 0.014],
  [-130, 0.014],
  [-120, 0.014],
  [-110, 0.013],
  [-100, 0.013],
  [-90, 0.012],
  [-80, 0.012],
  [-70, 0.011],
  [-60, 0.01],
  [-50, 0.009],
  [-40, 0.008],
  [-30, 0.006],
  [-20, 0.004],
  [-10, 0.002],
  [0, 0.0],
  [10, -0.002],
  [20, -0.005],
  [30, -0.007],
  [40, -0.01],
  [50, -0.013],
  [60, -0.016],
  [70, -0.018],
  [80, -0.021],
  [90, -0.024],
  [100, -0.026],
  [110, -0.028],
  [120, -0.03],
  [130, -0.032],
  [140, -0.034],
  [150, -0.036],
  [160, -0.037],
  [170, -0.038],
  [180, -0.039],
  [190, -0.039],
  [200, -0.04],
  [210, -0.04],
  [220, -0.04],
  [230, -0.04],
  [240, -0.04],
  [250, -0.04],
  [260, -0.04],
];

/** Printed values above the gold point, to 10 mK (a handbook). */
export const printedRadiationDifferences: readonly (readonly [t90: number, difference: number])[] = [
  [1500, -0.44],
  [2000, -0.72],
  [2500, -1.07],
];
