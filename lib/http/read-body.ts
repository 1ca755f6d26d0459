import { refuse, ok, type Answer } from "@/lib/actions/answer";

/** Reads a body of at most `limit` bytes without trusting content-length. */
export async function readBytes(request: Request, limit: number): Promise<Answer<Buffer>> {
  const chunks: Uint8Array[] = [];
  let size = 0;
  const reader = request.body?.getReader();
  while (reader) {
    const { done, value } = await reader.read();
    if (done) break;
    size += value.byteLength;
    if (size > limit) {
      await reader.cancel();
      return refuse("too-large", `The request is larger than ${Math.round(limit / 1000)} kB. Nothing was changed.`);
    }
    chunks.push(value);
  }
  return ok(Buffer.concat(chunks));
}

/** Reads a JSON body. An empty body is undefined. */
export async function readJson(request: Request, limit = 1_000_000): Promise<Answer<unknown>> {
  const bytes = await readBytes(request, limit);
  if (!bytes.ok) return bytes;
  if (bytes.value.length === 0) return ok(undefined);
  try {
    return ok(JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes.value)));
  } catch {
    return refuse("invalid", "The body is not JSON in UTF-8. Nothing was changed.");
  }
}
