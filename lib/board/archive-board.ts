import { and, eq, isNull } from "drizzle-orm";
import { boards, units } from "@/db/schema/boards";
import { lockBoard } from "@/db/queries/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { vacate } from "@/lib/slot/vacate";
import type { ChangeBoardInput } from "./schema";

/** Its units go with it, out of their slots; they carry the same instant, by which restoring finds them again. */
export async function archiveBoard(scope: ProjectScope, input: ChangeBoardInput): Promise<Answer<{ units: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "archive-board" }, async (tx) => {
    const board = await lockBoard(tx, scope, input.boardId);
    if (!board) return reject("not-found", "There is no such board in this project.");
    if (board.archivedAt) return { units: 0 };
    const archivedAt = new Date();
    const gone = await tx
      .update(units)
      .set({ archivedAt })
      .where(and(eq(units.boardId, board.id), isNull(units.archivedAt)))
      .returning({ id: units.id, serial: units.serial });
    for (const unit of gone) await vacate(tx, scope, unit);
    await tx.update(boards).set({ archivedAt }).where(eq(boards.id, board.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "board.archived", { code: board.code, name: board.name });
    await refreshFindings(tx, scope);
    return { units: gone.length };
  });
}
