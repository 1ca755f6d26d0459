import { findHoldings } from "@/db/queries/holdings";
import { findUnit, lockUnit } from "@/db/queries/units";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, reject, type Answer } from "@/lib/actions/answer";
import { lockStructure } from "@/lib/check/lock-states";
import { database } from "@/db/client";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { addHoldings } from "./holdings";
import { removeUnits } from "./remove-units";
import type { PurgeUnitInput } from "./schema";

const ARCHIVE_FIRST = "Archive the unit first. Only an archived unit can be purged.";

/**
 * Removes an archived unit with everything recorded on it, for good, once its serial number was typed. Log entries
 * stay with their pictures; the lines of the log stay as they were written.
 */
export async function purgeUnit(scope: ProjectScope, input: PurgeUnitInput): Promise<Answer<{ serial: string }>> {
  const { projectId, viewer } = scope;
  // Asked before any lock is taken: whoever is at work on a unit that is not archived is not held up.
  const before = await findUnit(database(), scope, input.unitId);
  if (before && !before.archivedAt) return refuse("conflict", ARCHIVE_FIRST);
  return change({ writeId: input.writeId, userId: viewer.userId, action: "purge-unit" }, async (tx) => {
    await lockStructure(tx, projectId);
    const unit = await lockUnit(tx, scope, input.unitId);
    if (!unit) return reject("not-found", "There is no such unit in this project.");
    const { serial } = unit;
    if (!unit.archivedAt) reject("conflict", ARCHIVE_FIRST);
    if (input.confirmation !== serial) {
      const sentence = `Type the serial number exactly: ${serial}`;
      reject("invalid", "The serial number does not match. Nothing was purged.", {
        fields: { confirmation: sentence },
      });
    }
    const { checks, attempts, files, waitsOfOtherUnits } = addHoldings(await findHoldings(tx, scope, [unit.id]));
    await removeUnits(tx, scope, [unit.id]);
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: unit.id };
    await recordEvent(tx, subject, "unit.purged", { serial, checks, attempts, files, waits: waitsOfOtherUnits });
    await refreshFindings(tx, scope);
    return { serial };
  });
}
