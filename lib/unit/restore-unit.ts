import { eq } from "drizzle-orm";
import { findBoard } from "@/db/queries/boards";
import { lockUnit } from "@/db/queries/units";
import { units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { ChangeUnitInput } from "./schema";

export async function restoreUnit(scope: ProjectScope, input: ChangeUnitInput): Promise<Answer<{ serial: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "restore-unit" }, async (tx) => {
    const unit = await lockUnit(tx, scope, input.unitId);
    if (!unit) return reject("not-found", "There is no such unit in this project.");
    if (!unit.archivedAt) return { serial: unit.serial };
    const board = await findBoard(tx, scope, unit.boardId);
    if (board?.archivedAt) reject("conflict", `${board.name} is archived. Restore the board first.`);
    await tx.update(units).set({ archivedAt: null }).where(eq(units.id, unit.id));
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: unit.id };
    await recordEvent(tx, subject, "unit.restored", { serial: unit.serial });
    await refreshFindings(tx, scope);
    return { serial: unit.serial };
  });
}
