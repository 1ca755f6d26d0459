import { isLifted } from "@/db/queries/checks";
import { holdLifts, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { holds } from "./check-history";
import { lockCheck } from "./lock-check";
import { refreshStates } from "./refresh-states";
import type { LiftHoldInput } from "./schema";

/** A maintainer lets this one unit go on past an open hold point. It cannot be taken back: it stays on the traveler. */
export async function liftHold(scope: ProjectScope, input: LiftHoldInput): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "lift-hold" }, async (tx) => {
    const check = await lockCheck(tx, projectId, input.checkId);
    if (!check.holdPoint) reject("conflict", `“${check.title}” is not a hold point. Nothing was changed.`);
    if (holds(check.state))
      reject("conflict", `“${check.title}” holds nothing back: it is ${check.state}. Nothing was changed.`);
    if (await isLifted(tx, check.id))
      reject("conflict", `The hold of “${check.title}” is lifted already. Nothing was changed.`);
    await tx
      .insert(holdLifts)
      .values({ id: input.writeId, checkId: check.id, userId: viewer.userId, reason: input.reason });
    await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: input.writeId },
      "hold.lifted",
      {
        serial: check.serial,
        title: check.title,
        reason: input.reason,
      },
    );
    return { state: check.state };
  });
}
