import { pipeline } from "node:stream/promises";
import { Refusal } from "../http/refusal";
import type { Call } from "../http/serve-loopback";
import { checkSignature, isSigned } from "./signature";
import type { Store } from "./store";
import type { StoredObject } from "./stored-object";

type Range = { start: number; end: number };

/** One range of bytes (RFC 9110, 14.1.2); several at once are answered with the whole file. */
function readRange(header: string | undefined, size: number): Range | "whole" | "unsatisfiable" {
  const match = /^bytes=(\d*)-(\d*)$/.exec(header ?? "");
  const [, from = "", to = ""] = match ?? [];
  if (!match || (from === "" && to === "")) return "whole";
  const start = from === "" ? Math.max(0, size - Number(to)) : Number(from);
  const end = from === "" || to === "" ? size - 1 : Math.min(Number(to), size - 1);
  return start > end ? "unsatisfiable" : { start, end };
}

function headersOf(object: StoredObject): Record<string, string> {
  const name = encodeURIComponent(object.name).replaceAll("'", "%27");
  return {
    "content-type": object.type,
    "content-disposition": `${object.contentDisposition}; filename*=UTF-8''${name}`,
    "accept-ranges": "bytes",
    "cache-control": object.acl === "private" ? "private, no-store" : "public, max-age=3600",
    etag: `"${object.fileHash}"`,
    "last-modified": new Date(object.uploadedAt).toUTCString(),
    "x-content-type-options": "nosniff",
    "access-control-allow-origin": "*",
  };
}

/** GET or HEAD /a/APPID/KEY and /f/KEY: a private file needs a signature that has not expired. */
export async function answerRead({ request, response, url }: Call, store: Store): Promise<void> {
  const [, appId, key] = /^\/(?:a\/([^/]+)|f)\/(.+)$/.exec(url.pathname) ?? [];
  const object = store.files.find(decodeURIComponent(key ?? ""));
  if (isSigned(url) || object?.acl === "private") checkSignature(url, store.apiKey);
  if (!object || (appId !== undefined && appId !== store.appId)) throw new Refusal(404, "not_found", "No such file.");

  const range = readRange(request.headers.range, object.size);
  if (range === "unsatisfiable") {
    throw new Refusal(416, "invalid_range", "The range lies outside the file.", {
      "content-range": `bytes */${object.size}`,
    });
  }
  const { start, end } = range === "whole" ? { start: 0, end: object.size - 1 } : range;
  const partHeaders: Record<string, string> =
    range === "whole" ? {} : { "content-range": `bytes ${start}-${end}/${object.size}` };
  const length = { "content-length": String(end - start + 1) };
  response.writeHead(range === "whole" ? 200 : 206, { ...headersOf(object), ...partHeaders, ...length });
  if (request.method === "HEAD" || object.size === 0) return void response.end();
  await pipeline(store.files.read(object.key, start, end), response).catch((error: NodeJS.ErrnoException) => {
    if (error.code !== "ERR_STREAM_PREMATURE_CLOSE") throw error;
  });
}
