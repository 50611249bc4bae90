import { describe, expect, it } from "vitest";
import { sniff } from "../../../src/local-sheet/csv/sniff";

const lines = (...text: string[]) => text.join("\n");

describe("the format of a log", () => {
  it.each([
    [
      "comma and point",
      lines("time,CH1 mV", "2026-03-02 06:00:00,4.096", "2026-03-02 06:00:30,4.1"),
      ",",
      ".",
      "ymd",
    ],
    [
      "semicolon and comma",
      lines("Zeit;CH1 mV", "02.03.2026 06:00;4,096", "13.03.2026 06:01;4,1"),
      ";",
      ",",
      "dmy",
    ],
    ["semicolon and point", lines("t;a;b", "1;2.5;3", "2;2.5;"), ";", ".", "none"],
    ["tabs", lines("t\ta", "1\t4,5", "2\t4,7"), "\t", ",", "none"],
    ["bars", lines("t|a", "1|4.5"), "|", ".", "none"],
    ["quoted decimal commas between commas", lines("t,a", '1,"4,5"', '2,"4,7"'), ",", ",", "none"],
    ["month first", lines("t,a", "03/02/2026 06:00,1.5", "03/13/2026 06:00,1.5"), ",", ".", "mdy"],
    ["times of day", lines("t;a", "06:00:00;1,5"), ";", ",", "ymd"],
  ])("is detected: %s", (_, text, delimiter, decimal, dates) => {
    expect(sniff(text)).toEqual({ delimiter, decimal, dates, hasHeader: true });
  });

  it("takes remarks in front for no part of the table", () => {
    expect(sniff(lines("# a, b, c, d", "# e; f; g", "t;a", "1;2,5"))).toMatchObject({
      delimiter: ";",
      decimal: ",",
    });
  });

  it("sees that the first row is already a reading", () => {
    expect(sniff(lines("1;2,5", "2;2,6")).hasHeader).toBe(false);
  });

  it("does not stumble over an empty text or one column", () => {
    expect(sniff("").hasHeader).toBe(false);
    expect(sniff(lines("CH1 mV", "4.096", "4.097"))).toMatchObject({ decimal: ".", hasHeader: true });
  });
});
