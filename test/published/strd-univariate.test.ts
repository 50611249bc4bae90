import { describe, expect, it } from "vitest";
import { type TypeA, typeA } from "../../src/core/uncertainty";
import { certifiedUnivariate } from "./certified";
import { univariateSets } from "./strd-univariate";

describe("NIST StRD, univariate summary statistics", () => {
  it.each(certifiedUnivariate())("$set, $what: more than $asked digits agree", (value) => {
    expect(value).toMatchObject({ holds: true });
  });

  it.each(univariateSets)(
    "$name: u of the mean is s/√n with n − 1 degrees of freedom",
    ({ sd, readings }) => {
      const found = typeA(readings) as TypeA;
      expect(found.u).toBeCloseTo(sd / Math.sqrt(readings.length), 12);
      expect(found.dof).toBe(readings.length - 1);
    },
  );
});
