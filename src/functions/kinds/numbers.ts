/** Numbers that are the same in every unit of temperature. */
import { plainNumber } from "./kind";

/** An EMF in mV. */
export const emf = plainNumber("EMF", "mV");

/** An EMF deviation or its uncertainty in µV. */
export const microvolts = plainNumber("EMF deviation", "µV");

export const resistance = plainNumber("resistance", "Ω");

/** A date or a date with a time, as the workbook's serial number. */
export const date = plainNumber("date");

/** A time of a log: a date-time serial, or what the call's time unit says. */
export const time = plainNumber("time");

export const minutes = plainNumber("duration", "min");

export const seconds = plainNumber("time constant", "s");

/** A temperature of a function that works in whatever degrees the sheet holds. */
export const sheetTemperature = plainNumber("temperature");

/** A difference or rate of such temperatures. */
export const sheetDifference = plainNumber("temperature difference");

export const number = plainNumber("number");
