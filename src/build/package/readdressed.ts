// The built files, with the addresses of the place where they will lie.

import { DEVELOPMENT_ADDRESS } from "../metadata";

/** The files that say where they lie; every other file says only what lies beside it. */
export const ADDRESSED = ["manifest.xml", "functions.json"];

/** A file with every development address replaced. The manifest's remark for developers goes. */
export function readdressed(text: string, address: string): string {
  return text.replace(/<!--(?:(?!-->)[\s\S])*-->\n?/, "").replaceAll(DEVELOPMENT_ADDRESS, address);
}

/** Addresses in functions.json that do not lie under the given one. */
export function strayHelpAddresses(functionsJson: string, address: string): string[] {
  const { functions } = JSON.parse(functionsJson) as { functions: { id: string; helpUrl?: string }[] };
  return functions
    .filter(({ helpUrl }) => !helpUrl?.startsWith(`${address}/`))
    .map(({ id, helpUrl }) => `functions.json: ${id} has its help at ${helpUrl}`);
}
