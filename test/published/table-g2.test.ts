import { describe, expect, it } from "vitest";
import { coverageFactor, INFINITE_DOF } from "../../src/core/uncertainty";
import { fractions, tableG2 } from "./table-g2";

describe("JCGM 100:2008, table G.2", () => {
  it.each(tableG2.map(([dof, ...values]) => [dof, values] as const))("with ν = %d: %j", (dof, values) => {
    values.forEach((printed, i) => {
      const k = coverageFactor(Math.min(dof, INFINITE_DOF), (fractions[i] as number) / 100) as number;
      expect(Math.abs(k - printed)).toBeLessThanOrEqual(0.0005 + 1e-9);
    });
  });
});
