import { describe, expect, it } from "vitest";
import { pageFit } from "../../../src/local-sheet/print/page-fit";

/** Printable millimetres of the narrower paper, less 12 mm on each side: A4 upright, Letter on its side. */
const [upright, onItsSide] = [((210 - 24) / 25.4) * 72, ((279.4 - 24) / 25.4) * 72];

describe("fitting a sheet to the page", () => {
  it("leaves a narrow sheet upright and as wide as its text needs", () => {
    const fit = pageFit([150, 150]);
    expect(fit.wide).toBe(false);
    expect(fit.points).toBe(10);
    expect(fit.width).toBeLessThan(upright / 2);
  });

  it("leaves the text as much room in its column as it has in the grid, whose text is of 11 points", () => {
    for (let total = 100; total < 2000; total += 50) {
      const { points, width } = pageFit([total]);
      expect(width / points).toBeGreaterThan((total * 0.75) / 11);
    }
  });

  it("turns the page before the text becomes hard to read", () => {
    for (let total = 100; total < 4000; total += 50) {
      const { wide, points, width } = pageFit([total / 2, total / 2]);
      expect(width).toBeLessThanOrEqual(wide ? onItsSide : upright);
      if (!wide) expect(points).toBeGreaterThanOrEqual(7);
    }
    expect(pageFit([2000]).wide).toBe(true);
  });

  it("shares the width as the grid does", () => {
    expect(pageFit([100, 300]).shares).toEqual([25, 75]);
  });

  it("never makes text so small that nobody can read it", () => {
    expect(pageFit(new Array(40).fill(400)).points).toBe(5);
  });
});
