/** The unit in which a log gives its times, as minutes. */
import { choice, type Kind } from "./kind";

const MINUTES = { h: 60, min: 1, s: 1 / 60 } as const;

const words = choice(["h", "min", "s"]);

/** Date-time serials count days. */
export const MINUTES_PER_DAY = 1440;

export const timeUnit: Kind<number> = {
  ...words,
  read(cell, label, unit) {
    const word = words.read(cell, label, unit);
    return typeof word === "string" ? MINUTES[word] : word;
  },
};
