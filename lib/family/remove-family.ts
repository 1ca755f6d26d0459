import { eq } from "drizzle-orm";
import { lockFamily } from "@/db/queries/families";
import { families } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectStale } from "./save-family";
import type { RemoveFamilyInput } from "./schema";

/** The own figures go; pins that name the family are checked with the built-in ones again, if there are any. */
export async function removeFamily(scope: ProjectScope, input: RemoveFamilyInput): Promise<Answer<{ name: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-family" }, async (tx) => {
    const current = await lockFamily(tx, scope, input.familyId);
    if (!current) return reject("not-found", "There is no such family in this project.");
    if (current.version !== input.version) rejectStale(current);
    const { id, name } = current;
    await tx.delete(families).where(eq(families.id, id));
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: id }, "family.removed", { name });
    await refreshFindings(tx, scope);
    return { name };
  });
}
