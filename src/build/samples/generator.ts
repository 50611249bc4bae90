// Random numbers for invented data: the same seed gives the same numbers on every machine, because only
// integer steps and additions are used.

/** sfc32, "small fast counter" (C. Doty-Humphrey, PractRand): uniform numbers in [0, 1). */
export function sfc32(seed: number): () => number {
  let a = seed | 0;
  let b = 0x2c1b3c6d;
  let c = 0x297a2d39;
  let counter = 1;
  const next = () => {
    const sum = (((a + b) | 0) + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (c << 21) | (c >>> 11);
    c = (c + sum) | 0;
    return (sum >>> 0) / 4_294_967_296;
  };
  for (let i = 0; i < 16; i++) next(); // the first numbers still show the seed
  return next;
}

/** Noise of mean 0 and standard deviation 1, near enough to normal: twelve uniform numbers less their mean. */
export function noise(uniform: () => number): number {
  let sum = 0;
  for (let i = 0; i < 12; i++) sum += uniform();
  return sum - 6;
}
