import { expect, it } from "vitest";
import { eachAgrees } from "./agrees";
import { gumSets } from "./gum";
import { gumH1Sets } from "./gum-h1";
import { gumH2Sets, printedCorrelations } from "./gum-h2";

eachAgrees([...gumSets, ...gumH1Sets, ...gumH2Sets]);

it.each(printedCorrelations)(
  "GUM H.2: the readings from memory have the printed r of %s, %d",
  (_, printed, r) => {
    expect(r).toBeCloseTo(printed, 2);
  },
);
