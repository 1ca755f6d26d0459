import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import {
  findChecksOfUnit,
  findNewestProcedure,
  findProcedureChecks,
  findUnitWithTraveler,
} from "@/db/queries/travelers";
import { travelers } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockStructure } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { compareVersions } from "./compare-versions";
import { moveChecks } from "./move-checks";
import { movePrerequisites } from "./move-prerequisites";
import type { MoveTravelerInput } from "./schema";
import { NO_SUCH_UNIT } from "./start-unit-traveler";

export type MovedTraveler = { from: number; to: number; kept: number; changed: number; added: number; dropped: number };

/**
 * Moves a traveler to the newest version of its procedure. Checks that prove the same keep their attempts; changed and
 * dropped ones are retired with their history, and changed ones start afresh.
 */
export async function moveTraveler(scope: ProjectScope, input: MoveTravelerInput): Promise<Answer<MovedTraveler>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "move-traveler" }, async (tx) => {
    await lockStructure(tx, projectId);
    const { unitId, serial, travelerId, from, to } = await findMove(tx, scope, input);
    const [before, after, rows] = [
      await findProcedureChecks(tx, from.id),
      await findProcedureChecks(tx, to.id),
      await findChecksOfUnit(tx, projectId, unitId),
    ];
    const difference = compareVersions(before, after);
    const moved = await moveChecks(tx, { projectId, unitId, travelerId }, { rows, after, difference });
    await tx.update(travelers).set({ procedureId: to.id }).where(eq(travelers.id, travelerId));
    await movePrerequisites(tx, projectId, { before, after, rows, ...moved });
    await refreshStates(tx, { projectId, actorId: viewer.userId }, [unitId, ...moved.unitsLetGo]);
    const [kept, changed] = [difference.kept.length, difference.changed.length];
    await recordEvent(tx, { projectId, actorId: viewer.userId, unitId, subjectId: travelerId }, "traveler.moved", {
      serial,
      from: from.number,
      to: to.number,
      kept,
      changed,
    });
    return {
      from: from.number,
      to: to.number,
      kept,
      changed,
      added: difference.added.length,
      dropped: difference.dropped.length,
    };
  });
}

async function findMove(tx: Transaction, scope: ProjectScope, input: MoveTravelerInput) {
  const found = await findUnitWithTraveler(tx, scope.projectId, input.unit);
  if (!found) return reject("not-found", NO_SUCH_UNIT);
  const { unit, board, travelerId, procedureId, number } = found;
  if (unit.archivedAt) reject("conflict", `${unit.serial} is archived. Restore it first; nothing was changed.`);
  if (travelerId === null || procedureId === null || number === null) {
    return reject("conflict", `${unit.serial} has no traveler yet. Nothing was changed.`);
  }
  const newest = await findNewestProcedure(tx, board.id);
  if (!newest || newest.number === number) {
    return reject("conflict", `${unit.serial} is on version ${number}, the newest one, already. Nothing was changed.`);
  }
  if (input.from !== number || input.to !== newest.number) {
    const sentence = `The traveler is on version ${number} and the newest is ${newest.number}. Look at the differences again; nothing was changed.`;
    return reject("conflict", sentence, { details: { current: { from: number, to: newest.number } } });
  }
  return { unitId: unit.id, serial: unit.serial, travelerId, from: { id: procedureId, number }, to: newest };
}
