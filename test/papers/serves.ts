/**
 * `npx tsx test/papers/serves.ts "npm start"`: runs a command that serves the local sheet, opens what it says it serves,
 * ends it as Ctrl-C does, and fails unless all of this went well.
 */
import { spawn } from "node:child_process";

const command = process.argv[2] ?? "";
const SERVED = /Open (http:\/\/127\.0\.0\.1:\d+\/) in a browser/;

// A group of its own, which gets the signal as a whole, as from a terminal.
const child = spawn(command, { shell: true, detached: true, stdio: ["ignore", "pipe", "inherit"] });
const ended = new Promise<number | null>((resolve) => child.on("close", resolve));

let printed = "";
const address = await new Promise<string>((resolve, reject) => {
  child.stdout.on("data", (data: Buffer) => {
    process.stdout.write(data);
    printed += data;
    const found = SERVED.exec(printed)?.[1];
    if (found !== undefined) resolve(found);
  });
  void ended.then((status) => reject(new Error(`"${command}" ended with ${status} and served nothing.`)));
});

const page = await fetch(address);
const text = await page.text();
process.kill(-(child.pid as number), "SIGINT");
await ended;
const port = /--port (\d+)/.exec(command)?.[1];

if (!page.ok || !text.includes("<title>Beadline local sheet</title>"))
  throw new Error(`${address} gave ${page.status} and not the sheet.`);
if (port !== undefined && new URL(address).port !== port)
  throw new Error(`${address} is not on port ${port}.`);
// Not by its status: the shell around it ends by the signal.
if (!printed.trimEnd().endsWith("Closed."))
  throw new Error(`"${command}" did not close its server at Ctrl-C.`);
