import { createServer, type IncomingMessage, type ServerResponse } from "node:http";
import { Refusal } from "./refusal";
import { sendJson } from "./send";

export type Call = { request: IncomingMessage; response: ServerResponse; url: URL };
type Handler = (call: Call) => Promise<void>;

type Options = { name: string; host: string; port: number; handler: Handler; requestTimeoutMs?: number };

const loopback = new Set(["localhost", "127.0.0.1", "[::1]"]);

/** A page elsewhere must not reach a fake by a name that points to loopback. */
function checkHost(url: URL, host: string): void {
  if (loopback.has(host) && !loopback.has(url.hostname)) throw new Refusal(403, "forbidden_host", "Unknown host name.");
}

function describe(error: unknown): Refusal {
  if (error instanceof Refusal) return error;
  console.error(error);
  return new Refusal(500, "application_error", "Something went wrong in the fake; see its log.");
}

/** One line a request. Never the query: it carries signatures. */
function logWhenDone({ request, response, url }: Call): void {
  const started = Date.now();
  response.once("close", () => {
    const status = response.writableFinished ? String(response.statusCode) : `${response.statusCode} cut off`;
    if (url.pathname !== "/__fake/health") {
      console.log(`${request.method} ${url.pathname.slice(0, 120)} ${status} ${Date.now() - started} ms`);
    }
  });
}

/** Serves on loopback with limits on time; a refusal becomes its JSON, anything unexpected a 500 and a log line. */
export function serveLoopback({
  name,
  host,
  port,
  handler,
  requestTimeoutMs = 120_000,
}: Options): Promise<{ close(): void }> {
  const server = createServer((request, response) => {
    const answer = async () => {
      const url = new URL(`http://${request.headers.host ?? "localhost"}${request.url ?? "/"}`);
      const call = { request, response, url };
      logWhenDone(call);
      checkHost(url, host);
      await handler(call);
    };
    answer().catch((error: unknown) => {
      // The caller went away: its request's log line says so.
      if (response.destroyed || request.errored) return void response.destroy();
      const refusal = describe(error);
      if (response.headersSent) return void response.destroy();
      if (!request.complete) response.setHeader("connection", "close");
      sendJson(response, refusal.status, refusal.body(), refusal.headers);
      // What is left of a refused body is thrown away: closing with bytes unread would lose the answer.
      request.resume();
    });
  });
  server.requestTimeout = requestTimeoutMs;
  server.headersTimeout = 10_000;
  server.keepAliveTimeout = 5_000;
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, host, () => {
      console.log(`${name} listens on http://${host}:${port}`);
      resolve({
        close: () => {
          server.close();
          server.closeAllConnections();
        },
      });
    });
  });
}
