import { eq } from "drizzle-orm";
import { writeBoardPlan } from "@/db/queries/board-plans";
import { bomLines } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { openPlan } from "./open-plan";
import type { SaveBomInput } from "./schema";

/** What the board carries besides the packages of its blocks: the whole list at once, in its order. */
export async function saveBom(scope: ProjectScope, input: SaveBomInput): Promise<Answer<{ version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-bom" }, async (tx) => {
    const { board, plan } = await openPlan(tx, scope, input);
    await tx.delete(bomLines).where(eq(bomLines.boardId, board.id));
    if (input.lines.length > 0) {
      await tx
        .insert(bomLines)
        .values(input.lines.map((line, index) => ({ ...line, boardId: board.id, position: index + 1 })));
    }
    const version = await writeBoardPlan(tx, plan, {});
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "plan.edited", { code: board.code, what: "its other parts" });
    await refreshFindings(tx, scope);
    return { version };
  });
}
