import { STATUS, type Refusal } from "@/lib/actions/answer";

const TITLES: Record<Refusal["code"], string> = {
  invalid: "The request is not valid",
  "signed-out": "Not signed in",
  forbidden: "Not allowed",
  "not-found": "Not found",
  conflict: "Conflict with the current state",
  blocked: "Blocked",
  gone: "Gone",
  "too-large": "Too large",
  "wrong-type": "Wrong type",
  "too-many": "Too many requests",
  failed: "Internal error",
  unavailable: "Unavailable",
};

/** An RFC 9457 problem document. */
export function problem(refusal: Refusal, requestId: string): Response {
  const status = STATUS[refusal.code];
  const headers = new Headers({
    "content-type": "application/problem+json",
    "cache-control": "no-store",
    "x-request-id": requestId,
  });
  const retryAfter = refusal.details?.retryAfterSeconds;
  if (typeof retryAfter === "number") headers.set("retry-after", String(retryAfter));
  const body = {
    type: `urn:boardwake:problem:${refusal.code}`,
    title: TITLES[refusal.code],
    status,
    detail: refusal.message,
    instance: `urn:boardwake:request:${requestId}`,
    ...(refusal.fields ? { errors: refusal.fields } : {}),
    ...(refusal.details ? { details: refusal.details } : {}),
  };
  return new Response(JSON.stringify(body), { status, headers });
}
