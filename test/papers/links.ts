/** Finds the links of a paper, and what they may lead to. */

const withoutCode = (text: string): string => text.replace(/^```[\s\S]*?^```/gm, "").replace(/`[^`]*`/g, "");

/** In Markdown and in HTML, pictures too. */
export function linksOf(text: string): string[] {
  const plain = withoutCode(text);
  return [
    ...[...plain.matchAll(/\]\(\s*<?([^)\s>]+)/g)].map(([, target = ""]) => target),
    ...[...plain.matchAll(/\s(?:href|src|srcset)="([^"\s]+)/g)].map(([, target = ""]) => target),
    ...[...plain.matchAll(/^\[[^\]]+\]:\s*(\S+)/gm)].map(([, target = ""]) => target),
  ];
}

/** The anchors that a reader's page makes of the headings: small letters, hyphens, and a number where one comes again. */
export function anchorsOf(text: string): string[] {
  const taken = new Map<string, number>();
  return [...text.replace(/^```[\s\S]*?^```/gm, "").matchAll(/^#{1,6} +(.+?) *#*$/gm)].map(
    ([, heading = ""]) => {
      const anchor = heading
        .toLowerCase()
        .replace(/[^\p{L}\p{N}\p{M}_\- ]/gu, "")
        .replaceAll(" ", "-");
      const before = taken.get(anchor) ?? 0;
      taken.set(anchor, before + 1);
      return before === 0 ? anchor : `${anchor}-${before}`;
    },
  );
}

/** Inline code that names a file or folder of the repository, or of what is built. */
export const pathsOf = (text: string): string[] =>
  [
    ...text
      .replace(/^```[\s\S]*?^```/gm, "")
      .matchAll(/`((?:src|test|samples|evidence|dist|\.ci)\/[\w./-]+)`/g),
  ].map(([, path = ""]) => path);
