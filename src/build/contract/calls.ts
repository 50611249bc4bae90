/** The calls that a new record freezes: every documented example, and variations of it by a fixed seed. */
import type { CatalogueFunction } from "../../catalogue/catalogue";
import { type Constant, parseExample } from "../../catalogue/formula";
import { stateFromSeed, xoshiro128 } from "../../core/numeric/xoshiro128";
import type { FrozenCall, Given } from "./record";

type Call = Pick<FrozenCall, "id" | "given">;

const VARIATIONS = 8;
const TYPES = ["B", "C", "E", "J", "K", "N", "R", "S", "T", "A", "Au/Pt", "Chromel/Copel"];
const UNITS = ["C", "F", "K", "R"];
/** Counts, orders and classes are small whole numbers, and stay what they are. */
const COUNTED = 12;
/** Trials and serial dates: whole numbers that stay whole. */
const WHOLE = 10_000;
/** How far readings are moved: within a survey's band, or out of it. */
const SPREADS = [0.0005, 0.005, 0.03];

/** Readings a little off, now and then another couple, another unit, a blank or a text. */
function varied({ id, parameters, examples }: CatalogueFunction, random: () => number): Call {
  const pick = <T>(all: readonly T[]): T => all[Math.floor(random() * all.length)] as T;
  const { given } = parseExample(pick(examples).formula);
  const type = random() < 0.5 ? undefined : pick(TYPES);
  const spoilt = random() < 0.15;
  const spread = pick(SPREADS);
  const other = (cell: Constant): Constant => {
    if (spoilt && random() < 0.2) return pick<Constant>(["", "open", true]);
    if (typeof cell === "string") return type !== undefined && TYPES.includes(cell) ? type : cell;
    if (typeof cell !== "number" || (Number.isInteger(cell) && Math.abs(cell) <= COUNTED)) return cell;
    const moved = cell * (1 + spread * (2 * random() - 1));
    return Number.isInteger(cell) && cell >= WHOLE ? Math.round(moved) : Number(moved.toPrecision(7));
  };
  const all: Given = parameters.map(({ name }, i) => {
    const range = given[i] ?? null;
    if (name === "unit" && range === null && random() < 0.4) return [[pick(UNITS)]];
    return range === null ? null : range.map((row) => row.map(other));
  });
  return { id, given: all };
}

export function callsToFreeze(functions: readonly CatalogueFunction[]): Call[] {
  return functions.flatMap((one, index) => {
    const bits = xoshiro128(stateFromSeed(index + 1));
    const random = (): number => bits() / 2 ** 32;
    const documented = one.examples.map(({ formula }): Call => {
      const { id, given } = parseExample(formula);
      return { id, given: one.parameters.map((_, i) => given[i] ?? null) };
    });
    return [...documented, ...Array.from({ length: VARIATIONS }, () => varied(one, random))];
  });
}
