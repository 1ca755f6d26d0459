import { setTimeout as delay } from "node:timers/promises";
import type { Callback } from "./route-metadata";
import { sign } from "./signature";
import type { StoredObject } from "./stored-object";

export type Addresses = { url: string; appUrl: string; ufsUrl: string };
type Result = { serverData: unknown } | { error: string };

/** Results that the app reports by POST /callback-result, waited for by key. */
export function createResults() {
  const waiting = new Map<string, (result: Result) => void>();
  return {
    report(key: string, result: Result): boolean {
      const resolve = waiting.get(key);
      waiting.delete(key);
      resolve?.(result);
      return resolve !== undefined;
    },
    expect: (key: string) => new Promise<Result>((resolve) => waiting.set(key, resolve)),
    forget: (key: string) => waiting.delete(key),
  };
}

export type Results = ReturnType<typeof createResults>;

async function post(
  callback: Callback,
  hook: "callback" | "error",
  payload: unknown,
  apiKey: string,
): Promise<string | undefined> {
  const url = new URL(callback.callbackUrl);
  url.searchParams.set("slug", callback.callbackSlug);
  const body = JSON.stringify(payload);
  const headers = {
    "content-type": "application/json",
    "uploadthing-hook": hook,
    "x-uploadthing-signature": sign(body, apiKey),
  };
  try {
    const response = await fetch(url, { method: "POST", headers, body, signal: AbortSignal.timeout(30_000) });
    await response.arrayBuffer();
    return response.ok ? undefined : `The app's callback answered ${response.status}.`;
  } catch (error) {
    return `The app's callback could not be reached: ${error instanceof Error ? error.message : "unknown"}.`;
  }
}

type Told = { callback: Callback; object: StoredObject; addresses: Addresses; origin: string; apiKey: string };

/** Tells the app that a file is there and waits for what it answers the browser. */
export async function tellUploaded(
  { callback, object, addresses, origin, apiKey }: Told,
  results: Results,
): Promise<Result> {
  const { key, name, size, type, customId, fileHash } = object;
  const file = { key, name, size, type, customId, fileHash, ...addresses };
  const answer = results.expect(key);
  const problem = await post(
    callback,
    "callback",
    { status: "uploaded", origin, metadata: callback.metadata ?? {}, file },
    apiKey,
  );
  // The app reports its result before it answers the callback: after that there is little to wait for.
  const late = delay(problem ? 0 : 500).then((): Result => ({
    error: problem ?? "The app's callback gave no result.",
  }));
  const result = await Promise.race([answer, late]);
  results.forget(key);
  return result;
}

/** Tells the app that an announced file did not arrive as announced. */
export async function tellFailed(callback: Callback, fileKey: string, error: string, apiKey: string): Promise<void> {
  const problem = await post(callback, "error", { fileKey, error }, apiKey);
  if (problem) console.log(problem);
}
