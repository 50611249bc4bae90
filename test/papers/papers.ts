/** The papers: every Markdown file of ours, and the remarks in the sources that name a command. */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";

export interface Paper {
  readonly file: string;
  readonly text: string;
}

const FOLDERS = ["src", "test", "samples", ".ci"];

const read = (file: string): Paper => ({ file, text: readFileSync(file, "utf8").replaceAll("\r\n", "\n") });

const files = [
  ...readdirSync("."),
  ...FOLDERS.flatMap((folder) =>
    readdirSync(folder, { recursive: true, encoding: "utf8" }).map((file) => join(folder, file)),
  ),
].map((file) => file.replaceAll("\\", "/"));

export const papers: readonly Paper[] = files.filter((file) => file.endsWith(".md")).map(read);

export const sources: readonly Paper[] = files.filter((file) => /\.(ts|mts|mjs)$/.test(file)).map(read);
