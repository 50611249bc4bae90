/** A thermocouple, or the platinum sensor at its reference junction. */
import { Refusal, type Thermocouple } from "../../core";
import { couple, designations } from "./couple";
import type { Kind } from "./kind";

export type Sensor = Thermocouple | "Pt";

const PLATINUM = /^\s*(type\s*)?pt\s*$/i;

export const sensor: Kind<Sensor> = {
  name: couple.name,
  options: [...designations, "Pt"],
  read(cell, label, unit) {
    if (PLATINUM.test(String(cell))) return "Pt";
    const found = couple.read(cell, label, unit);
    return found instanceof Refusal ? found.and`, or Pt` : found;
  },
};

/** As the core's tolerance tables name it. */
export const designationOf = (one: Sensor): string => (one === "Pt" ? one : one.designation);
