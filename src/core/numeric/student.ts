/** Student's t distribution with a whole number of degrees of freedom. */
import { normalTwoSided } from "./normal";
import { type SymmetricDistribution, twoSidedQuantile } from "./two-sided-quantile";

/** From here on the expansion about the normal distribution serves, to 1E-14 for the probabilities in use. */
const NEARLY_NORMAL = 1000;

/**
 * Γ((ν+1)/2) / (Γ(ν/2)·√(νπ)), the density at zero, by its recurrence
 * Γ((ν+1)/2)/Γ(ν/2) = (ν−1)/(ν−2) · Γ((ν−1)/2)/Γ((ν−2)/2).
 */
function peakDensity(dof: number): number {
  let ratio = dof % 2 === 1 ? 1 / Math.sqrt(Math.PI) : Math.sqrt(Math.PI) / 2;
  for (let n = dof % 2 === 1 ? 3 : 4; n <= dof; n += 2) ratio *= (n - 1) / (n - 2);
  return ratio / Math.sqrt(dof * Math.PI);
}

const SMALLEST = 1e-300;
const MOST_TERMS = 1000;

/**
 * The continued fraction of the incomplete beta function Iₓ(a, b), DLMF 8.17.22, by
 * the modified Lentz method; fast for x < (a + 1)/(a + b + 2).
 */
function betaFraction(a: number, b: number, x: number): number {
  let c = 1;
  let d = 1 / (1 - ((a + b) * x) / (a + 1) || SMALLEST);
  let fraction = d;
  for (let m = 1; m < MOST_TERMS; m++) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / (1 + even * d || SMALLEST);
    c = 1 + even / c || SMALLEST;
    fraction *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / (1 + odd * d || SMALLEST);
    c = 1 + odd / c || SMALLEST;
    const factor = d * c;
    fraction *= factor;
    if (Math.abs(factor - 1) < 1e-15) break;
  }
  return fraction;
}

function student(dof: number): SymmetricDistribution {
  const peak = peakDensity(dof);
  const density = (t: number): number => peak * Math.exp(-0.5 * (dof + 1) * Math.log1p((t * t) / dof));
  // P(|T| > t) = Iₓ(ν/2, ½) with x = ν/(ν + t²); its factor xᵃ(1 − x)ᵇ/(a·B(a, b)) is 2t·density/ν.
  const nearTo = (3 * dof) / (dof + 2);
  const farOutside = (t: number): number =>
    ((2 * t * density(t)) / dof) * betaFraction(dof / 2, 0.5, dof / (dof + t * t));
  const nearCentral = (t: number): number =>
    2 * t * density(t) * betaFraction(0.5, dof / 2, (t * t) / (dof + t * t));
  return {
    // Asked where it is the smaller of the two, and so t not beyond `nearTo`.
    central: nearCentral,
    outside: (t) => (t * t > nearTo ? farOutside(t) : 1 - nearCentral(t)),
    density,
  };
}

/**
 * The expansion of t in 1/ν about the normal deviate z, Abramowitz & Stegun 26.7.5. From
 * 1000 degrees of freedom up it is good to 4E-16 at k = 2, to about 1E-14 at k = 3 and to 1E-10 for p = 1 − 1E-15.
 */
function fromNormal(z: number, dof: number): number {
  const square = z * z;
  const g1 = (square + 1) / 4;
  const g2 = ((5 * square + 16) * square + 3) / 96;
  const g3 = (((3 * square + 19) * square + 17) * square - 15) / 384;
  const g4 = ((((79 * square + 776) * square + 1482) * square - 1920) * square - 945) / 92160;
  return z * (1 + (g1 + (g2 + (g3 + g4 / dof) / dof) / dof) / dof);
}

/** The t > 0 with P(|T| ≤ t) = `inside` (above 0, below 1); `dof` a whole number from 1 up. */
export function studentTwoSided(inside: number, dof: number): number {
  const z = normalTwoSided(inside);
  return dof >= NEARLY_NORMAL ? fromNormal(z, dof) : twoSidedQuantile(student(dof), inside, z);
}
