/** Arguments that several functions of this family share. */
import { column, gappedColumn, ifGiven, once } from "../arguments";
import { name } from "../kinds/name";
import { minutes, time } from "../kinds/numbers";
import { temperatureDifference } from "../kinds/temperature";

export const corrections = ifGiven(column(temperatureDifference));
export const names = ifGiven(gappedColumn(name));
export const maxGap = ifGiven(once(minutes));
export const start = ifGiven(once(time));
export const end = ifGiven(once(time));
