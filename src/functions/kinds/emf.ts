import { plainNumber } from "./kind";

/** An EMF in mV. */
export const emf = plainNumber("EMF", "mV");
