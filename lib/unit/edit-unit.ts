import { eq } from "drizzle-orm";
import { findUnitBySerial, lockUnit } from "@/db/queries/units";
import { units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockUnits } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectTakenSerial, requireRevision } from "./create-unit";
import type { EditUnitInput } from "./schema";

export async function editUnit(
  scope: ProjectScope,
  input: EditUnitInput,
): Promise<Answer<{ serial: string; version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "edit-unit" }, async (tx) => {
    const current = await lockUnit(tx, scope, input.unitId);
    if (!current) return reject("not-found", "There is no such unit in this project.");
    if (current.version !== input.version) {
      const { serial, revisionId, note, version } = current;
      reject("conflict", "Somebody changed this unit meanwhile. Look at both and save again.", {
        details: { current: { serial, revisionId, note, version } },
      });
    }
    const { serial, revisionId, note } = input;
    if (serial !== current.serial && (await findUnitBySerial(tx, scope, serial))) rejectTakenSerial(serial);
    if (revisionId !== current.revisionId) await requireRevision(tx, scope, current.boardId, revisionId);
    const version = current.version + 1;
    await tx.update(units).set({ serial, revisionId, note, version }).where(eq(units.id, current.id));
    const subject = { projectId, actorId: viewer.userId, unitId: current.id, subjectId: current.id };
    await recordEvent(tx, subject, "unit.edited", { serial });
    if (serial !== current.serial) {
      // Reasons such as “Waits for … on TIM-01” name the serial.
      await lockUnits(tx, projectId, [current.id]);
      await refreshStates(tx, { projectId, actorId: viewer.userId }, [current.id]);
    }
    await refreshFindings(tx, scope);
    return { serial, version };
  });
}
