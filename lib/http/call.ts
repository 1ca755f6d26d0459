import { headers } from "next/headers";
import { env } from "@/lib/env";
import { PEER_HEADER } from "./peer-header";
import { peerNetwork } from "./peer-network";

/** What is known of one request. The request id stands in every log line and in the message of an unexpected error. */
export type Call = { requestId: string; ip: string };

export function callFrom(given: Headers): Call {
  // The last entry is the one that the trusted proxy wrote; those before it are what its client claimed.
  const forwarded = env().TRUST_PROXY ? given.get("x-forwarded-for")?.split(",").at(-1)?.trim() : undefined;
  return {
    requestId: given.get("x-request-id") ?? crypto.randomUUID(),
    ip: peerNetwork(forwarded || given.get(PEER_HEADER) || "local"),
  };
}

export async function currentCall(): Promise<Call> {
  return callFrom(await headers());
}
