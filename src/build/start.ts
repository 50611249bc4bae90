// `npm start`: build, show what the built functions made of the sample log, then serve the sheet.

import { spawn } from "node:child_process";
import { readFile } from "node:fs/promises";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { checkSample } from "./check";
import { serve } from "./serve";
import { readStartOptions, USAGE } from "./start-options";

const ROOT = join(dirname(fileURLToPath(import.meta.url)), "..", "..");
const SAMPLE = "samples/furnace-log.csv";

async function start(words: string[]): Promise<number> {
  const options = readStartOptions(words);
  if ("refused" in options) {
    console.error(`${options.refused}\n\n${USAGE}`);
    return 2;
  }
  if (options.help) {
    console.log(USAGE);
    return 0;
  }

  console.log("Building ...");
  const built = await build();
  if (built.status !== 0) {
    console.error(`${built.output}\nThe build failed; its output stands above.`);
    return 1;
  }

  const dist = join(ROOT, "dist");
  const check = checkSample(
    await readFile(join(dist, "functions.js"), "utf8"),
    await readFile(join(ROOT, SAMPLE), "utf8"),
  );
  console.log(`\nWhat dist/functions.js makes of ${SAMPLE} (invented data):`);
  for (const line of check.lines) console.log(`  ${line}`);
  if (check.temperatures === 0) {
    console.error("\nNot one reading became a temperature: the built functions do not work.");
    return 1;
  }
  if (options.check) return 0;

  const serving = await serve(dist, { port: options.port });
  if (serving.port !== options.port)
    console.log(`\nPort ${options.port} is taken; ${serving.port} was free.`);
  console.log(`\nOpen ${serving.address} in a browser. Ctrl-C ends it.`);
  await interrupted();
  await serving.close();
  console.log("\nClosed.");
  return 0;
}

/** Runs `npm run build` and keeps its output back: it matters only when the build fails. */
function build(): Promise<{ status: number; output: string }> {
  const npm = process.env.npm_execpath; // the very npm that was called; a bare "npm" is a script on Windows
  const child = npm?.endsWith("js")
    ? spawn(process.execPath, [npm, "run", "build"], { cwd: ROOT })
    : spawn("npm run build", { cwd: ROOT, shell: true });
  const output: Buffer[] = [];
  child.stdout.on("data", (data: Buffer) => output.push(data));
  child.stderr.on("data", (data: Buffer) => output.push(data));
  return new Promise((resolve, reject) => {
    child.on("error", reject);
    child.on("close", (code) =>
      resolve({ status: code ?? 1, output: Buffer.concat(output).toString("utf8") }),
    );
  });
}

function interrupted(): Promise<void> {
  return new Promise((resolve) => {
    process.once("SIGINT", () => resolve());
    process.once("SIGTERM", () => resolve());
  });
}

start(process.argv.slice(2)).then(
  (status) => {
    process.exitCode = status;
  },
  (error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  },
);
