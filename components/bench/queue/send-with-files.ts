import type { HeldAttempt, HeldFile } from "./held-attempt";
import { sendAttempt, type Outcome } from "./send-attempt";

export type Uploaded = { ok: true; attachmentId: string } | { ok: false; message: string; retry: boolean };

type Given = {
  attempt: HeldAttempt;
  upload: (attempt: HeldAttempt, file: HeldFile) => Promise<Uploaded>;
  /** Writes down what was reached, so that a retry does not send a large file again. */
  keep: (attempt: HeldAttempt) => Promise<void>;
  send?: (attempt: HeldAttempt) => Promise<Outcome>;
};

/** Uploads the files that are still on the device, then sends the attempt that names them all. */
export async function sendWithFiles({ attempt, upload, keep, send = sendAttempt }: Given): Promise<Outcome> {
  let current = attempt;
  for (const file of attempt.files) {
    if (file.attachmentId) continue;
    const uploaded = await upload(current, file);
    if (!uploaded.ok) return { kind: uploaded.retry ? "later" : "refused", sentence: uploaded.message };
    const { attachmentId } = uploaded;
    const files = current.files.map((one) =>
      one.uploadId === file.uploadId ? { ...one, attachmentId, file: null } : one,
    );
    const attachmentIds = [...new Set([...current.body.attachmentIds, attachmentId])];
    current = { ...current, files, body: { ...current.body, attachmentIds } };
    await keep(current);
  }
  return send(current);
}
