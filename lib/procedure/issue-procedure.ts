import { and, asc, eq, isNull, notExists } from "drizzle-orm";
import { units } from "@/db/schema/boards";
import { procedures } from "@/db/schema/procedures";
import { travelers } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { startTraveler } from "@/lib/traveler/start-traveler";
import { openDraft } from "./open-draft";
import type { IssueProcedureInput } from "./schema";

type Issued = { number: number; started: number };

/**
 * The draft becomes a version that never changes again. Units without a traveler get one; travelers in progress keep
 * theirs until somebody moves them over.
 */
export async function issueProcedure(scope: ProjectScope, input: IssueProcedureInput): Promise<Answer<Issued>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "issue-procedure" }, async (tx) => {
    const { procedure, board, checks } = await openDraft(tx, scope, input);
    if (checks.length === 0) reject("invalid", "The draft has no checks. Add one before it is issued.");
    const { number } = procedure;
    await tx
      .update(procedures)
      .set({ state: "issued", issuedAt: new Date(), note: input.note })
      .where(eq(procedures.id, procedure.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: procedure.id };
    await recordEvent(tx, subject, "procedure.issued", { code: board.code, number, note: input.note });
    const waiting = await tx
      .select({ id: units.id, serial: units.serial })
      .from(units)
      .where(
        and(
          eq(units.boardId, board.id),
          isNull(units.archivedAt),
          notExists(tx.select({ id: travelers.id }).from(travelers).where(eq(travelers.unitId, units.id))),
        ),
      )
      .orderBy(asc(units.serial));
    for (const unit of waiting) await startTraveler(tx, scope, { ...unit, boardId: board.id });
    return { number, started: waiting.length };
  });
}
