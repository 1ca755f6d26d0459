import { UTApi, UTFile } from "uploadthing/server";
import { env } from "@/lib/env";

/**
 * The object store through its SDK. Everything in it is private: it is read over a link that is signed for a minute.
 * The SDK's own log is off since it would print signed links; its other addresses come from UPLOADTHING_* variables.
 */
let api: UTApi | undefined;
function store(): UTApi {
  api ??= new UTApi({ token: env().UPLOADTHING_TOKEN, logLevel: "None" });
  return api;
}

class ObjectStoreError extends Error {
  override name = "ObjectStoreError";
}

const ANSWER_MS = 20_000;
const WHOLE_MS = 120_000;
const LINK_SECONDS = 60;

/** Waits at most `ms`: the SDK has no time limit of its own for these calls. */
async function within<T>(ms: number, what: string, work: Promise<T>): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_, reject) => {
    timer = setTimeout(
      () => reject(new ObjectStoreError(`The object store did not answer within ${ms / 1000} s (${what}).`)),
      ms,
    );
  });
  try {
    return await Promise.race([work, late]);
  } finally {
    clearTimeout(timer);
  }
}

/** Keeps the bytes as a private object and answers its key. */
export async function putObject(bytes: Uint8Array, name: string, mediaType: string): Promise<string> {
  const file = new UTFile([new Uint8Array(bytes)], name, { type: mediaType });
  const sent = await within(
    WHOLE_MS,
    "put",
    store().uploadFiles(file, { acl: "private", contentDisposition: "attachment" }),
  );
  if (sent.error) throw new ObjectStoreError(`The object store did not take ${name}: ${sent.error.message}`);
  return sent.data.key;
}

/** Deletes objects; one that is not there is no error. */
export async function deleteObjects(keys: string[]): Promise<void> {
  if (keys.length > 0) await within(ANSWER_MS, "delete", store().deleteFiles(keys));
}

export type StoredObject = { key: string; uploadedAt: Date };

/** One page of what is stored, whoever put it there. */
export async function listObjects(offset: number, limit: number): Promise<{ objects: StoredObject[]; more: boolean }> {
  const page = await within(ANSWER_MS, "list", store().listFiles({ limit, offset }));
  const whole = page.files.filter(
    (file) => file.status === "Uploaded" || file.status === "Uploading" || file.status === "Failed",
  );
  return {
    objects: whole.map(({ key, uploadedAt }) => ({ key, uploadedAt: new Date(uploadedAt) })),
    more: page.hasMore,
  };
}

/** The running answer of the object store to a signed read; `range` is passed on as it is. Undefined: no such object. */
export async function readObject(
  key: string,
  options: { range?: string; signal?: AbortSignal } = {},
): Promise<Response | undefined> {
  const { ufsUrl } = await store().generateSignedURL(key, { expiresIn: LINK_SECONDS });
  const slow = new AbortController();
  const answerTimer = setTimeout(() => slow.abort(), ANSWER_MS);
  const signals = [slow.signal, AbortSignal.timeout(WHOLE_MS), ...(options.signal ? [options.signal] : [])];
  try {
    const response = await fetch(ufsUrl, {
      headers: options.range ? { range: options.range } : {},
      signal: AbortSignal.any(signals),
      cache: "no-store",
    });
    if (response.ok || response.status === 416) return response;
    await response.body?.cancel();
    if (response.status === 404) return undefined;
    throw new ObjectStoreError(`The object store answered ${response.status} to a read.`);
  } finally {
    clearTimeout(answerTimer);
  }
}

/** The whole object; undefined when it is larger than `limit` or not there. Never holds more than `limit` bytes. */
export async function readWhole(key: string, limit: number): Promise<Buffer | undefined> {
  const response = await readObject(key);
  const reader = response?.body?.getReader();
  if (!reader) return response ? Buffer.alloc(0) : undefined;
  const chunks: Uint8Array[] = [];
  let size = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return Buffer.concat(chunks);
    size += value.byteLength;
    if (size > limit) {
      await reader.cancel();
      return undefined;
    }
    chunks.push(value);
  }
}
