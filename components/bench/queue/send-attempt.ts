import type { AttemptBody, HeldAttempt } from "./held-attempt";

export type Outcome =
  | { kind: "accepted"; answer: unknown }
  /** The server understood and said no; sending it again would change nothing. */
  | { kind: "refused"; sentence: string; fields?: Record<string, string> }
  | { kind: "signed-out"; sentence: string }
  /** No network, database away, too many requests: again later. */
  | { kind: "later"; sentence: string; afterMs?: number };

const TIMEOUT_MS = 30_000;
/** Answers after which the same request may succeed by itself. */
const PASSING = new Set([408, 425, 429]);

const NO_NETWORK = "No network. They go out when it is back.";

function text(value: unknown): string | undefined {
  return typeof value === "string" && value !== "" ? value : undefined;
}

function record(value: unknown): Record<string, unknown> {
  return typeof value === "object" && value !== null ? Object.fromEntries(Object.entries(value)) : {};
}

/** Sorts a problem document (RFC 9457) or any other answer by what is to be done about it. */
export function outcomeOf(status: number, body: unknown, retryAfter: string | null): Outcome {
  if (status >= 200 && status < 300) return { kind: "accepted", answer: body };
  const problem = record(body);
  const detail = text(problem.detail);
  if (status === 401) return { kind: "signed-out", sentence: "You are signed out. Sign in and they go out." };
  if (status >= 500 || PASSING.has(status)) {
    const seconds = Number(retryAfter);
    const sentence = detail ?? "The server does not answer properly just now. It is tried again.";
    return { kind: "later", sentence, ...(seconds > 0 ? { afterMs: seconds * 1000 } : {}) };
  }
  const errors = Object.entries(record(problem.errors)).flatMap(([key, value]) => {
    const sentence = text(value);
    return sentence ? [[key, sentence] as const] : [];
  });
  const sentence = detail ?? `The server refused it (${status}).`;
  return { kind: "refused", sentence, ...(errors.length > 0 ? { fields: Object.fromEntries(errors) } : {}) };
}

/** Sends one attempt. Never throws: everything that can happen is an outcome. */
export async function sendAttempt(attempt: HeldAttempt, body: AttemptBody = attempt.body): Promise<Outcome> {
  try {
    const response = await fetch(`/api/projects/${encodeURIComponent(attempt.project)}/attempts`, {
      method: "POST",
      headers: { "content-type": "application/json", accept: "application/json" },
      body: JSON.stringify({ ...body, madeBy: attempt.userId }),
      signal: AbortSignal.timeout(TIMEOUT_MS),
    });
    const answer: unknown = await response.json().catch(() => undefined);
    return outcomeOf(response.status, answer, response.headers.get("retry-after"));
  } catch {
    return { kind: "later", sentence: NO_NETWORK };
  }
}
