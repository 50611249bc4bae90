/** Sensors at the reference junction, and wiring faults put right. */
export { diagnose, type Explanation } from "./diagnose";
export { differential } from "./differential";
export { rereferenced, retyped } from "./instrument";
export { type Lead, leadError, releaded } from "./lead";
export { platinumResistance, platinumTemperature } from "./platinum";
export { type Crossing, crossings, unreversed } from "./polarity";
export { Thermistor, thermistor } from "./thermistor";
