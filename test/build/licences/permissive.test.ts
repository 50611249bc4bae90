import { describe, expect, it } from "vitest";
import { isPermissive } from "../../../src/build/licences/permissive";

describe("a licence may ship", () => {
  it.each([
    "MIT",
    "Apache-2.0",
    "(MIT AND Zlib)",
    "MIT OR GPL-3.0-or-later",
    "GPL-2.0-only OR (MIT AND ISC)",
  ])("when it is %s", (expression) => {
    expect(isPermissive(expression)).toBe(true);
  });

  it.each([
    "",
    "GPL-3.0-only",
    "MIT AND GPL-3.0-only",
    "MPL-2.0",
    "UNLICENSED",
    "SEE LICENSE IN LICENSE",
    "MIT OR",
    "MIT ISC",
    "(MIT",
    "MIT WITH exception",
    "constructor",
  ])("but not when it is “%s”", (expression) => {
    expect(isPermissive(expression)).toBe(false);
  });

  it("binds AND closer than OR", () => {
    expect(isPermissive("MIT OR ISC AND GPL-3.0-only")).toBe(true);
    expect(isPermissive("GPL-3.0-only AND MIT OR MPL-2.0 AND MIT")).toBe(false);
  });
});
