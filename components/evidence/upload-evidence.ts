import type { AttachmentKind } from "@/db/schema/evidence";
import type { EvidenceTarget, UploadAnswer } from "@/lib/attachment/schema";
import type { UploadRouter } from "@/lib/attachment/upload-router";
import { FILE_LIMITS, largestBytes, sizeText } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

export type UploadResult = { ok: true; evidence: EvidenceView } | { ok: false; message: string; retry: boolean };

export type EvidenceUpload = {
  /** Slug. */
  project: string;
  target: EvidenceTarget;
  file: File;
  /** A UUID made once for this file and kept for every retry: the server never makes a second row of it. */
  uploadId: string;
  /** What is wanted; a picture becomes the first kind of picture among them. All kinds when left out. */
  kinds?: readonly AttachmentKind[];
  /** 0 … 1 of the bytes on their way; at 1 the server is still looking at the file. */
  onProgress?: (share: number) => void;
  signal?: AbortSignal;
};

const ALL: readonly AttachmentKind[] = ["photo", "scope-picture", "scope-data"];

/** A shed's Wi-Fi may stop without an error; without any progress for this long the sending is given up. */
const STALL_MS = 90_000;

/**
 * Sends one file and answers once the server has looked at it and keeps it. Never throws. `retry` tells whether
 * sending the same file again can help (network, busy server) or not (wrong type, too big).
 * The uploader is loaded on first use: pages that only might upload stay light.
 */
export async function uploadEvidence(upload: EvidenceUpload): Promise<UploadResult> {
  const kinds = [...(upload.kinds ?? ALL)];
  const unfit = whyNotSend(upload.file, kinds);
  if (unfit) return { ok: false, message: unfit, retry: false };
  if (typeof navigator !== "undefined" && !navigator.onLine) return { ok: false, message: OFFLINE, retry: true };

  const stall = new AbortController();
  let timer = setTimeout(() => stall.abort(), STALL_MS);
  const alive = () => {
    clearTimeout(timer);
    timer = setTimeout(() => stall.abort(), STALL_MS);
  };
  try {
    const { genUploader } = await import("uploadthing/client");
    const { uploadFiles } = genUploader<UploadRouter>({ url: "/api/uploadthing" });
    const [sent] = await uploadFiles("evidence", {
      files: [upload.file],
      input: { project: upload.project, uploadId: upload.uploadId, kinds, ...upload.target },
      signal: upload.signal ? AbortSignal.any([upload.signal, stall.signal]) : stall.signal,
      onUploadProgress: ({ loaded }) => {
        alive();
        upload.onProgress?.(Math.min(1, loaded / upload.file.size));
      },
    });
    const answer: UploadAnswer | null | undefined = sent?.serverData;
    if (!answer) return { ok: false, message: LOST, retry: true };
    return answer.ok
      ? { ok: true, evidence: answer.attachment }
      : { ok: false, message: answer.message, retry: answer.retry };
  } catch (error) {
    if (upload.signal?.aborted) return { ok: false, message: "Cancelled.", retry: true };
    return explain(error);
  } finally {
    clearTimeout(timer);
  }
}

const OFFLINE = "There is no network just now. The file is still on this device.";
const LOST = "The network dropped before the file was there. The file is still on this device; send it again.";

/** What can be said before a byte is sent; the server checks all of it again. */
function whyNotSend(file: File, kinds: readonly AttachmentKind[]): string | undefined {
  if (file.size === 0) return `${file.name} is empty (0 bytes).`;
  const limit = largestBytes(kinds);
  if (file.size > limit)
    return `${file.name} has ${sizeText(file.size)}; the most that can be kept here is ${sizeText(limit)}.`;
  if (file.name.length > 10 * FILE_LIMITS.fileNameCharacters)
    return "The name of the file is far too long. Rename it and send it again.";
  return undefined;
}

/** A refusal of ours is a problem document in the error's cause; anything else is the network or a busy server. */
function explain(error: unknown): UploadResult {
  const cause: unknown = error instanceof Error ? error.cause : undefined;
  if (typeof cause === "object" && cause !== null && "detail" in cause && typeof cause.detail === "string") {
    const status = "status" in cause && typeof cause.status === "number" ? cause.status : 500;
    return { ok: false, message: cause.detail, retry: status === 401 || status === 429 || status >= 500 };
  }
  return { ok: false, message: typeof navigator !== "undefined" && !navigator.onLine ? OFFLINE : LOST, retry: true };
}
