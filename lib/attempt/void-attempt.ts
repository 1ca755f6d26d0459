import { findAttempt } from "@/db/queries/checks";
import { attemptVoids, type CheckState } from "@/db/schema/travelers";
import { can } from "@/lib/access/permissions";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockCheck } from "@/lib/check/lock-check";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { VoidAttemptInput } from "./schema";
import { mayVoid } from "./void-window";

/** Takes a slip out of the count. The attempt stays where it is, crossed out, with the reason. */
export async function voidAttempt(
  scope: ProjectScope,
  input: VoidAttemptInput,
): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer, role } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "void-attempt" }, async (tx) => {
    const named = await findAttempt(tx, projectId, input.attemptId);
    if (!named) return reject("not-found", "There is no such attempt in this project.");
    const check = await lockCheck(tx, projectId, named.checkId);
    const attempt = await findAttempt(tx, projectId, named.id);
    if (attempt?.voidId) return reject("conflict", "The attempt is void already. Nothing was changed.");
    const isOwn = named.userId === viewer.userId;
    if (!can(role, "attempt.void-any") && !mayVoid({ isOwn, recordedAt: named.recordedAt }, named.now)) {
      const why = isOwn ? "It is older than 10 minutes." : "It is somebody else’s.";
      return reject("forbidden", `${why} A maintainer can void it; you can repeat the check. Nothing was changed.`);
    }
    await tx
      .insert(attemptVoids)
      .values({ id: input.writeId, attemptId: named.id, userId: viewer.userId, reason: input.reason });
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: named.id },
      "attempt.voided",
      {
        serial: check.serial,
        title: check.title,
        reason: input.reason,
      },
    );
    return { state: refreshed.get(check.id)?.state ?? check.state };
  });
}
