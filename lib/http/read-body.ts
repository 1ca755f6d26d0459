import { refuse, ok, type Answer } from "@/lib/actions/answer";

/** Reads a JSON body of at most `limit` bytes without trusting content-length. An empty body is undefined. */
export async function readJson(request: Request, limit = 1_000_000): Promise<Answer<unknown>> {
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
  if (size === 0) return ok(undefined);
  try {
    return ok(JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(Buffer.concat(chunks))));
  } catch {
    return refuse("invalid", "The body is not JSON in UTF-8. Nothing was changed.");
  }
}
