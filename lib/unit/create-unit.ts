import type { Transaction } from "@/db/client";
import { findRevision, lockBoard } from "@/db/queries/boards";
import { findUnitBySerial } from "@/db/queries/units";
import { units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { startTraveler } from "@/lib/traveler/start-traveler";
import type { CreateUnitInput } from "./schema";

type Created = { id: string; serial: string };

/** A new unit gets its traveler at once when the board has an issued procedure; otherwise when one is issued. */
export async function createUnit(scope: ProjectScope, input: CreateUnitInput): Promise<Answer<Created>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "create-unit" }, async (tx) => {
    const board = await lockBoard(tx, scope, input.boardId);
    if (!board) return reject("not-found", "There is no such board in this project.");
    if (board.archivedAt) reject("conflict", `${board.name} is archived. Restore it first.`);
    await requireRevision(tx, scope, board.id, input.revisionId);
    const { serial, note, revisionId } = input;
    if (await findUnitBySerial(tx, scope, serial)) rejectTakenSerial(serial);
    const [unit] = await tx
      .insert(units)
      .values({ projectId, boardId: board.id, revisionId, serial, note })
      .onConflictDoNothing()
      .returning({ id: units.id });
    if (!unit) return rejectTakenSerial(serial);
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: unit.id };
    await recordEvent(tx, subject, "unit.created", { serial });
    await startTraveler(tx, scope, { id: unit.id, boardId: board.id, serial });
    await refreshFindings(tx, scope);
    return { id: unit.id, serial };
  });
}

export async function requireRevision(tx: Transaction, scope: ProjectScope, boardId: string, revisionId: string) {
  const found = await findRevision(tx, scope, revisionId);
  if (found?.board.id === boardId) return;
  const sentence = "This board has no such revision. Choose one from the list.";
  reject("invalid", sentence, { fields: { revisionId: sentence } });
}

export function rejectTakenSerial(serial: string): never {
  const sentence = `${serial} exists already in this project, maybe archived. Choose another serial number.`;
  reject("conflict", sentence, { fields: { serial: sentence } });
}
