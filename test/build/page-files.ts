/** The files of our own that a built page names: the browser asks for them before it shows anything. */
const named = (page: string, pattern: RegExp): string[] =>
  [...page.matchAll(pattern)].map(([, file]) => file as string).filter((file) => !file.includes(":"));

export const stylesOf = (page: string): string[] => named(page, /<link [^>]*href="([^"]+\.css)"/g);

export const scriptsOf = (page: string): string[] => named(page, /<script [^>]*src="([^"]+)"/g);
