/** Tolerance classes and cables by name. What a name means, and whether there is one, the core knows. */
import { cableClassNames, cableDesignations, toleranceClassNames } from "../../core";
import type { Kind } from "./kind";

/** A class is a number or a word: 1 and "class 1" are the same. */
export const toleranceClass: Kind<string> = { name: "option", options: toleranceClassNames, read: String };

export const cableClass: Kind<string> = { ...toleranceClass, options: cableClassNames };

export const cable: Kind<string> = { name: "cable", options: cableDesignations, read: String };
