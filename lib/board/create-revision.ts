import { eq } from "drizzle-orm";
import { revisions } from "@/db/schema/boards";
import { lockBoard } from "@/db/queries/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { nextLetter } from "./revision-letter";
import type { CreateRevisionInput } from "./schema";

export async function createRevision(
  scope: ProjectScope,
  input: CreateRevisionInput,
): Promise<Answer<{ letter: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "create-revision" }, async (tx) => {
    const board = await lockBoard(tx, scope, input.boardId);
    if (!board) return reject("not-found", "There is no such board in this project.");
    if (board.archivedAt) reject("conflict", `${board.name} is archived. Restore it first.`);
    const rows = await tx.select({ letter: revisions.letter }).from(revisions).where(eq(revisions.boardId, board.id));
    const letter = nextLetter(rows.map((row) => row.letter));
    const [made] = await tx
      .insert(revisions)
      .values({ boardId: board.id, letter, notes: input.notes })
      .returning({ id: revisions.id });
    const subject = { projectId, actorId: viewer.userId, subjectId: made?.id };
    await recordEvent(tx, subject, "revision.created", { code: board.code, letter });
    return { letter };
  });
}
