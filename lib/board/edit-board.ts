import { eq } from "drizzle-orm";
import { boards } from "@/db/schema/boards";
import { findBoardByCode, lockBoard } from "@/db/queries/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectTakenCode } from "./create-board";
import type { EditBoardInput } from "./schema";
import { setEdgeConnector } from "./set-edge-connector";

/** Serial numbers already given keep the code they were given with. */
export async function editBoard(
  scope: ProjectScope,
  input: EditBoardInput,
): Promise<Answer<{ code: string; version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "edit-board" }, async (tx) => {
    const current = await lockBoard(tx, scope, input.boardId);
    if (!current) return reject("not-found", "There is no such board in this project.");
    if (current.version !== input.version) {
      const { code, name, summary, kind, connectorType, connectorReference, version } = current;
      reject("conflict", "Somebody changed this board meanwhile. Look at both and save again.", {
        details: { current: { code, name, summary, kind, connectorType, connectorReference, version } },
      });
    }
    const { code, name, summary, kind } = input;
    const same = code === current.code ? undefined : await findBoardByCode(tx, scope, code);
    if (same) rejectTakenCode(code, same.name, same.archivedAt !== null);
    const version = current.version + 1;
    await tx.update(boards).set({ code, name, summary, kind, version }).where(eq(boards.id, current.id));
    await setEdgeConnector(tx, scope, current.id, input);
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: current.id }, "board.edited", { code, name });
    await refreshFindings(tx, scope);
    return { code, version };
  });
}
