import { findUnitWithTraveler } from "@/db/queries/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { StartTravelerInput } from "./schema";
import { startTraveler } from "./start-traveler";

export const NO_SUCH_UNIT = "There is no such unit in this project.";

/** For a unit that was there before its board had an issued procedure. */
export async function startUnitTraveler(
  scope: ProjectScope,
  input: StartTravelerInput,
): Promise<Answer<{ number: number }>> {
  return change({ writeId: input.writeId, userId: scope.viewer.userId, action: "start-traveler" }, async (tx) => {
    const found = await findUnitWithTraveler(tx, scope.projectId, input.unit);
    if (!found) return reject("not-found", NO_SUCH_UNIT);
    const { unit, board } = found;
    if (unit.archivedAt) reject("conflict", `${unit.serial} is archived. Restore it first; nothing was changed.`);
    const number = await startTraveler(tx, scope, { id: unit.id, boardId: board.id, serial: unit.serial });
    return number === undefined
      ? reject("conflict", `${board.name} has no issued procedure yet. Issue one first; nothing was changed.`)
      : { number };
  });
}
