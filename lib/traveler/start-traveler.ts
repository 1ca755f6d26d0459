import type { Transaction } from "@/db/client";
import { findNewestProcedure, findProcedureChecks } from "@/db/queries/travelers";
import { checkPrerequisites, checks, travelers } from "@/db/schema/travelers";
import { reject } from "@/lib/actions/answer";
import type { ProjectScope } from "@/lib/access/scope";
import { lockStructure } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { recordEvent } from "@/lib/event/record-event";
import { describeCircle, findCircle, waitsFor } from "@/lib/prerequisite/find-circle";

type NewTraveler = { id: string; boardId: string; serial: string };

/**
 * Gives a unit the newest issued procedure of its board as its traveler, in the running transaction. Answers the
 * procedure's number, or undefined when none is issued yet.
 */
export async function startTraveler(
  tx: Transaction,
  scope: ProjectScope,
  unit: NewTraveler,
): Promise<number | undefined> {
  const { projectId, viewer } = scope;
  await lockStructure(tx, projectId);
  const procedure = await findNewestProcedure(tx, unit.boardId);
  if (!procedure) return undefined;
  const [traveler] = await tx
    .insert(travelers)
    .values({ projectId, unitId: unit.id, procedureId: procedure.id })
    .onConflictDoNothing()
    .returning({ id: travelers.id });
  if (!traveler) return reject("conflict", `${unit.serial} has its traveler already. Nothing was changed.`);
  const asked = await findProcedureChecks(tx, procedure.id);
  const idOf = new Map(asked.map((check) => [check.key, crypto.randomUUID()]));
  const rows = asked.flatMap(({ id: procedureCheckId, key, position, stage, holdPoint, needs, title }) => {
    const id = idOf.get(key);
    const needed = needs.flatMap((other) => idOf.get(other) ?? []);
    return id ? [{ id, procedureCheckId, key, position, stage, holdPoint, title, needs: needed, unitId: unit.id }] : [];
  });
  refuseCircles(rows, unit.serial);
  if (rows.length > 0) {
    await tx.insert(checks).values(
      rows.map(({ id, procedureCheckId, key, position, stage, holdPoint, unitId }) => {
        return { id, projectId, unitId, travelerId: traveler.id, procedureCheckId, key, position, stage, holdPoint };
      }),
    );
  }
  const edges = rows.flatMap((row) => row.needs.map((needsCheckId) => ({ checkId: row.id, needsCheckId })));
  if (edges.length > 0) await tx.insert(checkPrerequisites).values(edges).onConflictDoNothing();
  await refreshStates(tx, { projectId, actorId: viewer.userId }, [unit.id]);
  await recordEvent(
    tx,
    { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: traveler.id },
    "traveler.started",
    {
      serial: unit.serial,
      number: procedure.number,
    },
  );
  return procedure.number;
}

type Row = { id: string; unitId: string; position: number; holdPoint: boolean; needs: string[]; title: string };

/** A procedure is checked when it is written; should one wait for itself all the same, its checks could never be done. */
function refuseCircles(rows: readonly Row[], serial: string): void {
  const edges = waitsFor(rows);
  const byId = new Map(rows.map((row) => [row.id, row]));
  for (const row of rows) {
    const circle = findCircle(edges, row.id)?.flatMap((id) => byId.get(id) ?? []);
    if (!circle) continue;
    const said = describeCircle(circle.map(({ title }) => ({ title, serial })));
    reject("conflict", `The procedure goes round in a circle: ${said} Correct it first; nothing was changed.`);
  }
}
