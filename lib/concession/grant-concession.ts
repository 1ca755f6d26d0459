import { concessions, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockCheck } from "@/lib/check/lock-check";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { GrantConcessionInput } from "./schema";

/** A maintainer accepts the attempt that counts, though it does not conform. */
export async function grantConcession(
  scope: ProjectScope,
  input: GrantConcessionInput,
): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "grant-concession" }, async (tx) => {
    const check = await lockCheck(tx, projectId, input.checkId);
    if (check.state !== "failed" || check.lastAttemptId === null) {
      return reject(
        "conflict",
        `A concession is for a check that fails; “${check.title}” is ${check.state}. Nothing was changed.`,
      );
    }
    if (input.attemptId !== undefined && input.attemptId !== check.lastAttemptId) {
      return reject(
        "conflict",
        `“${check.title}” was repeated in the meantime. Look at the newer attempt first; nothing was changed.`,
        {
          details: { current: check.lastAttemptId },
        },
      );
    }
    await tx.insert(concessions).values({
      id: input.writeId,
      checkId: check.id,
      attemptId: check.lastAttemptId,
      userId: viewer.userId,
      reason: input.reason,
    });
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: input.writeId },
      "concession.granted",
      {
        serial: check.serial,
        title: check.title,
        reason: input.reason,
      },
    );
    return { state: refreshed.get(check.id)?.state ?? "conceded" };
  });
}
