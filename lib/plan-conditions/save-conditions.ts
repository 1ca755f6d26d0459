import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findConditions } from "@/db/queries/machine";
import { planConditions } from "@/db/schema/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { conditionsNow, type SaveConditionsInput } from "./schema";
import { whatChanged } from "./what-changed";

/** What the whole plan takes for granted. Levels, pull-ups and contacts are checked anew by it. */
export async function saveConditions(
  scope: ProjectScope,
  input: SaveConditionsInput,
): Promise<Answer<{ version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-conditions" }, async (tx) => {
    const current = await lockConditions(tx, scope);
    if (current.version !== input.version) {
      reject("conflict", "Somebody changed the conditions meanwhile. Look at both and save again.", {
        details: { current },
      });
    }
    const { ambientC, logicVolts, logicRail, pinCapacitancePf, sparesPercent, currency } = input;
    const values = { ambientC, logicVolts, logicRail, pinCapacitancePf, sparesPercent, currency };
    const what = whatChanged(current, values);
    if (what === "") return { version: current.version };
    const version = current.version + 1;
    await tx
      .insert(planConditions)
      .values({ projectId, ...values, version })
      .onConflictDoUpdate({ target: planConditions.projectId, set: { ...values, version } });
    await recordEvent(tx, { projectId, actorId: viewer.userId }, "plan.conditions", { what });
    await refreshFindings(tx, scope);
    return { version };
  });
}

/** Without a row there is nothing to lock: a row of defaults that still says version 0 is made first. */
async function lockConditions(tx: Transaction, scope: ProjectScope) {
  const defaults = await findConditions(tx, scope);
  await tx.insert(planConditions).values(defaults).onConflictDoNothing();
  await tx
    .select({ version: planConditions.version })
    .from(planConditions)
    .where(eq(planConditions.projectId, scope.projectId))
    .for("update");
  return conditionsNow.parse(await findConditions(tx, scope));
}
