/** A run from the head to the terminals that is of another pair than the couple. */
import type { Refusal } from "../errors";
import { firstOutside, unreachable } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";

/** The pair of the run: another couple, or copper, two wires of one metal that add no EMF. */
export type Lead = Thermocouple | "copper";

/** What the run adds, mV: Elead(head) − Elead(reference). */
const emfOfRun = (lead: Lead, head: number, reference: number): number =>
  lead === "copper" ? 0 : lead.emf(head) - lead.emf(reference);

/**
 * Indicated less true temperature, °C, of a couple at `t` °C that runs from its head at
 * `head` °C to the terminals at `reference` °C through another pair:
 * E(indicated) = E(t) − [E(head) − E(ref)] + [Elead(head) − Elead(ref)].
 *
 * Assumes the plus wire of the run on the couple's plus wire, homogeneous wires, and both
 * connections of the head, and of the terminals, at one temperature. Refuses a temperature
 * outside the reference function of its pair, given or indicated.
 */
export function leadError(
  t: number,
  couple: Thermocouple,
  lead: Lead,
  head: number,
  reference: number,
): number | Refusal {
  const run = emfOfRun(lead, head, reference);
  const emf = couple.emf(t) - (couple.emf(head) - couple.emf(reference)) + run;
  const indicated = couple.temperature(emf);
  if (!Number.isNaN(indicated)) return indicated - t;
  return Number.isNaN(emf)
    ? refused("temperature", t, couple, lead, head, reference)
    : unreachable(couple, emf);
}

/**
 * The true temperature, °C, of a reading in °C taken through such a run, the inverse of
 * `leadError`: E(t) = E(indicated) + [E(head) − E(ref)] − [Elead(head) − Elead(ref)].
 * The same assumptions and refusals.
 */
export function releaded(
  indicated: number,
  couple: Thermocouple,
  lead: Lead,
  head: number,
  reference: number,
): number | Refusal {
  const run = emfOfRun(lead, head, reference);
  const emf = couple.emf(indicated) + (couple.emf(head) - couple.emf(reference)) - run;
  const t = couple.temperature(emf);
  if (!Number.isNaN(t)) return t;
  return Number.isNaN(emf)
    ? refused("indicated temperature", indicated, couple, lead, head, reference)
    : unreachable(couple, emf);
}

function refused(
  name: string,
  t: number,
  couple: Thermocouple,
  lead: Lead,
  head: number,
  reference: number,
): Refusal {
  const ends = [
    ["head temperature", head],
    ["reference temperature", reference],
  ] as const;
  const ofLead = lead !== "copper" && Number.isNaN(emfOfRun(lead, head, reference));
  return ofLead ? firstOutside(lead, ...ends) : firstOutside(couple, [name, t], ...ends);
}
