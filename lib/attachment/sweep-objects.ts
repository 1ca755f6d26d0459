import { inArray, or } from "drizzle-orm";
import { database } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import { deleteObjects, listObjects } from "@/lib/storage/object-store";

const PAGE = 500;
/** An upload on a poor network may take long, and its row comes last. */
const YOUNGEST_MS = 3_600_000;

/**
 * Deletes objects that no row names and that are older than an hour: uploads that were never finished, leftovers of a
 * killed process, files of purged projects. Never touches a row. The object store belongs to this installation alone.
 */
export async function sweepObjects(now = new Date()): Promise<{ seen: number; deleted: number }> {
  const orphans: string[] = [];
  let seen = 0;
  for (let offset = 0, more = true; more; offset += PAGE) {
    const page = await listObjects(offset, PAGE);
    more = page.more;
    seen += page.objects.length;
    const old = page.objects.filter((object) => now.getTime() - object.uploadedAt.getTime() > YOUNGEST_MS);
    orphans.push(...(await withoutRow(old.map((object) => object.key))));
  }
  // Only now: deleting while listing would shift the pages.
  for (let start = 0; start < orphans.length; start += PAGE) {
    // Asked again, since a row may have come while the pages were read.
    await deleteObjects(await withoutRow(orphans.slice(start, start + PAGE)));
  }
  return { seen, deleted: orphans.length };
}

async function withoutRow(keys: string[]): Promise<string[]> {
  if (keys.length === 0) return [];
  const rows = await database()
    .select({ objectKey: attachments.objectKey, smallKey: attachments.smallKey, largeKey: attachments.largeKey })
    .from(attachments)
    .where(
      or(
        inArray(attachments.objectKey, keys),
        inArray(attachments.smallKey, keys),
        inArray(attachments.largeKey, keys),
      ),
    );
  const named = new Set(rows.flatMap((row) => [row.objectKey, row.smallKey, row.largeKey]));
  return keys.filter((key) => !named.has(key));
}
