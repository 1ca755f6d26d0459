import type { findEvidence } from "@/db/queries/attachments";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

type EvidenceRow = NonNullable<Awaited<ReturnType<typeof findEvidence>>>;

export function evidenceView(row: EvidenceRow): EvidenceView {
  return {
    id: row.id,
    kind: row.kind,
    fileName: row.fileName,
    caption: row.caption,
    bytes: row.bytes,
    width: row.width,
    height: row.height,
    hasThumbnails: row.smallKey !== null,
    by: { id: row.uploadedBy, name: row.uploaderName ?? "Somebody who left" },
    at: row.createdAt.toISOString(),
  };
}
