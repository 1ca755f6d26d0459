import { database } from "@/db/client";
import { findNewestProcedure, findProcedureChecks, findUnitWithTraveler } from "@/db/queries/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { compareVersions, type Difference } from "./compare-versions";

export type MoveView = { serial: string; from: number; to: number; difference: Difference };

/** What moving a unit's traveler to the newest version would change; undefined when there is nothing to move. */
export async function loadMove(scope: ProjectScope, serial: string): Promise<MoveView | undefined> {
  const db = database();
  const found = await findUnitWithTraveler(db, scope.projectId, serial);
  if (!found || found.procedureId === null || found.number === null) return undefined;
  const newest = await findNewestProcedure(db, found.board.id);
  if (!newest || newest.number === found.number) return undefined;
  const [from, to] = await Promise.all([
    findProcedureChecks(db, found.procedureId),
    findProcedureChecks(db, newest.id),
  ]);
  return { serial: found.unit.serial, from: found.number, to: newest.number, difference: compareVersions(from, to) };
}
