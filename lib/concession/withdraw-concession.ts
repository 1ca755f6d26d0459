import { eq, sql } from "drizzle-orm";
import { findConcession } from "@/db/queries/checks";
import { concessions, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockCheck } from "@/lib/check/lock-check";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { WithdrawConcessionInput } from "./schema";

/** The attempt is no longer accepted; the check goes back to what its attempts say. */
export async function withdrawConcession(
  scope: ProjectScope,
  input: WithdrawConcessionInput,
): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "withdraw-concession" }, async (tx) => {
    const named = await findConcession(tx, projectId, input.concessionId);
    if (!named) return reject("not-found", "There is no such concession in this project.");
    const check = await lockCheck(tx, projectId, named.checkId);
    const concession = await findConcession(tx, projectId, named.id);
    if (concession?.withdrawnAt) return reject("conflict", "The concession is withdrawn already. Nothing was changed.");
    await tx
      .update(concessions)
      .set({ withdrawnAt: sql`clock_timestamp()`, withdrawnBy: viewer.userId, withdrawnReason: input.reason })
      .where(eq(concessions.id, named.id));
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: named.id },
      "concession.withdrawn",
      {
        serial: check.serial,
        title: check.title,
        reason: input.reason,
      },
    );
    return { state: refreshed.get(check.id)?.state ?? check.state };
  });
}
