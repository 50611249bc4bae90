import { describe, expect, it } from "vitest";
import { inverseBands } from "./inverse-bands";

describe("the published inverse approximations (NIST SRD 60)", () => {
  it.each(inverseBands())(
    "type $type, $emfRange mV: the exact inverse lies within the printed band $errorBand °C",
    ({ holds }) => {
      expect(holds).toBe(true);
    },
  );
});
