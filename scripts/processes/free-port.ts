import { createServer } from "node:net";

function canListen(port: number, host: string): Promise<boolean> {
  return new Promise((resolve) => {
    const server = createServer();
    server.once("error", (error: NodeJS.ErrnoException) => resolve(error.code === "EADDRNOTAVAIL"));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** Free on both loopback addresses: `localhost` may be looked up as either. */
async function isFree(port: number): Promise<boolean> {
  return (await canListen(port, "127.0.0.1")) && (await canListen(port, "::1"));
}

const handedOut = new Set<number>();

function anyPort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen(0, "127.0.0.1", () => {
      const address = server.address();
      server.close(() =>
        typeof address === "object" && address ? resolve(address.port) : reject(new Error("no port")),
      );
    });
  });
}

/** A free loopback port: the preferred one, or the next free one after it; without a preference any. Never the same twice in a run. */
export async function freePort(preferred?: number): Promise<number> {
  for (let attempt = 0; attempt < 200; attempt += 1) {
    const port = preferred === undefined ? await anyPort() : preferred + attempt;
    if (handedOut.has(port) || !(await isFree(port))) continue;
    handedOut.add(port);
    return port;
  }
  throw new Error(`No free port found${preferred === undefined ? "" : ` from ${preferred} on`}.`);
}
