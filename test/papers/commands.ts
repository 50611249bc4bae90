/** Finds what a reader may type into a terminal. */

const COMMAND = /^([A-Z_]+=\S+ )?(npm|npx|bash|node) /;

/** Blocks that are said to be for the shell, line by line, and at each `&&`. */
function inBlocks(text: string): string[] {
  return [...text.matchAll(/^```(?:sh|bash|console)\n([\s\S]*?)^```/gm)].flatMap(([, block = ""]) =>
    block.split(/\n|&&/).map((line) => line.replace(/^\$ |#.*$/g, "").trim()),
  );
}

/** Inline code, which may run on over the end of a line. */
function inLine(text: string): string[] {
  return [...text.replace(/^```[\s\S]*?^```/gm, "").matchAll(/`([^`]+)`/g)].map(([, code = ""]) =>
    code.replace(/\s+/g, " ").trim(),
  );
}

/** Every line of a shell block counts, whatever it begins with; of inline code what begins like a command. */
export const commandsOf = (text: string): string[] => [
  ...new Set([...inBlocks(text).filter(Boolean), ...inLine(text).filter((code) => COMMAND.test(code))]),
];

/** Commands in the remarks of a source, which are inline code in one line. */
export const commandsInRemarks = (text: string): string[] => [
  ...new Set(
    text
      .split("\n")
      .filter((line) => /^\s*(\/\/|\/?\*)/.test(line))
      .flatMap((line) => [...line.matchAll(/`([^`]+)`/g)].map(([, code = ""]) => code))
      .filter((code) => COMMAND.test(code)),
  ),
];
