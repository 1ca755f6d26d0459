import { uploadEvidence } from "@/components/evidence/upload-evidence";
import type { HeldFile } from "./held-attempt";
import type { Uploaded } from "./send-with-files";

/** Sends one held file; the server makes one row of it however often it is sent. */
export async function uploadHeldFile(
  project: string,
  held: HeldFile,
  onProgress?: (share: number) => void,
): Promise<Uploaded> {
  if (held.attachmentId) return { ok: true, attachmentId: held.attachmentId };
  if (!held.file)
    return { ok: false, message: `${held.fileName} is no longer on this device. Take it again.`, retry: false };
  const result = await uploadEvidence({
    project,
    target: { checkId: held.checkId },
    file: new File([held.file], held.fileName, { type: held.file.type }),
    uploadId: held.uploadId,
    kinds: held.kinds,
    ...(onProgress ? { onProgress } : {}),
  });
  return result.ok ? { ok: true, attachmentId: result.evidence.id } : result;
}
