import { and, eq } from "drizzle-orm";
import { findCheck } from "@/db/queries/checks";
import { checkPrerequisites, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { insist, NO_SUCH_CHECK } from "@/lib/check/lock-check";
import { lockStructure } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { PrerequisiteInput } from "./schema";

/** One check no longer waits for the other. */
export async function removePrerequisite(
  scope: ProjectScope,
  input: PrerequisiteInput,
): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-prerequisite" }, async (tx) => {
    await lockStructure(tx, projectId);
    const check = insist((await findCheck(tx, projectId, input.checkId)) ?? reject("not-found", NO_SUCH_CHECK));
    const needed = (await findCheck(tx, projectId, input.needsCheckId)) ?? reject("not-found", NO_SUCH_CHECK);
    const removed = await tx
      .delete(checkPrerequisites)
      .where(and(eq(checkPrerequisites.checkId, check.id), eq(checkPrerequisites.needsCheckId, needed.id)))
      .returning({ checkId: checkPrerequisites.checkId });
    if (removed.length === 0)
      reject("conflict", `“${check.title}” does not wait for “${needed.title}”. Nothing was changed.`);
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: needed.id },
      "prerequisite.removed",
      {
        check: `${check.serial}: ${check.title}`,
        needs: `${needed.serial}: ${needed.title}`,
      },
    );
    return { state: refreshed.get(check.id)?.state ?? check.state };
  });
}
