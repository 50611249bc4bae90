import { type FilledSheet, filled, type WorkbookPlan } from "../../sheets";

/** A sample as the list of them names it. */
export interface Sample {
  file: string;
  name: string;
  sentence: string;
  invented: boolean;
}

const folder = "samples/";

export async function sampleList(): Promise<Sample[]> {
  return JSON.parse(await read("index.json"));
}

/** The sheets of a sample with all their readings. */
export async function sampleSheets({ file }: Sample): Promise<FilledSheet[]> {
  const plan: WorkbookPlan = JSON.parse(await read(file));
  return Promise.all(plan.sheets.map((sheet) => filled(sheet, read)));
}

async function read(file: string): Promise<string> {
  const response = await fetch(folder + file);
  if (!response.ok) throw new Error(`the sample file ${file} could not be read (${response.status})`);
  return response.text();
}
