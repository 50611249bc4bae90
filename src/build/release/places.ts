// Where the version stands. Everything else that names it is generated from these.

interface Place {
  file: string;
  /** The words around it, with the version in their midst. */
  words: (version: string) => string;
}

export const places: readonly Place[] = [
  { file: "package.json", words: (version) => `"name": "beadline",\n  "version": "${version}"` },
  { file: "package-lock.json", words: (version) => `"name": "beadline",\n  "version": "${version}"` },
  { file: "package-lock.json", words: (version) => `"name": "beadline",\n      "version": "${version}"` },
  { file: "src/functions/version.ts", words: (version) => `version = "${version}"` },
  {
    file: "src/functions/record/provenance.ts",
    words: (version) => `@example =BEAD.PROVENANCE("version") → "${version}"`,
  },
  // Manifests count in four numbers.
  { file: "manifest.xml", words: (version) => `<Version>${version}.0</Version>` },
];

export interface Changed {
  file: string;
  text: string;
}

/** The files with the new version in place of the old, or where the old one was not found as expected. */
export function versionSet(
  read: (file: string) => string,
  before: string,
  after: string,
): { changed: Changed[] } | { missing: string[] } {
  const texts = new Map<string, string>();
  const missing: string[] = [];
  for (const { file, words } of places) {
    const text = texts.get(file) ?? read(file);
    const parts = text.split(words(before));
    if (parts.length !== 2) missing.push(`${file} does not say ${JSON.stringify(words(before))} once`);
    texts.set(file, parts.join(words(after)));
  }
  return missing.length > 0 ? { missing } : { changed: [...texts].map(([file, text]) => ({ file, text })) };
}
