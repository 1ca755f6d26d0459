import type { AttachmentKind } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import type { EvidenceTarget } from "@/lib/attachment/schema";
import { makeThumbnails } from "@/lib/attachment/make-thumbnails";
import { receiveUpload } from "@/lib/attachment/receive-upload";
import { putObject } from "@/lib/storage/object-store";
import { drawPicture, rippleText } from "./pictures";

export type Upload = (scope: ProjectScope, target: EvidenceTarget, name: string) => Promise<string>;

const drawn = new Map<string, Promise<Buffer>>();

/** Sends a drawn picture the way a phone would: stored raw, looked at, cleaned, thumbnails made. Answers its id. */
export const uploadPicture: Upload = async (scope, target, name) => {
  drawn.set(name, drawn.get(name) ?? drawPicture(name));
  const bytes = await (drawn.get(name) ?? drawPicture(name));
  const isScope = name.startsWith("scope-");
  const file = isScope
    ? { fileName: `${name}.png`, type: "image/png" }
    : { fileName: `${name}.jpg`, type: "image/jpeg" };
  return receive(scope, target, bytes, file, [isScope ? "scope-picture" : "photo"]);
};

export const uploadRipple: Upload = (scope, target) =>
  receive(scope, target, Buffer.from(rippleText()), { fileName: "5v-ripple.csv", type: "text/csv" }, ["scope-data"]);

async function receive(
  scope: ProjectScope,
  target: EvidenceTarget,
  bytes: Buffer,
  file: { fileName: string; type: string },
  kinds: AttachmentKind[],
): Promise<string> {
  const rawKey = await putObject(bytes, file.fileName, file.type);
  const kept = await receiveUpload(
    {
      userId: scope.viewer.userId,
      project: scope.slug,
      uploadId: crypto.randomUUID(),
      kinds,
      fileName: file.fileName,
      checkId: target.checkId ?? null,
      logEntryId: null,
      faultId: target.faultId ?? null,
      reworkId: target.reworkId ?? null,
      reworkSide: target.reworkSide ?? null,
    },
    rawKey,
  );
  if (!kept.ok) throw new Error(`a demo picture was refused: ${kept.message}`);
  await makeThumbnails({ attachmentId: kept.attachment.id });
  return kept.attachment.id;
}
