import { and, eq } from "drizzle-orm";
import { boards, units } from "@/db/schema/boards";
import { lockBoard } from "@/db/queries/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { ChangeBoardInput } from "./schema";

/** Brings the board back with the units that were archived with it; units archived before stay archived. */
export async function restoreBoard(scope: ProjectScope, input: ChangeBoardInput): Promise<Answer<{ units: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "restore-board" }, async (tx) => {
    const board = await lockBoard(tx, scope, input.boardId);
    if (!board) return reject("not-found", "There is no such board in this project.");
    if (!board.archivedAt) return { units: 0 };
    const back = await tx
      .update(units)
      .set({ archivedAt: null })
      .where(and(eq(units.boardId, board.id), eq(units.archivedAt, board.archivedAt)))
      .returning({ id: units.id });
    await tx.update(boards).set({ archivedAt: null }).where(eq(boards.id, board.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "board.restored", { code: board.code, name: board.name });
    await refreshFindings(tx, scope);
    return { units: back.length };
  });
}
