// Everything in samples/: the logs, the workbooks that use them, and the list of these.

import type { WorkbookPlan } from "../../sheets";
import { certificateWorkbook } from "./certificate-workbook";
import { furnaceLog } from "./furnace-log";
import { furnaceLogWorkbook } from "./furnace-log-workbook";
import { lotWorkbook } from "./lot-workbook";
import { LOAD_LOG_FILE, steriliserLoad } from "./steriliser-load";
import { steriliserWorkbook } from "./steriliser-workbook";
import { surveyWorkbook } from "./survey-workbook";
import { SURVEY_LOG_FILE, uniformitySurvey } from "./uniformity-survey";

/** In the order in which they are offered; the first is open at the start. */
export const sampleWorkbooks = (): Record<string, WorkbookPlan> => ({
  "furnace-log.json": furnaceLogWorkbook(),
  "certificate.json": certificateWorkbook(),
  "tolerance-check.json": lotWorkbook(),
  "uniformity-survey.json": surveyWorkbook(),
  "steriliser-load.json": steriliserWorkbook(),
});

/** Text of each file by its name. */
export function sampleFiles(): Record<string, string> {
  const workbooks = sampleWorkbooks();
  const list = Object.entries(workbooks).map(([file, { name, sentence, invented }]) => ({
    file,
    name,
    sentence,
    invented,
  }));
  return {
    "furnace-log.csv": furnaceLog(),
    [SURVEY_LOG_FILE]: uniformitySurvey(),
    [LOAD_LOG_FILE]: steriliserLoad(),
    "index.json": `${JSON.stringify(list, null, 2)}\n`,
    ...Object.fromEntries(Object.entries(workbooks).map(([file, plan]) => [file, `${planText(plan)}\n`])),
  };
}

/** A cell to a line, so that a change shows as the cells that it changed. */
function planText(plan: WorkbookPlan): string {
  const sheets = plan.sheets.map((sheet) => {
    const { cells, ...rest } = sheet;
    const head = JSON.stringify(rest).slice(1, -1);
    const lines = cells.map((cell) => `    ${JSON.stringify(cell)}`);
    return `  {${head}, "cells": [\n${lines.join(",\n")}\n  ]}`;
  });
  const { name, sentence, invented } = plan;
  return `${JSON.stringify({ name, sentence, invented }).slice(0, -1)}, "sheets": [\n${sheets.join(",\n")}\n]}`;
}
