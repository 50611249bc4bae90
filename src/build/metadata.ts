// functions.json: what Excel is told of each function. The generator reads the JSDoc; the build puts right what it
// cannot know.

import { generateCustomFunctionsMetadata } from "custom-functions-metadata";
import type { DocumentedFunction } from "./sources";

/** Where the add-in is served while it is developed; packaging for a host replaces it. */
export const DEVELOPMENT_ADDRESS = "https://localhost:3000";

interface Metadata {
  allowErrorForDataTypeAny?: boolean;
  allowCustomDataForDataTypeAny?: boolean;
  functions: FunctionMetadata[];
}

interface FunctionMetadata {
  id: string;
  name: string;
  description: string;
  helpUrl?: string;
  parameters: {
    name: string;
    description: string;
    type: string;
    dimensionality?: string;
    optional?: boolean;
  }[];
  result: { type: string; dimensionality: string };
}

const oneLine = (text: string): string => text.replace(/\s+/g, " ").trim();

export async function metadata(documented: readonly DocumentedFunction[]): Promise<Metadata> {
  const generated = await generateCustomFunctionsMetadata(documented.map(({ file }) => file));
  if (generated.errors.length > 0) throw new Error(generated.errors.join("\n"));
  const { functions } = JSON.parse(generated.metadataJson) as Metadata;
  return {
    // Without it Excel does not even call a function whose range holds an error: one #N/A would kill a column.
    // The generator's `allowCustomDataForDataTypeAny` is left out: nothing here needs data types, and a
    // volume-licensed Excel 2021 crashed on them.
    allowErrorForDataTypeAny: true,
    functions: functions.map((entry) => ({
      ...entry,
      description: oneLine(entry.description),
      helpUrl: `${DEVELOPMENT_ADDRESS}/help.html#${entry.id}`,
      parameters: entry.parameters.map((parameter) => ({
        ...parameter,
        description: oneLine(parameter.description),
      })),
    })),
  };
}
