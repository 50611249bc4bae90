/**
 * Shape-preserving piecewise cubic interpolation: smooth, through every point, and
 * never beyond the two points that it runs between.
 *
 * F. N. Fritsch, R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238–246, with the slopes
 * of F. N. Fritsch, J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300–304: the
 * weighted harmonic mean of the two chords, 0 where they differ in sign.
 */

/** Slope of the cubic at each point; xs rise strictly, and are at least two. */
export function monotoneSlopes(xs: Float64Array, ys: Float64Array): Float64Array {
  const last = xs.length - 1;
  const width = (i: number): number => (xs[i + 1] as number) - (xs[i] as number);
  const chord = (i: number): number => ((ys[i + 1] as number) - (ys[i] as number)) / width(i);
  const slopes = new Float64Array(xs.length);
  if (last === 1) return slopes.fill(chord(0));
  for (let i = 1; i < last; i++) {
    slopes[i] = harmonic(width(i - 1), width(i), chord(i - 1), chord(i));
  }
  slopes[0] = atEnd(width(0), width(1), chord(0), chord(1));
  slopes[last] = atEnd(width(last - 1), width(last - 2), chord(last - 1), chord(last - 2));
  return slopes;
}

function harmonic(before: number, after: number, chordBefore: number, chordAfter: number): number {
  if (!(chordBefore * chordAfter > 0)) return 0;
  // The chord over the shorter interval weighs more.
  const weightBefore = before + 2 * after;
  const weightAfter = 2 * before + after;
  return (weightBefore + weightAfter) / (weightBefore / chordBefore + weightAfter / chordAfter);
}

/** The parabola through three points, held back so that the shape stays: chords of one sign make it less than 2 chords steep. */
function atEnd(near: number, far: number, chordNear: number, chordFar: number): number {
  const slope = ((2 * near + far) * chordNear - near * chordFar) / (near + far);
  if (slope * chordNear <= 0) return 0;
  return Math.abs(slope) > 3 * Math.abs(chordNear) ? 3 * chordNear : slope;
}

/** The cubic between points i and i + 1, at x. */
export function cubicAt(
  xs: Float64Array,
  ys: Float64Array,
  slopes: Float64Array,
  i: number,
  x: number,
): number {
  const width = (xs[i + 1] as number) - (xs[i] as number);
  const left = ys[i] as number;
  const right = ys[i + 1] as number;
  const u = (x - (xs[i] as number)) / width;
  const v = 1 - u;
  const bend = v * width * (slopes[i] as number) - u * width * (slopes[i + 1] as number);
  // Hermite's cubic: the two ends weighted by 3u² − 2u³, and what the slopes add in between.
  return v * v * (1 + 2 * u) * left + u * u * (1 + 2 * v) * right + u * v * bend;
}
