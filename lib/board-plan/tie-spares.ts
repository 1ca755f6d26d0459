import { writeBoardPlan } from "@/db/queries/board-plans";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { openPlan } from "./open-plan";
import type { TieSparesInput } from "./schema";

/** Says that the inputs of the spare gates are tied on the drawing, or that they are not after all. */
export async function tieSpares(scope: ProjectScope, input: TieSparesInput): Promise<Answer<{ version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "tie-spares" }, async (tx) => {
    const { board, plan } = await openPlan(tx, scope, input);
    const version = await writeBoardPlan(tx, plan, { sparesTied: input.tied });
    const what = input.tied ? "its spare inputs are tied on the drawing" : "its spare inputs are not tied yet";
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "plan.edited", { code: board.code, what });
    await refreshFindings(tx, scope);
    return { version };
  });
}
