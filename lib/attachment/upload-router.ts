import { createUploadthing, type FileRouter } from "uploadthing/next";
import { UploadThingError } from "uploadthing/server";
import type { Viewer } from "@/lib/access/scope";
import { STATUS, type Refusal } from "@/lib/actions/answer";
import { admitUpload, type UploadMetadata } from "./admit-upload";
import { receiveUpload } from "./receive-upload";
import { uploadInput, type UploadAnswer } from "./schema";

/**
 * Who asks, by request. The session is read before the SDK runs: its scheduler is shared by all requests, so nothing
 * that depends on the running request may be asked inside it.
 */
export const viewerOfRequest = new WeakMap<Request, Viewer>();
/** Why a request was refused, for the status that the SDK has no code for. */
export const refusalOfRequest = new WeakMap<Request, Refusal>();

const upload = createUploadthing();

const CODES: Record<number, "NOT_FOUND" | "FORBIDDEN" | "TOO_LARGE" | "BAD_REQUEST"> = {
  404: "NOT_FOUND",
  403: "FORBIDDEN",
  413: "TOO_LARGE",
};

export const uploadRouter = {
  /** The real limits are in lib/storage/limits.ts and answered with a sentence; this one only lets them through. */
  evidence: upload(
    { blob: { maxFileSize: "128MB", maxFileCount: 1, acl: "private", contentDisposition: "attachment" } },
    { presignedURLTTL: 1800 },
  )
    .input(uploadInput)
    .middleware(async ({ req, input, files }): Promise<UploadMetadata> => {
      const admitted = await admitUpload(viewerOfRequest.get(req), input, files);
      if (admitted.ok) return admitted.value;
      refusalOfRequest.set(req, admitted.error);
      throw new UploadThingError({
        code: CODES[STATUS[admitted.error.code]] ?? "BAD_REQUEST",
        message: admitted.error.message,
      });
    })
    .onUploadComplete(async ({ metadata, file }): Promise<UploadAnswer> => receiveUpload(metadata, file.key)),
} satisfies FileRouter;

export type UploadRouter = typeof uploadRouter;
