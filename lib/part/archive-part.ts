import { eq } from "drizzle-orm";
import { lockPart } from "@/db/queries/parts";
import { parts } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectUsedFunction } from "./reject-used-function";
import type { ChangePartInput } from "./schema";

/** An archived part is no longer offered; its stock and price still count where a board names it. */
export const archivePart = (scope: ProjectScope, input: ChangePartInput) =>
  setArchived(scope, input, "archive-part", new Date());

export const restorePart = (scope: ProjectScope, input: ChangePartInput) =>
  setArchived(scope, input, "restore-part", null);

async function setArchived(
  scope: ProjectScope,
  input: ChangePartInput,
  action: "archive-part" | "restore-part",
  archivedAt: Date | null,
): Promise<Answer<{ number: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action }, async (tx) => {
    const part = await lockPart(tx, scope, { id: input.part });
    if (!part) return reject("not-found", "There is no such part in this project.");
    const { number } = part;
    if ((part.archivedAt === null) === (archivedAt === null)) return { number };
    await tx.update(parts).set({ archivedAt }).where(eq(parts.id, part.id));
    if (archivedAt && part.logic !== null) await rejectUsedFunction(tx, scope, number);
    const subject = { projectId, actorId: viewer.userId, subjectId: part.id };
    await recordEvent(tx, subject, archivedAt ? "part.archived" : "part.restored", { number });
    await refreshFindings(tx, scope);
    return { number };
  });
}
