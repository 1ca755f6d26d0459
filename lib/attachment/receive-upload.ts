import { database } from "@/db/client";
import { findAttachmentByUpload, findEvidence } from "@/db/queries/attachments";
import { findUser } from "@/db/queries/users";
import { attachments } from "@/db/schema/evidence";
import { grant } from "@/lib/access/grant";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, refuse, reject, type Answer } from "@/lib/actions/answer";
import { viewerOf } from "@/lib/auth/viewer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { log } from "@/lib/http/log";
import { enqueue } from "@/lib/jobs/enqueue";
import { deleteObjects, putObject, readWhole } from "@/lib/storage/object-store";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { checkTarget, type UploadMetadata } from "./admit-upload";
import { evidenceView } from "./evidence-view";
import { prepareFile, READ_LIMIT, type PreparedFile } from "./prepare-file";
import type { UploadAnswer } from "./schema";

/**
 * The whole file is in the object store: looks at it, cleans it, keeps it with its row and event, or deletes it.
 * Whatever happens, no object without a row stays behind; the sweep catches what a killed process leaves.
 */
export async function receiveUpload(metadata: UploadMetadata, rawKey: string): Promise<UploadAnswer> {
  const stored = new Set([rawKey]);
  try {
    const answer = await keep(metadata, rawKey, stored);
    if (answer.ok) return { ok: true, attachment: answer.value };
    return { ok: false, message: answer.error.message, retry: false };
  } catch (error) {
    log().error({ name: "receive-upload", uploadId: metadata.uploadId, err: error }, "an upload could not be kept");
    return {
      ok: false,
      message: "The server could not keep the file just now. Nothing was kept; send it again.",
      retry: true,
    };
  } finally {
    await discardUnused([...stored], metadata.uploadId);
  }
}

/** The object that the row of this upload names stays; all others of this attempt go. */
async function discardUnused(keys: string[], uploadId: string): Promise<void> {
  try {
    const kept = await findAttachmentByUpload(database(), uploadId);
    await deleteObjects(keys.filter((key) => key !== kept?.objectKey));
  } catch (error) {
    log().warn({ name: "receive-upload", uploadId, err: error }, "objects without a row are left to the sweep");
  }
}

async function keep(metadata: UploadMetadata, rawKey: string, stored: Set<string>): Promise<Answer<EvidenceView>> {
  const db = database();
  const user = await findUser(db, metadata.userId);
  const granted = await grant(db, user && viewerOf(user), metadata.project, "evidence.attach");
  if (!granted.ok) return granted;
  const scope = granted.value;
  const before = await firstAnswer(scope, metadata);
  if (before) return before;

  const bytes = await readWhole(rawKey, READ_LIMIT);
  if (!bytes)
    return refuse(
      "too-large",
      `${metadata.fileName} did not arrive whole or is larger than it said. Nothing was kept.`,
    );
  const prepared = await prepareFile(bytes, metadata.fileName, metadata.kinds);
  if (!prepared.ok) return prepared;
  const { clean, fileName, mediaType } = prepared.value;
  const objectKey = clean ? await putObject(clean, fileName, mediaType) : rawKey;
  stored.add(objectKey);
  return insert(scope, metadata, prepared.value, objectKey);
}

/** A repeat of an upload that was kept gets the first answer; the id of somebody else's upload is refused. */
async function firstAnswer(scope: ProjectScope, metadata: UploadMetadata): Promise<Answer<EvidenceView> | undefined> {
  const row = await findAttachmentByUpload(database(), metadata.uploadId);
  if (!row) return undefined;
  const evidence = row.uploadedBy === scope.viewer.userId ? await findEvidence(database(), scope, row.id) : undefined;
  return evidence
    ? ok(evidenceView(evidence))
    : refuse("conflict", "This upload id was used for another file. Nothing was kept.");
}

function insert(
  scope: ProjectScope,
  metadata: UploadMetadata,
  file: PreparedFile,
  objectKey: string,
): Promise<Answer<EvidenceView>> {
  const { projectId, viewer } = scope;
  const { uploadId, checkId, logEntryId, faultId, reworkId, reworkSide } = metadata;
  return change({ writeId: uploadId, userId: viewer.userId, action: "attach-evidence" }, async (tx) => {
    const target = await checkTarget(scope, metadata);
    if (!target.ok) return reject(target.error.code, target.error.message);
    const { unitId } = target.value;
    const { kind, mediaType, fileName, sha256, size, width, height } = file;
    const [row] = await tx
      .insert(attachments)
      .values({
        projectId,
        uploadedBy: viewer.userId,
        kind,
        objectKey,
        mediaType,
        bytes: size,
        sha256,
        fileName,
        width,
        height,
        uploadId,
        unitId,
        checkId,
        logEntryId,
        faultId,
        reworkId,
        reworkSide,
      })
      .returning({ id: attachments.id });
    const evidence = row && (await findEvidence(tx, scope, row.id));
    if (!row || !evidence) throw new Error("the attachment was not inserted");
    const subject = {
      projectId,
      actorId: viewer.userId,
      subjectId: row.id,
      ...(unitId ? { unitId } : {}),
      ...(checkId ? { checkId } : {}),
    };
    await recordEvent(tx, subject, "evidence.attached", { kind, fileName });
    if (kind !== "scope-data")
      await enqueue(tx, "make-thumbnails", { attachmentId: row.id }, { key: `thumbnails-${row.id}` });
    return evidenceView(evidence);
  });
}
