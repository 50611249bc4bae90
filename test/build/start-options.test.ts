import { expect, test } from "vitest";
import { DEFAULT_PORT } from "../../src/build/serve";
import { readStartOptions, USAGE } from "../../src/build/start-options";

test("without words: the default port, and serve", () => {
  expect(readStartOptions([])).toEqual({ port: DEFAULT_PORT, check: false, help: false });
});

test.each([
  [["--port", "5700"], { port: 5700 }],
  [["--port=5700"], { port: 5700 }],
  [["--check"], { check: true }],
  [["--help"], { help: true }],
  [["--check", "--port", "1"], { check: true, port: 1 }],
])("%j is understood", (words, expected) => {
  expect(readStartOptions(words)).toMatchObject(expected);
});

test.each([
  [["--prot", "5700"], '"--prot" is not known here'],
  [["5700"], '"5700" is not known here'],
  [["--check=yes"], '"--check=yes" is not known here'],
  [[""], '"" is not known here'],
  [["--port"], "--port needs a number"],
  [["--port", "0"], 'not "0"'],
  [["--port", "65536"], 'not "65536"'],
  [["--port", "80.5"], 'not "80.5"'],
  [["--port", "--check"], 'not "--check"'],
  [["--port="], 'not ""'],
])("%j is refused with a sentence", (words, sentence) => {
  const answer = readStartOptions(words);
  expect(answer).toHaveProperty("refused");
  expect("refused" in answer && answer.refused).toContain(sentence);
});

test("the help names every flag", () => {
  for (const flag of ["--port", "--check", "--help", String(DEFAULT_PORT)]) expect(USAGE).toContain(flag);
});
