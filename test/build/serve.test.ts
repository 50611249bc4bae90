import { mkdir, mkdtemp, rm, writeFile } from "node:fs/promises";
import { type IncomingMessage, request } from "node:http";
import { createServer } from "node:net";
import { networkInterfaces, tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, afterEach, beforeAll, expect, test } from "vitest";
import { type Serving, serve } from "../../src/build/serve";

const FIRST_PORT = 45_606;
let folder: string;
const open: Serving[] = [];

async function started(port = FIRST_PORT): Promise<Serving> {
  const serving = await serve(join(folder, "dist"), { port });
  open.push(serving);
  return serving;
}

/** The raw client: fetch would not let a test choose the Host header. */
function get(
  port: number,
  path: string,
  options: { host?: string; method?: string; address?: string } = {},
): Promise<{ status: number; headers: IncomingMessage["headers"]; body: string }> {
  return new Promise((resolve, reject) => {
    const { host = `localhost:${port}`, method = "GET", address = "127.0.0.1" } = options;
    const sent = request(
      { host: address, port, path, method, agent: false, headers: { Host: host } },
      (response) => {
        let body = "";
        response.setEncoding("utf8");
        response.on("data", (text: string) => {
          body += text;
        });
        response.on("end", () =>
          resolve({ status: response.statusCode ?? 0, headers: response.headers, body }),
        );
      },
    );
    sent.on("error", reject);
    sent.end();
  });
}

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), "beadline-serve-"));
  await mkdir(join(folder, "dist", "samples"), { recursive: true });
  await writeFile(join(folder, "outside.txt"), "not for the web");
  await writeFile(join(folder, "dist", "sheet.html"), "<title>the sheet</title>");
  await writeFile(join(folder, "dist", "functions.js"), "// °C");
  await writeFile(join(folder, "dist", "functions.json"), "{}");
  await writeFile(join(folder, "dist", "samples", "log.csv"), "terminal °C");
});
afterEach(async () => {
  for (const serving of open.splice(0)) await serving.close();
});
afterAll(() => rm(folder, { recursive: true, force: true }));

test("the sheet stands at the root of the address, and the address is a loopback one", async () => {
  const { address, port } = await started();
  expect(address).toBe(`http://127.0.0.1:${port}/`);
  const response = await fetch(address);
  expect(response.status).toBe(200);
  expect(await response.text()).toContain("the sheet");
  expect((await get(port, "/?sample=1")).body).toContain("the sheet");
});

test.each([
  ["/sheet.html", "text/html;charset=utf-8"],
  ["/functions.js", "text/javascript;charset=utf-8"],
  ["/functions.json", "application/json"],
  ["/samples/log.csv", "text/csv;charset=utf-8"],
])("%s comes as %s, is not kept and not guessed at", async (path, type) => {
  const { port } = await started();
  const { status, headers } = await get(port, path);
  expect(status).toBe(200);
  expect(headers["content-type"]).toBe(type);
  expect(headers["cache-control"]).toBe("no-store");
  expect(headers["x-content-type-options"]).toBe("nosniff");
});

test("a taken port is left alone and the next free one is used", async () => {
  const first = await started();
  const second = await started(first.port);
  expect(second.port).toBeGreaterThan(first.port);
  expect((await get(second.port, "/")).status).toBe(200);
});

test("a port taken by any other program counts as taken", async () => {
  const other = createServer();
  await new Promise<void>((resolve) => other.listen(FIRST_PORT + 200, "127.0.0.1", resolve));
  try {
    expect((await started(FIRST_PORT + 200)).port).toBeGreaterThan(FIRST_PORT + 200);
  } finally {
    other.close();
  }
});

test.each(["localhost", "LOCALHOST:1", "127.0.0.1:5606", "[::1]:5606"])(
  "the host name %s is answered",
  async (host) => {
    const { port } = await started();
    expect((await get(port, "/", { host })).status).toBe(200);
  },
);

test.each(["example.test", "localhost.example.test", "127.0.0.1.example.test:5606", "192.168.0.1"])(
  "the host name %j is refused, so that another site cannot point its name here",
  async (host) => {
    const { port } = await started();
    const { status, body } = await get(port, "/", { host });
    expect(status).toBe(403);
    expect(body).not.toContain("the sheet");
  },
);

test("no other address of this machine is listened on", async () => {
  const { port } = await started();
  const others = Object.values(networkInterfaces())
    .flatMap((list) => list ?? [])
    .filter(({ internal, family }) => !internal && family === "IPv4")
    .map(({ address }) => address);
  // Only Linux answers for the whole 127 block; elsewhere a call there waits for ever.
  const block = process.platform === "linux" ? ["127.0.0.2"] : [];
  for (const address of [...others, ...block]) {
    await expect(get(port, "/", { address })).rejects.toThrow();
  }
});

test.each(["/../outside.txt", "/%2e%2e/outside.txt", "/..%2foutside.txt", "/nothing.html", "/samples"])(
  "%s leads to no file",
  async (path) => {
    const { port } = await started();
    const { status, body } = await get(port, path);
    expect(status).toBe(404);
    expect(body).not.toContain("not for the web");
  },
);

test("files are handed out, never taken in", async () => {
  const { port } = await started();
  expect((await get(port, "/sheet.html", { method: "POST" })).status).toBe(405);
  expect((await get(port, "/sheet.html", { method: "HEAD" })).status).toBe(200);
});

test("after closing, the port is free again", async () => {
  const { port, close } = await started();
  await close();
  await expect(get(port, "/")).rejects.toThrow();
  expect((await started(port)).port).toBe(port);
});
