import { and, eq } from "drizzle-orm";
import { instruments } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { ChangeInstrumentInput } from "./schema";

/** An archived instrument is no longer offered at the bench; its readings keep naming it. */
export const archiveInstrument = (scope: OwnScope, input: ChangeInstrumentInput) =>
  setArchived(scope, input, "archive-instrument", new Date());

export const restoreInstrument = (scope: OwnScope, input: ChangeInstrumentInput) =>
  setArchived(scope, input, "restore-instrument", null);

async function setArchived(
  scope: OwnScope,
  input: ChangeInstrumentInput,
  action: string,
  archivedAt: Date | null,
): Promise<Answer<null>> {
  const { userId } = scope.viewer;
  return change({ writeId: input.writeId, userId, action }, async (tx) => {
    const rows = await tx
      .update(instruments)
      .set({ archivedAt })
      .where(and(eq(instruments.id, input.instrument), eq(instruments.userId, userId)))
      .returning({ id: instruments.id });
    if (rows.length === 0) reject("not-found", "You have no such instrument.");
    return null;
  });
}
