// What `npm start` may be told on its command line.

import { DEFAULT_PORT } from "./serve";

export const USAGE = `npm start                    build, show what the functions make of the sample log, serve the sheet
npm start -- --port 5700     the same on another port (default ${DEFAULT_PORT}; the next free one when taken)
npm start -- --check         build, show what the functions make of the sample log, and end
npm start -- --help          this text`;

export interface StartOptions {
  port: number;
  check: boolean;
  help: boolean;
}

/** Reads the command line; what it does not know it refuses with a sentence. */
export function readStartOptions(words: readonly string[]): StartOptions | { refused: string } {
  const options: StartOptions = { port: DEFAULT_PORT, check: false, help: false };
  for (let i = 0; i < words.length; i++) {
    const word = words[i] ?? "";
    const [flag, joined] = splitAtEquals(word);
    if (word === "--check") options.check = true;
    else if (word === "--help") options.help = true;
    else if (flag === "--port") {
      const value = joined ?? words[++i];
      if (value === undefined) return { refused: "--port needs a number after it, such as --port 5700." };
      const port = Number(value);
      if (!/^\d+$/.test(value) || port < 1 || port > 65_535) {
        return { refused: `--port takes a whole number from 1 to 65535, not "${value}".` };
      }
      options.port = port;
    } else return { refused: `"${word}" is not known here. Known are --port, --check and --help.` };
  }
  return options;
}

function splitAtEquals(word: string): [string, string | undefined] {
  const at = word.indexOf("=");
  return at < 0 ? [word, undefined] : [word.slice(0, at), word.slice(at + 1)];
}
