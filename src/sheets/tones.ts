/** Tones of the sheets that we write, on light paper: six hexadecimal digits of red, green and blue. */
export const tones = { ink: "24262b", muted: "5e625f", slate: "2f5d73" } as const;
