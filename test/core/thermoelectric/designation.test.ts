import { describe, expect, it } from "vitest";
import { thermocouple } from "../../../src/core";
import { inWords } from "../../../src/core/thermoelectric/designation";

describe("a designation in words", () => {
  it.each([
    ["K", "type K"],
    ["A-2", "type A-2"],
    ["Au/Pt", "Au/Pt"],
    ["Mo/W", "Mo/W"],
    ["Pt", "Pt"],
    ["A-2/B", "A-2/B"],
  ])("%s is %s: a letter is a type, with its number where it has one", (designation, words) => {
    expect(inWords(designation)).toBe(words);
  });
});

describe("the word type", () => {
  it("is left out at the front only", () => {
    expect(thermocouple("type Au/Pt")).toBe(thermocouple("Au/Pt"));
    expect(thermocouple("Au/type Pt")).toBeUndefined();
    expect(thermocouple("type type K")).toBeUndefined();
  });
});
