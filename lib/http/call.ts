import { headers } from "next/headers";
import { env } from "@/lib/env";

/** What is known of one request. The request id stands in every log line and in the message of an unexpected error. */
export type Call = { requestId: string; ip: string };

export function callFrom(given: Headers): Call {
  const forwarded = env().TRUST_PROXY ? given.get("x-forwarded-for")?.split(",")[0]?.trim() : undefined;
  return {
    requestId: given.get("x-request-id") ?? crypto.randomUUID(),
    ip: forwarded ?? given.get("x-boardwake-peer") ?? "local",
  };
}

export async function currentCall(): Promise<Call> {
  return callFrom(await headers());
}
