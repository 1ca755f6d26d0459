/** What an action answers; the shape of lib/actions/answer.ts, of which the interface needs only this much. */
export type Refused = { code: string; message: string; fields?: Record<string, string> };

export type Reply<Value> = { ok: true; value: Value } | { ok: false; error: Refused };

export const NO_ANSWER: Refused = {
  code: "unavailable",
  message: "The server did not answer. What you typed is still here; try again when the network is back.",
};

/** An action that throws (network gone, server restarted) is a refusal like any other. */
export async function reach<Value>(call: () => Promise<Reply<Value>>): Promise<Reply<Value>> {
  try {
    return await call();
  } catch (error) {
    if (isNavigation(error)) throw error;
    return { ok: false, error: NO_ANSWER };
  }
}

/** A redirect or not-found of the framework travels as an error with a digest; it is no failure. */
function isNavigation(error: unknown): boolean {
  const digest = error instanceof Error && "digest" in error ? String(error.digest) : "";
  return digest.startsWith("NEXT_");
}
