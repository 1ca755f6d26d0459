import { lockUnit } from "@/db/queries/units";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { ChangeUnitInput } from "@/lib/unit/schema";
import { vacate } from "./vacate";

/** Takes a unit out of whatever slot it sits in. */
export async function removeUnit(
  scope: ProjectScope,
  input: ChangeUnitInput,
): Promise<Answer<{ serial: string; position: number }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "remove-unit" }, async (tx) => {
    const unit = await lockUnit(tx, scope, input.unitId);
    if (!unit) return reject("not-found", "There is no such unit in this project.");
    const slot = await vacate(tx, scope, unit);
    if (!slot) return reject("conflict", `${unit.serial} sits in no slot. Somebody may have taken it out just now.`);
    await refreshFindings(tx, scope);
    return { serial: unit.serial, position: slot.position };
  });
}
