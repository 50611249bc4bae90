const entities: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" };

/** Text for XML, in an element or an attribute. */
export const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => entities[sign]!);

/** Signs that XML cannot hold, and what reads like their stand-in. */
// biome-ignore lint/suspicious/noControlCharactersInRegex: these are the ones that must not get into the file
const unwritable = /[\u0000-\u0008\u000b-\u001f\ufffe\uffff]|_(?=x[0-9a-f]{4}_)/gi;

/** A cell's text: what XML cannot hold stands as _xHHHH_, as in every workbook file. */
export const escapedText = (text: string): string =>
  escaped(
    text.replace(
      unwritable,
      (sign) => `_x${sign.charCodeAt(0).toString(16).toUpperCase().padStart(4, "0")}_`,
    ),
  );

/** The other way round. */
export const unescapedText = (text: string): string =>
  text.replace(/_x([0-9a-f]{4})_/gi, (_, code: string) => String.fromCharCode(Number.parseInt(code, 16)));

/** An element; attributes that are undefined are left out. */
export function element(
  name: string,
  attributes: Record<string, string | number | undefined> = {},
  ...content: string[]
): string {
  const written = Object.entries(attributes)
    .filter(([, value]) => value !== undefined)
    .map(([key, value]) => ` ${key}="${escaped(String(value))}"`)
    .join("");
  return content.length > 0 ? `<${name}${written}>${content.join("")}</${name}>` : `<${name}${written}/>`;
}

export const part = (root: string): string =>
  `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n${root}`;
