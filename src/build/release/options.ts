// What `npm run release` may be told on its command line.

export const USAGE = `npm run release -- 0.2.0     sets the version everywhere, closes its section of the changelog, freezes its results
  --check      says what it would do, and changes nothing
  --help       this text
It commits and pushes nothing.`;

export interface ReleaseOptions {
  version: string;
  check: boolean;
}

export function readReleaseOptions(
  words: readonly string[],
): ReleaseOptions | { help: true } | { refused: string } {
  if (words.includes("--help")) return { help: true };
  const versions = words.filter((word) => word !== "--check");
  const [version] = versions;
  if (version === undefined) return { refused: "Which version? Three numbers, such as 0.2.0." };
  const stranger =
    versions.find((word) => !/^(0|[1-9]\d{0,3})(\.(0|[1-9]\d{0,3})){2}$/.test(word)) ?? versions[1];
  if (stranger !== undefined)
    return {
      refused: `"${stranger}" is not known here: one version of three numbers, and --check or --help.`,
    };
  return { version, check: words.includes("--check") };
}
