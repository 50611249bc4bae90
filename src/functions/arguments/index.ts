/** Everything a worksheet function needs to declare its arguments. */
import { celsius } from "../../core";
import { temperatureUnit } from "../kinds/temperature";
import { MINUTES_PER_DAY, timeUnit as timeUnitKind } from "../kinds/time-unit";
import { orElse } from "./argument";
import { once } from "./once";

export {
  type Argument,
  type Arguments,
  type Given,
  ifGiven,
  ifGivenOrBlank,
  orElse,
  type Values,
} from "./argument";
export { block, column, gappedColumn, type Line, line } from "./column";
export { each, once, onceOrBlank } from "./once";
export { inWords, isLeftOut, readGiven, unitOfCall } from "./read";
export { Readings, readings } from "./readings";
export { type RecordOf, records } from "./records";
export { type Times, times } from "./times";
export { tolerance } from "./tolerance";

/** The last argument of every function that deals in temperatures. */
export const unit = orElse(once(temperatureUnit), celsius, "C");

/** Minutes per unit of the call's times. */
export const timeUnit = orElse(once(timeUnitKind), MINUTES_PER_DAY, "date-time serials");
