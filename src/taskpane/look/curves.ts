import { shownValue, withUnit } from "../live/show-value";
import { column, single } from "./drawn-functions";
import type { Band, Figure, Line, Role } from "./figure";

export type Quantity = "EMF" | "sensitivity" | "tolerance";

export interface CurvesWanted {
  readonly types: readonly string[];
  readonly quantity: Quantity;
  /** "" for none. */
  readonly toleranceClass: string;
}

const MOST_POINTS = 200;

/** Steps of round temperatures, so that the numbers beneath the picture are those of printed tables. */
const STEPS = [1, 2, 5, 10, 20, 50];

const QUANTITIES: Readonly<
  Record<Quantity, { readonly kind: string; readonly unit: string; readonly axis: string }>
> = {
  EMF: { kind: "EMF", unit: "mV", axis: "EMF, mV" },
  sensitivity: { kind: "Seebeck coefficient", unit: "µV/°C", axis: "sensitivity, µV/°C" },
  tolerance: { kind: "temperature difference", unit: "°C", axis: "tolerance, °C" },
};

/** E(t), its slope or the tolerance of the chosen types over their ranges, from the functions in the page. */
export function curves({ types, quantity, toleranceClass }: CurvesWanted): Figure {
  const ranges = types.map(
    (type) => [Number(single("TYPEINFO", type, "low")), Number(single("TYPEINFO", type, "high"))] as const,
  );
  const [low, high] = [Math.min(...ranges.map(([from]) => from)), Math.max(...ranges.map(([, to]) => to))];
  const step = STEPS.find((each) => (high - low) / each <= MOST_POINTS) ?? 100;
  const x = [...new Set(ranges.flat())];
  for (let t = Math.ceil(low / step) * step; t < high; t += step) if (!x.includes(t)) x.push(t);
  x.sort((a, b) => a - b);
  const rows = x.map((t) => [t]);
  const lines: Line[] = [];
  const bands: Band[] = [];
  types.forEach((type, index) => {
    const role = roleOf(index);
    const values = valuesOf(quantity, type, toleranceClass, rows);
    lines.push({ label: type, values, role, named: true });
    if (toleranceClass === "" || quantity === "sensitivity") return;
    const label = `class ${toleranceClass} of type ${type}`;
    if (quantity === "tolerance")
      bands.push({ low: values.map((value) => value && -value), high: values, label, role });
    else {
      const limit = column("TOLERANCE", rows, type, toleranceClass, "uV").map(
        (value) => value && value / 1000,
      );
      const shifted = (sign: number) =>
        values.map((value, at) => (value === null || limit[at] == null ? null : value + sign * limit[at]));
      bands.push({ low: shifted(-1), high: shifted(1), label, role });
    }
  });
  return {
    title: titleOf(x, lines[0], quantity, toleranceClass),
    x: { label: "temperature, °C", values: x },
    y: { label: QUANTITIES[quantity].axis },
    lines,
    bands,
    ...(quantity === "tolerance" ? { level: { value: 0, label: "" } } : {}),
  };
}

const roleOf = (index: number): Role => (index === 0 ? "ember" : index === 1 ? "slate" : "muted");

function valuesOf(
  quantity: Quantity,
  type: string,
  toleranceClass: string,
  rows: number[][],
): (number | null)[] {
  if (quantity === "EMF") return column("EMF", rows, type);
  if (quantity === "sensitivity") return column("SEEBECK", rows, type);
  return toleranceClass === "" ? rows.map(() => null) : column("TOLERANCE", rows, type, toleranceClass);
}

function titleOf(
  x: readonly number[],
  line: Line | undefined,
  quantity: Quantity,
  toleranceClass: string,
): string {
  let best = -1;
  line?.values.forEach((value, index) => {
    if (value !== null && (best < 0 || value > line.values[best]!)) best = index;
  });
  if (!line || best < 0) {
    return quantity === "tolerance"
      ? "The standard gives this class no tolerance for this type"
      : "Choose a type";
  }
  const { kind, unit } = QUANTITIES[quantity];
  const value = withUnit(shownValue(line.values[best]!, kind), unit);
  const at = withUnit(x[best]!.toFixed(0).replace("-", "−"), "°C");
  if (quantity === "EMF") return `Type ${line.label} reaches ${value} at ${at}`;
  if (quantity === "sensitivity") return `Type ${line.label} is most sensitive at ${at}: ${value}`;
  return `Class ${toleranceClass} of type ${line.label} allows ±${value} at ${at}`;
}
