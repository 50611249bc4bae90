import type { CableTable } from "./cable-table";

/** The µV figure is the specification, the degrees its equivalent for a measuring junction at `at`. */
export const iec60584_3: CableTable = {
  standard: "iec60584_3",
  clause: "tolerances of extension and compensating cables",
  evidence: "an instrument maker's manual and two further pages agree",
  // biome-ignore format: one class a line
  cables: {
    JX: { couple: "J", from: -25, to: 200, classes: {
      1: { uv: 85, degrees: 1.5, at: 500 },
      2: { uv: 140, degrees: 2.5, at: 500 },
    } },
    TX: { couple: "T", from: -25, to: 100, classes: {
      1: { uv: 30, degrees: 0.5, at: 300 },
      2: { uv: 60, degrees: 1, at: 300 },
    } },
    EX: { couple: "E", from: -25, to: 200, classes: {
      1: { uv: 120, degrees: 1.5, at: 500 },
      2: { uv: 200, degrees: 2.5, at: 500 },
    } },
    KX: { couple: "K", from: -25, to: 200, classes: {
      1: { uv: 60, degrees: 1.5, at: 900 },
      2: { uv: 100, degrees: 2.5, at: 900 },
    } },
    NX: { couple: "N", from: -25, to: 200, classes: {
      1: { uv: 60, degrees: 1.5, at: 900 },
      2: { uv: 100, degrees: 2.5, at: 900 },
    } },
    KCA: { couple: "K", from: 0, to: 150, classes: {
      2: { uv: 100, degrees: 2.5, at: 900 },
    } },
    KCB: { couple: "K", from: 0, to: 100, classes: {
      2: { uv: 100, degrees: 2.5, at: 900 },
    } },
    NC: { couple: "N", from: 0, to: 150, classes: {
      2: { uv: 100, degrees: 2.5, at: 900 },
    } },
    RCA: { couple: "R", from: 0, to: 100, classes: {
      2: { uv: 30, degrees: 2.5, at: 1000 },
    } },
    RCB: { couple: "R", from: 0, to: 200, classes: {
      2: { uv: 60, degrees: 5, at: 1000 },
    } },
    SCA: { couple: "S", from: 0, to: 100, classes: {
      2: { uv: 30, degrees: 2.5, at: 1000 },
    } },
    SCB: { couple: "S", from: 0, to: 200, classes: {
      2: { uv: 60, degrees: 5, at: 1000 },
    } },
    BC: { couple: "B", from: 0, to: 100, classes: {
      2: { uv: 40, degrees: 3.5, at: 1400, evidence: "µV from memory" },
    } },
  },
};
