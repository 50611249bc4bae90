import { describe, expect, it } from "vitest";
import { CORRECTED, PROVENANCE, TEMPERATURE, WORKING } from "../../src/functions";
import { columnOf, one, readable } from "./call";

describe("WORKING", () => {
  const none = undefined;
  const points = columnOf(0, 1000);
  const values = columnOf(-1, -2);

  it("ends in the result that TEMPERATURE gives, and its check gives the reading back", () => {
    const cells = WORKING(one(20), one("K"), one(23));
    expect(cells[0]).toEqual(["step", "value", "equation", "source"]);
    expect(cells.at(-1)?.[1]).toBe(TEMPERATURE(one(20), one("K"), one(23))[0]?.[0]);
    const check = cells.find(([step]) => String(step).startsWith("check"));
    expect(check?.[1]).toBeCloseTo(20, 10);
    for (const row of cells) for (const cell of row) expect(cell).not.toBe("");
  });

  it("shows the segment of a couple that has several", () => {
    const sources = WORKING(one(10), one("R"), one(20), none, none, none, none, none, one("source"));
    expect(sources.flat().join("\n")).toContain("type R, segment 1 of 3, -50 °C to 1064.18 °C");
  });

  it("adds the certificate's correction, in the call's unit", () => {
    const cells = WORKING(
      one(20),
      one("K"),
      one(73.4),
      columnOf(32, 1832),
      columnOf(-1.8, -3.6),
      none,
      none,
      none,
      none,
      one("F"),
    );
    const t = TEMPERATURE(one(20), one("K"), one(73.4), one("F"));
    const corrected = CORRECTED(
      t,
      columnOf(32, 1832),
      columnOf(-1.8, -3.6),
      none,
      none,
      none,
      none,
      one("F"),
    );
    expect(cells.at(-1)?.[0]).toBe("result, °F");
    expect(cells.at(-1)?.[1]).toBeCloseTo(corrected[0]?.[0] as number, 9);
  });

  it("refuses what the functions behind it refuse", () => {
    expect(readable(WORKING(one(99), one("K"), one(20)))[0]?.[0]).toMatch(
      /^#N\/A EMF 99 mV .* above the limit of type K/,
    );
    expect(readable(WORKING(one(20), one("K"), one(23), points))).toEqual([
      ["#VALUE! points and values belong together: values missing"],
    ]);
    expect(readable(WORKING(one(20), one("K"), one(23), columnOf(900, 1000), values))[0]?.[0]).toMatch(
      /outside the certificate's points/,
    );
  });
});

describe("PROVENANCE", () => {
  it("spills version and publications under a header", () => {
    const cells = PROVENANCE();
    expect(cells[0]).toEqual(["subject", "detail"]);
    expect(cells[1]).toEqual(["version", PROVENANCE(one("version"))[0]?.[0]]);
    expect(cells.slice(2).map(([citation]) => [citation])).toEqual(PROVENANCE(one("publications")));
  });
});
