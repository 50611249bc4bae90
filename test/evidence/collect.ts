/** All the evidence there is: every published value that the tests hold, residuals, and certified digits. */
import { conversionGroups } from "./conversion-groups";
import type { Group } from "./group";
import { judgementGroups } from "./judgement-groups";
import { conversionResiduals, type Residuals } from "./residuals";
import { sensorGroups } from "./sensor-groups";
import { type CertifiedDigits, certifiedDigits } from "./strd";
import { surveyGroups } from "./survey-groups";
import { uncertaintyGroups } from "./uncertainty-groups";

export interface Evidence {
  readonly groups: readonly Group[];
  readonly residuals: readonly Residuals[];
  readonly certified: readonly CertifiedDigits[];
}

export const collectEvidence = (): Evidence => ({
  groups: [...conversionGroups, ...sensorGroups, ...judgementGroups, ...uncertaintyGroups, ...surveyGroups],
  residuals: conversionResiduals(),
  certified: certifiedDigits(),
});

/** What falls short, in words; empty when everything holds. */
export const shortfalls = ({ groups, residuals, certified }: Evidence): string[] => [
  ...groups.flatMap(({ source, rows }) =>
    rows
      .filter(({ holds }) => !holds)
      .map(({ what, published, ours }) => `${source}: ${what}: published ${published}, ours ${ours}`),
  ),
  ...residuals
    .filter(({ holds }) => !holds)
    .map(({ name, worstDegrees }) => `${name}: the inverse is off by up to ${worstDegrees} °C`),
  ...certified
    .filter(({ holds }) => !holds)
    .map(({ set, values, digits }) => `NIST StRD ${set}: ${values} agree to ${digits} digits only`),
];
