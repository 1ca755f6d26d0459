import { findBuilderToTell, findNewestArrival } from "@/db/queries/checks";
import { reopenings, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { enqueue } from "@/lib/jobs/enqueue";
import { lockCheck } from "./lock-check";
import { refreshStates } from "./refresh-states";
import type { ReopenCheckInput } from "./schema";

const REOPENABLE: readonly CheckState[] = ["passed", "failed", "conceded", "doubtful"];

/** A maintainer asks for a check to be repeated; whoever carried it out last is told by mail unless they declined that. */
export async function reopenCheck(
  scope: ProjectScope,
  input: ReopenCheckInput,
): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "reopen-check" }, async (tx) => {
    const check = await lockCheck(tx, projectId, input.checkId);
    if (!REOPENABLE.includes(check.state) || check.lastAttemptId === null) {
      const why = check.state === "reopened" ? "is reopened already" : "has not been carried out yet";
      return reject("conflict", `“${check.title}” ${why}. Nothing was changed.`);
    }
    await tx.insert(reopenings).values({
      id: input.writeId,
      checkId: check.id,
      userId: viewer.userId,
      reason: input.reason,
      afterArrival: await findNewestArrival(tx, check.id),
    });
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: input.writeId },
      "check.reopened",
      {
        serial: check.serial,
        title: check.title,
        reason: input.reason,
      },
    );
    const builder = await findBuilderToTell(tx, projectId, check.lastAttemptId);
    if (builder && builder !== viewer.userId)
      await enqueue(tx, "send-mail", { kind: "check-reopened", id: input.writeId });
    return { state: refreshed.get(check.id)?.state ?? "reopened" };
  });
}
