import { database } from "@/db/client";
import { findAttachment, type AttachmentRow } from "@/db/queries/attachments";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, type Answer } from "@/lib/actions/answer";
import { contentDisposition, withExtension } from "@/lib/storage/file-name";
import { readObject } from "@/lib/storage/object-store";
import type { OpenFileInput } from "./schema";

type Chosen = { key: string; mediaType: string; etag: string; fileName: string; final: boolean };

/** The thumbnail when it is there, otherwise the picture itself: nobody waits for the worker. */
function choose(row: AttachmentRow, size: OpenFileInput["size"]): Chosen {
  const thumbnail = size === "small" ? row.smallKey : size === "large" ? row.largeKey : null;
  if (thumbnail) {
    const fileName = withExtension(row.fileName, "webp");
    return { key: thumbnail, mediaType: "image/webp", etag: `"${row.sha256}-${size}"`, fileName, final: true };
  }
  const final = !size || row.kind === "scope-data";
  return { key: row.objectKey, mediaType: row.mediaType, etag: `"${row.sha256}"`, fileName: row.fileName, final };
}

/**
 * Hands a private file through: the object store is read over a link signed for a minute that never leaves the server.
 * Only pictures that we encoded ourselves are shown in place; everything else is a download.
 */
export async function openFile(
  scope: ProjectScope,
  input: OpenFileInput,
  request: Request,
): Promise<Response | Answer<never>> {
  const row = await findAttachment(database(), scope, input.file);
  if (!row || row.archivedAt) return refuse("not-found", "There is no such file in this project, or it was removed.");
  const file = choose(row, input.size);
  const headers = new Headers({
    etag: file.etag,
    // The person may lose the membership: their browser may keep a picture for an hour, no shared cache ever.
    "cache-control": file.final ? "private, max-age=3600" : "private, no-cache",
    vary: "cookie",
    "x-content-type-options": "nosniff",
    "content-security-policy": "default-src 'none'; sandbox",
    "cross-origin-resource-policy": "same-origin",
  });
  if (
    request.headers
      .get("if-none-match")
      ?.split(",")
      .some((tag) => tag.trim().replace(/^W\//, "") === file.etag)
  ) {
    return new Response(null, { status: 304, headers });
  }

  const ifRange = request.headers.get("if-range");
  const range = ifRange === null || ifRange === file.etag ? request.headers.get("range") : null;
  const object = await readObject(file.key, { signal: request.signal, ...(range ? { range } : {}) });
  if (!object) return refuse("gone", "The file is listed, but the object store does not have it any more.");
  headers.set("content-type", file.mediaType);
  headers.set(
    "content-disposition",
    contentDisposition(row.kind === "scope-data" ? "attachment" : "inline", file.fileName),
  );
  headers.set("accept-ranges", "bytes");
  for (const name of ["content-length", "content-range"]) {
    const value = object.headers.get(name);
    if (value !== null) headers.set(name, value);
  }
  return new Response(object.body, { status: object.status, headers });
}
