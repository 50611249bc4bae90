// A small web server for the built pages, for this machine only: it listens on the loopback address, and it
// answers only to loopback names, so that a page elsewhere cannot reach it by pointing its own name here.

import { createServer, type IncomingMessage, type Server, type ServerResponse } from "node:http";
import type { AddressInfo } from "node:net";
import sirv from "sirv";

export const DEFAULT_PORT = 5606;
const PORTS_TRIED = 50;
const LOOPBACK = "127.0.0.1";
const LOOPBACK_NAME = /^(localhost|127\.0\.0\.1|\[::1\])(:\d{1,5})?$/i;

/** Types whose text would otherwise be read in whatever character set the browser guesses. */
const UTF8_TYPES: Record<string, string> = {
  ".css": "text/css;charset=utf-8",
  ".csv": "text/csv;charset=utf-8",
  ".js": "text/javascript;charset=utf-8",
};

export interface Serving {
  address: string;
  port: number;
  close(): Promise<void>;
}

/** Serves a directory, `sheet.html` at `/`, on the given port or the next free one after it. */
export async function serve(directory: string, options: { port?: number } = {}): Promise<Serving> {
  const files = sirv(directory, {
    dev: true, // looks at the disk each time, so a rebuild shows without a restart; sends no-store
    onNoMatch: (_request, response) => refuse(response, 404, "There is no such file here."),
    setHeaders: (response, path) => {
      const type = UTF8_TYPES[path.slice(path.lastIndexOf("."))];
      if (type !== undefined) response.setHeader("Content-Type", type);
    },
  });
  const server = createServer((request, response) => {
    response.setHeader("Cache-Control", "no-store");
    response.setHeader("X-Content-Type-Options", "nosniff");
    response.setHeader("Cross-Origin-Resource-Policy", "same-origin");
    response.setHeader("Referrer-Policy", "no-referrer");
    if (!LOOPBACK_NAME.test(request.headers.host ?? "")) {
      refuse(response, 403, "This server answers only to localhost, 127.0.0.1 and [::1].");
    } else if (request.method !== "GET" && request.method !== "HEAD") {
      refuse(response, 405, "This server only hands out files.");
    } else {
      request.url = withFrontPage(request);
      files(request, response);
    }
  });
  const port = await listenOnFreePort(server, options.port ?? DEFAULT_PORT);
  return { address: `http://${LOOPBACK}:${port}/`, port, close: () => close(server) };
}

function withFrontPage(request: IncomingMessage): string {
  const url = request.url ?? "/";
  return /^\/(\?|$)/.test(url) ? `/sheet.html${url.slice(1)}` : url;
}

function refuse(response: ServerResponse, status: number, sentence: string): void {
  response.writeHead(status, { "Content-Type": "text/plain;charset=utf-8" });
  response.end(`${sentence}\n`);
}

async function listenOnFreePort(server: Server, first: number): Promise<number> {
  const last = Math.min(first + PORTS_TRIED - 1, 65_535);
  for (let port = first; port <= last; port++) {
    if (await listens(server, port)) return (server.address() as AddressInfo).port;
  }
  throw new Error(`Every port from ${first} to ${last} is taken. Name another with --port.`);
}

/** True when the server now listens there, false when another program does. */
function listens(server: Server, port: number): Promise<boolean> {
  return new Promise((resolve, reject) => {
    const onError = (error: NodeJS.ErrnoException) => {
      server.off("listening", onListening);
      if (error.code === "EADDRINUSE") resolve(false);
      else if (error.code === "EACCES") reject(new Error(`Port ${port} may not be used by this account.`));
      else reject(error);
    };
    const onListening = () => {
      server.off("error", onError);
      resolve(true);
    };
    server.once("error", onError);
    server.once("listening", onListening);
    server.listen(port, LOOPBACK);
  });
}

function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections(); // a browser keeps its connections open long after the last request
  });
}
