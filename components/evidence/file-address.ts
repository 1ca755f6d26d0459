import type { AttachmentKind } from "@/db/schema/evidence";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

/** Where a file is read through the app. Without a size it is the file itself. */
export function fileAddress(project: string, id: string, size?: "small" | "large"): string {
  return `/api/projects/${encodeURIComponent(project)}/files/${id}${size ? `?size=${size}` : ""}`;
}

export const KIND_LABELS: Record<AttachmentKind, string> = {
  photo: "Photo",
  "scope-picture": "Scope picture",
  "scope-data": "Scope data",
};

/** What a picture shows, in words: its caption, or at least what it is. */
export const altText = (evidence: EvidenceView): string =>
  evidence.caption === "" ? `${KIND_LABELS[evidence.kind]} ${evidence.fileName}` : evidence.caption;

export const isPicture = (evidence: EvidenceView): boolean => evidence.kind !== "scope-data";
