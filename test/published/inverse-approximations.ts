/**
 * Published inverse approximations: coefficients of t = Σ dᵢEⁱ (E in mV, t in °C), the EMF range
 * and the error band as printed. They check the exact inverse; they are not how it works.
 *
 * Source of all: NIST Standard Reference Database 60.
 */
export interface PublishedInverse {
  readonly type: string;
  readonly emfRange: readonly [from: number, to: number];
  /** approximation − exact, °C, as printed */
  readonly errorBand: readonly [from: number, to: number];
  /** Half a unit of the last printed digit of the band. */
  readonly rounding: number;
  readonly coefficients: readonly number[];
}

// biome-ignore format: as printed
export const publishedInverses: readonly PublishedInverse[] = [
  {
    type: "B",
    emfRange: [0.291, 2.431],
    errorBand: [-0.02, 0.03],
    rounding: 0.005,
    coefficients: [98.423321, 699.715, -847.65304, 1005.2644, -833.45952, 455.08542, -155.23037, 29.88675, -2.474286],
  },
  {
    type: "B",
    // NIST text prints temperature range 700 to 1800 with emf limit 13.820 mV; 13.820 mV belongs to 1820 C (1800 C = 13.591 mV)
    emfRange: [2.431, 13.82],
    errorBand: [-0.01, 0.02],
    rounding: 0.005,
    coefficients: [213.15071, 285.10504, -52.742887, 9.9160804, -1.2965303, 0.1119587, -0.0060625199, 0.00018661696, -2.4878585e-06],
  },
  {
    type: "E",
    emfRange: [-8.825, 0.0],
    errorBand: [-0.01, 0.03],
    rounding: 0.005,
    coefficients: [0, 16.977288, -0.4351497, -0.15859697, -0.092502871, -0.026084314, -0.0041360199, -0.0003403403, -1.156489e-05],
  },
  {
    type: "E",
    emfRange: [0.0, 76.373],
    errorBand: [-0.02, 0.02],
    rounding: 0.005,
    coefficients: [0, 17.057035, -0.23301759, 0.0065435585, -7.3562749e-05, -1.7896001e-06, 8.4036165e-08, -1.3735879e-09, 1.0629823e-11, -3.2447087e-14],
  },
  {
    type: "J",
    emfRange: [-8.095, 0.0],
    errorBand: [-0.05, 0.03],
    rounding: 0.005,
    coefficients: [0, 19.528268, -1.2286185, -1.0752178, -0.59086933, -0.17256713, -0.028131513, -0.002396337, -8.3823321e-05],
  },
  {
    type: "J",
    emfRange: [0.0, 42.919],
    errorBand: [-0.04, 0.04],
    rounding: 0.005,
    coefficients: [0, 19.78425, -0.2001204, 0.01036969, -0.0002549687, 3.585153e-06, -5.344285e-08, 5.09989e-10],
  },
  {
    type: "J",
    emfRange: [42.919, 69.553],
    errorBand: [-0.04, 0.03],
    rounding: 0.005,
    coefficients: [-3113.58187, 300.543684, -9.9477323, 0.17027663, -0.00143033468, 4.73886084e-06],
  },
  {
    type: "K",
    emfRange: [-5.891, 0.0],
    errorBand: [-0.02, 0.04],
    rounding: 0.005,
    coefficients: [0, 25.173462, -1.1662878, -1.0833638, -0.8977354, -0.37342377, -0.086632643, -0.010450598, -0.00051920577],
  },
  {
    type: "K",
    emfRange: [0.0, 20.644],
    errorBand: [-0.05, 0.04],
    rounding: 0.005,
    coefficients: [0, 25.08355, 0.07860106, -0.2503131, 0.0831527, -0.01228034, 0.0009804036, -4.41303e-05, 1.057734e-06, -1.052755e-08],
  },
  {
    type: "K",
    emfRange: [20.644, 54.886],
    errorBand: [-0.05, 0.06],
    rounding: 0.005,
    coefficients: [-131.8058, 48.30222, -1.646031, 0.05464731, -0.0009650715, 8.802193e-06, -3.11081e-08],
  },
  {
    type: "N",
    emfRange: [-3.99, 0.0],
    errorBand: [-0.02, 0.03],
    rounding: 0.005,
    coefficients: [0, 38.436847, 1.1010485, 5.2229312, 7.2060525, 5.8488586, 2.7754916, 0.77075166, 0.11582665, 0.0073138868],
  },
  {
    type: "N",
    emfRange: [0.0, 20.613],
    errorBand: [-0.02, 0.03],
    rounding: 0.005,
    coefficients: [0, 38.6896, -1.08267, 0.0470205, -2.12169e-06, -0.000117272, 5.3928e-06, -7.98156e-08],
  },
  {
    type: "N",
    emfRange: [20.613, 47.513],
    errorBand: [-0.04, 0.02],
    rounding: 0.005,
    coefficients: [19.72485, 33.00943, -0.3915159, 0.009855391, -0.0001274371, 7.767022e-07],
  },
  {
    type: "R",
    emfRange: [-0.226, 1.923],
    errorBand: [-0.02, 0.02],
    rounding: 0.005,
    coefficients: [0, 188.9138, -93.83529, 130.68619, -227.0358, 351.45659, -389.539, 282.39471, -126.07281, 31.353611, -3.3187769],
  },
  {
    type: "R",
    // overlaps next segment (11.361..13.228); prefer next segment above 11.361
    emfRange: [1.923, 13.228],
    errorBand: [-0.005, 0.005],
    rounding: 0.0005,
    coefficients: [13.34584505, 147.2644573, -18.44024844, 4.031129726, -0.624942836, 0.06468412046, -0.004458750426, 0.0001994710149, -5.31340179e-06, 6.481976217e-08],
  },
  {
    type: "R",
    emfRange: [11.361, 19.739],
    errorBand: [-0.0005, 0.001],
    rounding: 5e-05,
    coefficients: [-81.99599416, 155.3962042, -8.342197663, 0.4279433549, -0.0119157791, 0.0001492290091],
  },
  {
    type: "R",
    emfRange: [19.739, 21.103],
    errorBand: [-0.001, 0.002],
    rounding: 0.0005,
    coefficients: [34061.77836, -7023.729171, 558.2903813, -19.52394635, 0.2560740231],
  },
  {
    type: "S",
    // printed emf limit -0.235; reference function and table give -0.236 (-0.23556)
    emfRange: [-0.235, 1.874],
    errorBand: [-0.02, 0.02],
    rounding: 0.005,
    coefficients: [0, 184.94946, -80.0504062, 102.23743, -152.248592, 188.821343, -159.085941, 82.302788, -23.4181944, 2.7978626],
  },
  {
    type: "S",
    // printed emf limit 11.950; table value at 1200 C is 11.951 (11.95055). Overlaps next segment (10.332..11.950); prefer next segment above 10.332
    emfRange: [1.874, 11.95],
    errorBand: [-0.01, 0.01],
    rounding: 0.005,
    coefficients: [12.91507177, 146.6298863, -15.34713402, 3.145945973, -0.4163257839, 0.03187963771, -0.0012916375, 2.183475087e-05, -1.447379511e-07, 8.211272125e-09],
  },
  {
    type: "S",
    emfRange: [10.332, 17.536],
    errorBand: [-0.0002, 0.0002],
    rounding: 5e-05,
    coefficients: [-80.87801117, 162.1573104, -8.536869453, 0.4719686976, -0.01441693666, 0.000208161889],
  },
  {
    type: "S",
    emfRange: [17.536, 18.693],
    errorBand: [-0.002, 0.002],
    rounding: 0.0005,
    coefficients: [53338.75126, -12358.92298, 1092.657613, -42.65693686, 0.624720542],
  },
  {
    type: "T",
    emfRange: [-5.603, 0.0],
    errorBand: [-0.02, 0.04],
    rounding: 0.005,
    coefficients: [0, 25.949192, -0.21316967, 0.79018692, 0.42527777, 0.13304473, 0.020241446, 0.0012668171],
  },
  {
    type: "T",
    emfRange: [0.0, 20.872],
    errorBand: [-0.03, 0.03],
    rounding: 0.005,
    coefficients: [0, 25.928, -0.7602961, 0.04637791, -0.002165394, 6.048144e-05, -7.293422e-07],
  },
];
