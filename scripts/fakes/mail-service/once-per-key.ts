import { createHash, randomUUID } from "node:crypto";
import { Refusal } from "../http/refusal";
import type { Accepted, AcceptedRequests, Message } from "./accepted-requests";

/** Two bodies are the same payload when they say the same, in whatever order. */
function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(",")}]`;
  if (typeof value !== "object" || value === null) return JSON.stringify(value) ?? "null";
  const entries = Object.entries(value).sort(([one], [other]) => (one < other ? -1 : 1));
  return `{${entries.map(([name, inner]) => `${JSON.stringify(name)}:${canonical(inner)}`).join(",")}}`;
}

type Work = { path: string; key: string | undefined; body: unknown; make(): { answer: unknown; messages: Message[] } };

/** Keys whose first request is still under way. */
const running = new Set<string>();

function checkKey(key: string): void {
  if (key.length >= 1 && key.length <= 256) return;
  throw new Refusal(400, "invalid_idempotency_key", "The idempotency key should have 1 to 256 characters.");
}

function repeated(requests: AcceptedRequests, key: string, payloadHash: string): Accepted | undefined {
  const found = requests.findByKey(key);
  if (!found || found.payloadHash === payloadHash) return found;
  const message =
    "This idempotency key was used with another payload. Use another key, or send the same payload again.";
  throw new Refusal(409, "invalid_idempotent_request", message);
}

/** Accepts a request once a key; the same key with the same payload gets the first answer and nothing is sent again. */
export function oncePerKey(requests: AcceptedRequests) {
  return async function accept({ path, key, body, make }: Work): Promise<{ accepted: Accepted; isNew: boolean }> {
    const payloadHash = createHash("sha256")
      .update(`${path} ${canonical(body)}`)
      .digest("hex");
    if (key !== undefined) {
      checkKey(key);
      const found = repeated(requests, key, payloadHash);
      if (found) return { accepted: found, isNew: false };
    }
    const accepted: Accepted = { id: randomUUID(), acceptedAt: Date.now(), key, payloadHash, ...make() };
    await requests.add(accepted);
    return { accepted, isNew: true };
  };
}

/** Holds a key for as long as the work takes; a second request with it meanwhile is a 409. */
export async function holdingKey(key: string | undefined, work: () => Promise<void>): Promise<void> {
  if (key === undefined) return work();
  if (running.has(key)) {
    throw new Refusal(
      409,
      "concurrent_idempotent_requests",
      "Another request with this idempotency key is still running.",
    );
  }
  running.add(key);
  try {
    await work();
  } finally {
    running.delete(key);
  }
}
