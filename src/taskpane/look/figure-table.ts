import { make } from "../dom";
import { serialText, shownValue } from "../live/show-value";
import type { Figure } from "./figure";

const MOST_ROWS = 40;

/** The numbers of a figure, evenly thinned: what a screen reader has in place of the picture. */
export function figureTable({ title, x, y, lines }: Figure): HTMLElement {
  const step = Math.max(1, Math.ceil(x.values.length / MOST_ROWS));
  const heads = [x.label, ...lines.map(({ label }) => label)];
  const rows = x.values.flatMap((value, index) => {
    if (index % step !== 0 && index !== x.values.length - 1) return [];
    const first = x.isTime ? serialText(value, true) : String(Number(value.toFixed(1))).replace("-", "−");
    const cells = lines.map(({ values }) => {
      const cell = values[index];
      return make("td", { class: "number" }, cell == null ? "" : shownValue(Number(cell.toFixed(3))));
    });
    return [make("tr", {}, make("th", { scope: "row", class: "number" }, first), ...cells)];
  });
  return make(
    "div",
    { class: "block-scroll tall", tabindex: "0", role: "region", "aria-label": `Numbers: ${title}` },
    make(
      "table",
      { class: "block" },
      make("caption", { class: "unseen" }, `${title}; ${y.label}${step > 1 ? `; every ${step}th row` : ""}`),
      make(
        "thead",
        {},
        make("tr", {}, ...heads.map((head) => make("th", { scope: "col", class: "number" }, head))),
      ),
      make("tbody", {}, ...rows),
    ),
  );
}
