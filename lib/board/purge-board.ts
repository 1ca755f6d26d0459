import { and, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { findBoard, lockBoard } from "@/db/queries/boards";
import { findHoldings } from "@/db/queries/holdings";
import { boards, units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, reject, type Answer } from "@/lib/actions/answer";
import { lockStructure } from "@/lib/check/lock-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { addHoldings } from "@/lib/unit/holdings";
import { removeUnits } from "@/lib/unit/remove-units";
import type { PurgeBoardInput } from "./schema";

const ARCHIVE_FIRST = "Archive the board first. Only an archived board can be purged.";

/**
 * Removes an archived board for good, once its code was typed: its units with everything recorded on them, its
 * revisions, its procedures. Slots that were wired for it stay and take any card.
 */
export async function purgeBoard(scope: ProjectScope, input: PurgeBoardInput): Promise<Answer<{ code: string }>> {
  const { projectId, viewer } = scope;
  // Asked before any lock is taken: whoever is at work on a board that is not archived is not held up.
  const before = await findBoard(database(), scope, input.boardId);
  if (before && !before.archivedAt) return refuse("conflict", ARCHIVE_FIRST);
  return change({ writeId: input.writeId, userId: viewer.userId, action: "purge-board" }, async (tx) => {
    await lockStructure(tx, projectId);
    const board = await lockBoard(tx, scope, input.boardId);
    if (!board) return reject("not-found", "There is no such board in this project.");
    const { code, name } = board;
    if (!board.archivedAt) reject("conflict", ARCHIVE_FIRST);
    if (input.confirmation !== code) {
      const sentence = `Type the code exactly: ${code}`;
      reject("invalid", "The code does not match. Nothing was purged.", { fields: { confirmation: sentence } });
    }
    const own = await tx
      .select({ id: units.id })
      .from(units)
      .where(and(eq(units.projectId, projectId), eq(units.boardId, board.id)));
    const unitIds = own.map((unit) => unit.id);
    const { checks, attempts, files, waitsOfOtherBoards } = addHoldings(await findHoldings(tx, scope, unitIds));
    await removeUnits(tx, scope, unitIds);
    await tx.delete(boards).where(eq(boards.id, board.id));
    const gone = { units: unitIds.length, checks, attempts, files, waits: waitsOfOtherBoards };
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: board.id }, "board.purged", {
      code,
      name,
      ...gone,
    });
    await refreshFindings(tx, scope);
    return { code };
  });
}
