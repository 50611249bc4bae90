import type { CableTable } from "./cable-table";

const UV_FROM_MEMORY = "µV and temperature of the measuring junction from memory";

/**
 * Base-metal extension cables are specified in degrees of their own junctions; those of
 * platinum and tungsten couples in µV, with degrees for a hot measuring junction beside them.
 */
export const astmE230Cables: CableTable = {
  standard: "astmE230",
  clause: "tolerances on initial values for extension wires",
  evidence: "three makers' tables agree; one older copy leaves the special tolerances of KX, EX and NX blank",
  // biome-ignore format: one class a line
  cables: {
    KX: { couple: "K", from: 0, to: 200, classes: {
      standard: { degrees: 2.2 },
      special: { degrees: 1.1 },
    } },
    JX: { couple: "J", from: 0, to: 200, classes: {
      standard: { degrees: 2.2 },
      special: { degrees: 1.1 },
    } },
    EX: { couple: "E", from: 0, to: 200, classes: {
      standard: { degrees: 1.7 },
      special: { degrees: 1 },
    } },
    TX: { couple: "T", from: 0, to: 100, note: "From memory the standard goes down to -60 °C.", classes: {
      standard: { degrees: 1 },
      special: { degrees: 0.5 },
    } },
    NX: { couple: "N", from: 0, to: 200, classes: {
      standard: { degrees: 2.2 },
      special: { degrees: 1.1 },
    } },
    SX: { couple: "S", from: 0, to: 200, classes: {
      standard: { uv: 57, degrees: 5, at: 870, evidence: UV_FROM_MEMORY },
    } },
    RX: { couple: "R", from: 0, to: 200, classes: {
      standard: { uv: 57, degrees: 5, at: 870, evidence: UV_FROM_MEMORY },
    } },
    BX: { couple: "B", from: 0, to: 200, note: "The alloy pair. Plain copper, 0 °C to 100 °C, has one-sided limits: +0, -33 µV (-3.7 °C).", classes: {
      standard: { uv: 33, degrees: 3.7, at: 1000, evidence: UV_FROM_MEMORY },
    } },
    CX: { couple: "C", from: 0, to: 870, note: "Range in two copies; 0 °C to 200 °C from memory.", classes: {
      standard: { uv: 110, degrees: 6.8, evidence: "µV from memory" },
    } },
  },
};
