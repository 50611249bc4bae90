import { describe, expect, it } from "vitest";
import * as worksheet from "../../src/functions";
import { surveyFigure } from "../../src/taskpane/look/survey";

Object.assign(globalThis, { BeadlineFunctions: worksheet });

describe("the picture of a survey", () => {
  const block = {
    times: [[0], [1], [2], [3]],
    readings: [
      [899, 903],
      [901, 904],
      [902, 903],
      [900, 904],
    ],
    names: ["S1", "S2"],
    setpoint: 900,
    tolerance: 10,
    whole: true,
  };

  it("names the worst sensor from readings as they are when there are no corrections", () => {
    expect(surveyFigure(block).figure.title).toMatch(/^S2 reaches \+4\.0/);
  });

  it("names it from corrected readings, as the survey functions judge them", () => {
    const { figure, sensors } = surveyFigure({ ...block, corrections: [3, -4] });
    expect(figure.title).toMatch(/^S1 reaches \+5\.0/);
    expect(sensors[1]?.highest).toBe(900);
  });
});
