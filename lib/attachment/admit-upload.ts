import { database } from "@/db/client";
import { findTargetCheck, findTargetEntry, findTargetFault, findTargetRework } from "@/db/queries/attachments";
import type { AttachmentKind, ReworkSide } from "@/db/schema/evidence";
import { grant } from "@/lib/access/grant";
import type { Viewer } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { limit } from "@/lib/http/rate-limit";
import { cleanFileName } from "@/lib/storage/file-name";
import { checkSize } from "./check-size";
import type { UploadInput } from "./schema";

/** What the object store hands back, signed, when the file is there. No secret in it. */
export type UploadMetadata = {
  userId: string;
  project: string;
  uploadId: string;
  kinds: AttachmentKind[];
  fileName: string;
  checkId: string | null;
  logEntryId: string | null;
  faultId: string | null;
  reworkId: string | null;
  reworkSide: ReworkSide | null;
};

/** Whether the person may send this file to this place; asked before a link to send it to is given out. */
export async function admitUpload(
  viewer: Viewer | undefined,
  input: UploadInput,
  files: readonly { name: string; size: number }[],
): Promise<Answer<UploadMetadata>> {
  const db = database();
  const granted = await grant(db, viewer, input.project, "evidence.attach");
  if (!granted.ok) return granted;
  const scope = granted.value;

  const [file, ...rest] = files;
  if (!file || rest.length > 0) return refuse("invalid", "Send one file at a time. Nothing was kept.");
  const name = cleanFileName(file.name);
  if (!name.ok) return name;
  const fits = checkSize(name.value, file.size, input.kinds);
  if (!fits.ok) return fits;
  const there = await checkTarget(scope, input);
  if (!there.ok) return there;
  const slow = await limit("uploads", scope.viewer.userId);
  if (!slow.ok) return slow;

  return ok({
    userId: scope.viewer.userId,
    project: scope.slug,
    uploadId: input.uploadId,
    kinds: input.kinds,
    fileName: name.value,
    checkId: input.checkId ?? null,
    logEntryId: input.logEntryId ?? null,
    faultId: input.faultId ?? null,
    reworkId: input.reworkId ?? null,
    reworkSide: input.reworkId ? (input.reworkSide ?? "after") : null,
  });
}

type InProject = { projectId: string };
type Target = {
  [Place in "checkId" | "logEntryId" | "faultId" | "reworkId"]?: string | null | undefined;
};

/** The unit the file will belong to, through its check, log entry, fault or rework. */
export async function checkTarget(scope: InProject, target: Target): Promise<Answer<{ unitId: string | null }>> {
  const places = [target.checkId, target.logEntryId, target.faultId, target.reworkId].filter(Boolean);
  if (places.length > 1)
    return refuse("invalid", "A file belongs to one place: a check, a log entry, a fault or a rework.");
  if (target.checkId) {
    const check = await findTargetCheck(database(), scope, target.checkId);
    return check
      ? ok({ unitId: check.unitId })
      : refuse("not-found", "There is no such check in this project. Nothing was kept.");
  }
  if (target.logEntryId) {
    const entry = await findTargetEntry(database(), scope, target.logEntryId);
    return entry
      ? ok({ unitId: entry.unitId })
      : refuse("not-found", "There is no such log entry in this project. Nothing was kept.");
  }
  if (target.faultId) {
    const fault = await findTargetFault(database(), scope, target.faultId);
    return fault
      ? ok({ unitId: fault.unitId })
      : refuse("not-found", "There is no such fault in this project. Nothing was kept.");
  }
  if (target.reworkId) {
    const rework = await findTargetRework(database(), scope, target.reworkId);
    return rework
      ? ok({ unitId: rework.unitId })
      : refuse("not-found", "There is no such rework in this project. Nothing was kept.");
  }
  return ok({ unitId: null });
}
