import type { findLogEntries } from "@/db/queries/log-entries";
import type { EvidenceView, PersonView } from "@/lib/traveler/traveler-view";

export type EntryView = {
  id: string;
  title: string;
  /** Markdown. */
  body: string;
  version: number;
  by: PersonView;
  unit: { serial: string } | null;
  at: string;
  editedAt: string | null;
  archivedAt: string | null;
  pictures: EvidenceView[];
};

type EntryRow = Awaited<ReturnType<typeof findLogEntries>>[number];

export function entryView(row: EntryRow, pictures: EvidenceView[]): EntryView {
  return {
    id: row.id,
    title: row.title,
    body: row.body,
    version: row.version,
    by: { id: row.authorId, name: row.authorName ?? "Somebody who left" },
    unit: row.serial === null ? null : { serial: row.serial },
    at: row.createdAt.toISOString(),
    editedAt: row.editedAt?.toISOString() ?? null,
    archivedAt: row.archivedAt?.toISOString() ?? null,
    pictures,
  };
}
