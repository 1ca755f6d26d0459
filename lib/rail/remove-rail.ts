import { eq } from "drizzle-orm";
import { boardsOnRail, lockRails } from "@/db/queries/rails";
import { rails } from "@/db/schema/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { railNow, type RemoveRailInput } from "./schema";

/** Takes a rail off the list that nothing draws from. */
export async function removeRail(scope: ProjectScope, input: RemoveRailInput): Promise<Answer<{ name: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-rail" }, async (tx) => {
    const current = (await lockRails(tx, scope)).find((rail) => rail.id === input.rail);
    if (!current) return reject("not-found", "This rail is gone already.");
    const { name } = current;
    if (current.version !== input.version) {
      reject("conflict", `Somebody changed ${name} meanwhile. Look at it again before it goes.`, {
        details: { current: railNow.parse(current) },
      });
    }
    const users = await boardsOnRail(tx, scope, name);
    if (users.length > 0) {
      reject("conflict", `Lines of ${users.join(", ")} take current from ${name}. Change or remove those first.`);
    }
    await tx.delete(rails).where(eq(rails.id, current.id));
    await recordEvent(tx, { projectId, actorId: viewer.userId }, "rail.removed", { name });
    await refreshFindings(tx, scope);
    return { name };
  });
}
