import { createHash } from "node:crypto";
import { createReadStream } from "node:fs";
import { open } from "node:fs/promises";
import type { IncomingMessage } from "node:http";
import { Refusal } from "../http/refusal";
import { multipartFile } from "./multipart-file";
import type { ObjectFiles } from "./object-files";
import type { StoredObject, UploadClaim } from "./stored-object";

const formOverhead = 65_536;

async function startOf(request: IncomingMessage, files: ObjectFiles, key: string): Promise<number> {
  const start = Number(/^bytes=(\d+)-/.exec(request.headers.range ?? "")?.[1] ?? 0);
  if (start > 0 && start !== (await files.partialSize(key))) {
    throw new Refusal(416, "invalid_range", "The part does not follow what has arrived.");
  }
  return start;
}

async function write(request: IncomingMessage, path: string, start: number, size: number): Promise<number> {
  const file = await open(path, start > 0 ? "a" : "w", 0o600);
  let total = start;
  try {
    for await (const chunk of multipartFile(request)) {
      total += chunk.length;
      if (total > size) throw new Refusal(413, "too_large", `The file is larger than the ${size} bytes announced.`);
      await file.write(chunk);
    }
  } finally {
    await file.close();
  }
  return total;
}

async function md5(path: string): Promise<string> {
  const hash = createHash("md5");
  for await (const chunk of createReadStream(path)) hash.update(chunk);
  return hash.digest("hex");
}

/**
 * Takes the bytes of one upload. What arrived before a cut-off is kept aside for a resumed upload and is never visible;
 * a file of another size than announced is thrown away.
 */
export async function receiveFile(
  request: IncomingMessage,
  claim: UploadClaim,
  files: ObjectFiles,
): Promise<StoredObject> {
  const start = await startOf(request, files, claim.key);
  if (Number(request.headers["content-length"] ?? 0) > claim.size - start + formOverhead) {
    await files.discardPartial(claim.key);
    throw new Refusal(413, "too_large", `The file is larger than the ${claim.size} bytes announced.`);
  }
  const path = files.partial(claim.key);
  try {
    const total = await write(request, path, start, claim.size);
    if (total !== claim.size) throw new Refusal(400, "size_mismatch", `${total} of ${claim.size} bytes arrived.`);
  } catch (error) {
    if (!request.destroyed || error instanceof Refusal) await files.discardPartial(claim.key);
    throw error;
  }
  const { key, name, size, type, acl, contentDisposition } = claim;
  const customId = claim.customId ?? null;
  return {
    key,
    name,
    size,
    type,
    acl,
    contentDisposition,
    customId,
    fileHash: await md5(path),
    uploadedAt: Date.now(),
  };
}
