/** From a refusal of the core to the error value of a cell. */
import type { Refusal, TemperatureUnit } from "../core";
import { type CellError, error } from "./cell";

export const failure = (refusal: Refusal, unit: TemperatureUnit): CellError =>
  error(refusal.kind === "no answer" ? "#N/A" : "#VALUE!", refusal.message(unit));
