import { createServer, request } from "node:http";
import { once } from "node:events";
import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import { callFrom } from "@/lib/http/call";
import { notePeers } from "@/lib/http/note-peers";
import { PEER_HEADER } from "@/lib/http/peer-header";
import { peerNetwork } from "@/lib/http/peer-network";

const settings = vi.hoisted(() => ({ trustProxy: false }));
vi.mock("@/lib/env", () => ({ env: () => ({ TRUST_PROXY: settings.trustProxy }) }));

const seen: Record<string, string | string[] | undefined>[] = [];
const server = createServer((incoming, answer) => {
  seen.push(incoming.headers);
  answer.end();
});

beforeAll(async () => {
  notePeers();
  server.listen(0, "127.0.0.1");
  await once(server, "listening");
});
afterAll(() => server.close());

async function headersAfter(headers: Record<string, string>) {
  const address = server.address();
  if (!address || typeof address === "string") throw new Error("the server has no port");
  const [answer] = await once(request({ port: address.port, host: "127.0.0.1", headers }).end(), "response");
  answer.resume();
  return seen.at(-1);
}

describe("where a request comes from", () => {
  it("is the address of its connection, whatever the client claims", async () => {
    expect(await headersAfter({ [PEER_HEADER]: "203.0.113.9" })).toMatchObject({ [PEER_HEADER]: "127.0.0.1" });
  });

  it("is not read from X-Forwarded-For unless a proxy is trusted", () => {
    const headers = new Headers({ "x-forwarded-for": "203.0.113.9", [PEER_HEADER]: "127.0.0.1" });
    settings.trustProxy = false;
    expect(callFrom(headers).ip).toBe("127.0.0.1");
  });

  it("is the last entry that the trusted proxy wrote, not what its client put before it", () => {
    settings.trustProxy = true;
    expect(callFrom(new Headers({ "x-forwarded-for": "198.51.100.1, 203.0.113.9" })).ip).toBe("203.0.113.9");
  });

  it.each([
    ["203.0.113.9", "203.0.113.9"],
    ["::ffff:203.0.113.9", "203.0.113.9"],
    ["2001:db8:1:2:3:4:5:6", "2001:db8:1:2::/64"],
    ["2001:0DB8:1:2::6", "2001:db8:1:2::/64"],
    ["2001:db8::9", "2001:db8:0:0::/64"],
    ["fe80::1%eth0", "fe80:0:0:0::/64"],
    ["::1", "0:0:0:0::/64"],
    ["local", "local"],
  ])("%s counts as %s", (address, network) => {
    expect(peerNetwork(address)).toBe(network);
  });
});
