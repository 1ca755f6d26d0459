import { database } from "@/db/client";
import { findEntryPictures, findLogEntries } from "@/db/queries/log-entries";
import type { ProjectScope } from "@/lib/access/scope";
import { evidenceView } from "@/lib/attachment/evidence-view";
import { entryView, type EntryView } from "./entry-view";

/** Entries with their pictures, by id; archived ones too. */
export async function loadEntries(scope: ProjectScope, ids: string[]): Promise<Map<string, EntryView>> {
  const db = database();
  const [rows, pictures] = await Promise.all([findLogEntries(db, scope, ids), findEntryPictures(db, scope, ids)]);
  return new Map(
    rows.map((row) => {
      const own = pictures.filter((picture) => picture.logEntryId === row.id);
      return [row.id, entryView(row, own.map(evidenceView))];
    }),
  );
}

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** One entry; undefined when the project has none of this id. */
export async function loadEntry(scope: ProjectScope, id: string): Promise<EntryView | undefined> {
  return UUID.test(id) ? (await loadEntries(scope, [id])).get(id) : undefined;
}
