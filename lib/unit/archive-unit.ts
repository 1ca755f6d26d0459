import { eq } from "drizzle-orm";
import { lockUnit } from "@/db/queries/units";
import { units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { vacate } from "@/lib/slot/vacate";
import type { ChangeUnitInput } from "./schema";

/** Puts the unit away, out of its slot. Its traveler and every attempt stay. */
export async function archiveUnit(scope: ProjectScope, input: ChangeUnitInput): Promise<Answer<{ serial: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "archive-unit" }, async (tx) => {
    const unit = await lockUnit(tx, scope, input.unitId);
    if (!unit) return reject("not-found", "There is no such unit in this project.");
    if (unit.archivedAt) return { serial: unit.serial };
    await vacate(tx, scope, unit);
    await tx.update(units).set({ archivedAt: new Date() }).where(eq(units.id, unit.id));
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: unit.id };
    await recordEvent(tx, subject, "unit.archived", { serial: unit.serial });
    await refreshFindings(tx, scope);
    return { serial: unit.serial };
  });
}
