/** Everything a worksheet function needs to declare its arguments. */
import { celsius } from "../../core";
import { temperatureUnit } from "../kinds/temperature";
import { orElse } from "./argument";
import { once } from "./once";

export { type Argument, type Arguments, type Given, ifGiven, orElse, type Values } from "./argument";
export { block, column, gappedColumn, type Line, line } from "./column";
export { each, once } from "./once";
export { inWords, isLeftOut, readGiven, unitOfCall } from "./read";

/** The last argument of every function that deals in temperatures. */
export const unit = orElse(once(temperatureUnit), celsius, "C");
