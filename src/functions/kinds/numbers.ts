/** Numbers that are the same in every unit of temperature. */
import { plainNumber } from "./kind";

/** An EMF in mV. */
export const emf = plainNumber("EMF", "mV");

/** An EMF deviation or its uncertainty in µV. */
export const microvolts = plainNumber("EMF deviation", "µV");

export const resistance = plainNumber("resistance", "Ω");

/** A date or a date with a time, as the workbook's serial number. */
export const date = plainNumber("date");

export const number = plainNumber("number");
