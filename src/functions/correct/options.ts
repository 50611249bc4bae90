/** Arguments that several functions of this family share. */
import { block, line, once, orElse } from "../arguments";
import { choice } from "../kinds/kind";
import { temperature, temperatureDifference } from "../kinds/temperature";

export const points = line(temperature);
export const values = block(temperatureDifference);
export const givenAs = orElse(once(choice(["correction", "error"])), "correction", "correction");
export const method = orElse(
  once(choice(["linear", "nearest", "smooth", "fit1", "fit2", "fit3"])),
  "linear",
  "linear",
);
export const pointsAre = orElse(once(choice(["readings", "true"])), "readings", "readings");
export const expressedIn = orElse(once(choice(["uV", "degrees"])), "uV", "uV");
export const referenceBy = orElse(once(choice(["standard", "individual"])), "standard", "standard");
