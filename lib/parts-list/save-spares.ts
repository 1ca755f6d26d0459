import { eq } from "drizzle-orm";
import { findConditions } from "@/db/queries/machine";
import { planConditions } from "@/db/schema/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { SaveSparesInput } from "./schema";

/** The share of spares to order; it stands among the conditions of the plan, and nothing else of them changes here. */
export async function saveSpares(scope: ProjectScope, input: SaveSparesInput): Promise<Answer<{ version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-spares" }, async (tx) => {
    const own = eq(planConditions.projectId, projectId);
    // Without a row there is nothing to lock: one of the defaults that still says version 0 is made first.
    await tx
      .insert(planConditions)
      .values(await findConditions(tx, scope))
      .onConflictDoNothing();
    await tx.select({ version: planConditions.version }).from(planConditions).where(own).for("update");
    const { version, sparesPercent } = await findConditions(tx, scope);
    if (version !== input.version) {
      reject("conflict", "Somebody changed the conditions of the plan meanwhile. Look at both and save again.", {
        details: { current: { version, percent: sparesPercent } },
      });
    }
    const next = { sparesPercent: input.percent, version: version + 1 };
    await tx.update(planConditions).set(next).where(own);
    await recordEvent(tx, { projectId, actorId: viewer.userId }, "plan.spares", { percent: input.percent });
    return { version: next.version };
  });
}
