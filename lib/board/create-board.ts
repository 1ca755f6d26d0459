import { boards, revisions } from "@/db/schema/boards";
import { findBoardByCode } from "@/db/queries/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { CreateBoardInput } from "./schema";
import { setEdgeConnector } from "./set-edge-connector";

/** A new board begins with revision A, not yet released. */
export async function createBoard(
  scope: ProjectScope,
  input: CreateBoardInput,
): Promise<Answer<{ id: string; code: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "create-board" }, async (tx) => {
    const { code, name, summary, kind } = input;
    const same = await findBoardByCode(tx, scope, code);
    if (same) rejectTakenCode(code, same.name, same.archivedAt !== null);
    const [board] = await tx
      .insert(boards)
      .values({ projectId, code, name, summary, kind })
      .onConflictDoNothing()
      .returning({ id: boards.id });
    if (!board) return rejectTakenCode(code, "another board", false);
    await setEdgeConnector(tx, scope, board.id, input);
    await tx.insert(revisions).values({ boardId: board.id, letter: "A" });
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: board.id }, "board.created", { code, name });
    return { id: board.id, code };
  });
}

export function rejectTakenCode(code: string, holder: string, archived: boolean): never {
  const sentence = `${code} belongs to ${holder}${archived ? ", which is archived" : ""}. Choose another code.`;
  reject("conflict", sentence, { fields: { code: sentence } });
}
