import { and, eq, inArray, isNull, notInArray, or, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";
import { recordEvent } from "@/lib/event/record-event";
import { subjectOf } from "@/lib/attachment/change-attachment";

type Picture = { id: string; caption: string };

/**
 * Makes the given pictures, in this order and with these captions, the pictures of the entry. A picture must be the
 * entry's already or belong to nothing yet; those left out are removed, as if each had been removed by hand.
 */
export async function placePictures(
  tx: Transaction,
  scope: ProjectScope,
  entry: { id: string; unitId: string | null },
  pictures: readonly Picture[],
): Promise<void> {
  const ids = pictures.map((picture) => picture.id);
  const ours = eq(attachments.projectId, scope.projectId);
  const free = and(
    isNull(attachments.logEntryId),
    isNull(attachments.checkId),
    isNull(attachments.attemptId),
    isNull(attachments.faultId),
    isNull(attachments.reworkId),
  );
  const usable = ids.length
    ? await tx
        .select({ id: attachments.id })
        .from(attachments)
        .where(and(ours, inArray(attachments.id, ids), or(eq(attachments.logEntryId, entry.id), free)))
        .for("update")
    : [];
  if (usable.length !== ids.length) {
    reject(
      "conflict",
      "A picture of the entry is no longer there or belongs to something else. Take it out and save again.",
      {
        details: { missing: ids.filter((id) => !usable.some((row) => row.id === id)) },
      },
    );
  }
  for (const [position, { id, caption }] of pictures.entries()) {
    const place = { logEntryId: entry.id, unitId: entry.unitId, position, caption, archivedAt: null };
    await tx.update(attachments).set(place).where(eq(attachments.id, id));
  }
  const dropped = await tx
    .update(attachments)
    .set({ archivedAt: sql`now()` })
    .where(
      and(
        ours,
        eq(attachments.logEntryId, entry.id),
        isNull(attachments.archivedAt),
        ids.length > 0 ? notInArray(attachments.id, ids) : undefined,
      ),
    )
    .returning();
  for (const row of dropped) {
    await recordEvent(tx, subjectOf(scope, row), "evidence.removed", { kind: row.kind, fileName: row.fileName });
  }
}
