/**
 * A thermocouple circuit walked wire by wire, written apart from the repairs that it
 * checks. Along a wire the potential falls towards the hot end by the integral of the
 * wire's own Seebeck coefficient; a couple's reference function is the difference of
 * those of its two wires.
 */
import type { Thermocouple } from "../../../src/core";

/** Integral of a wire's Seebeck coefficient up to t, mV. */
type Wire = (t: number) => number;

interface Pair {
  readonly plus: Wire;
  readonly minus: Wire;
}

/** Any split of E over two wires gives the same loop; an uneven one shows up wires that were mixed up. */
const pairOf = (couple: Thermocouple): Pair => ({
  plus: (t) => 1.7 * couple.emf(t) + 0.003 * t,
  minus: (t) => 0.7 * couple.emf(t) + 0.003 * t,
});

const copperPair: Pair = { plus: (t) => 0.0018 * t, minus: (t) => 0.0018 * t };

export interface Circuit {
  readonly couple: Thermocouple;
  readonly extension: Thermocouple | "copper";
  /** Temperatures of the measuring junction, the head and the instrument's terminals, °C. */
  readonly junction: number;
  readonly head: number;
  readonly terminals: number;
  readonly crossedAtHead?: boolean;
  readonly crossedAtTerminals?: boolean;
}

const crossed = (pair: Pair): Pair => ({ plus: pair.minus, minus: pair.plus });

/** Potential of the plus terminal over the minus terminal, mV. */
export function measuredEmf(circuit: Circuit): number {
  const { junction, head, terminals } = circuit;
  const run = circuit.extension === "copper" ? copperPair : pairOf(circuit.extension);
  // Named by the terminal, and by the wire of the run, that each wire hangs on.
  const runHangs = circuit.crossedAtTerminals ? crossed(run) : run;
  const onRun = circuit.crossedAtHead ? crossed(pairOf(circuit.couple)) : pairOf(circuit.couple);
  const coupleHangs = circuit.crossedAtTerminals ? crossed(onRun) : onRun;
  const rise = (wire: Wire, from: number, to: number): number => wire(from) - wire(to);
  // From the minus terminal round the loop to the plus terminal.
  return (
    rise(runHangs.minus, terminals, head) +
    rise(coupleHangs.minus, head, junction) +
    rise(coupleHangs.plus, junction, head) +
    rise(runHangs.plus, head, terminals)
  );
}
