import type { Transaction } from "@/db/client";
import { findBoard } from "@/db/queries/boards";
import { findSlotAt } from "@/db/queries/slots";
import { slots } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { CreateSlotInput } from "./schema";

export async function createSlot(
  scope: ProjectScope,
  input: CreateSlotInput,
): Promise<Answer<{ id: string; position: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "create-slot" }, async (tx) => {
    const { position, label, pitchHp, boardId } = input;
    if (boardId) await requireCard(tx, scope, boardId);
    if (await findSlotAt(tx, scope, position)) rejectTakenPosition(position);
    const [slot] = await tx
      .insert(slots)
      .values({ projectId, position, label, pitchHp, boardId })
      .onConflictDoNothing()
      .returning({ id: slots.id });
    if (!slot) return rejectTakenPosition(position);
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: slot.id }, "slot.created", { position });
    await refreshFindings(tx, scope);
    return { id: slot.id, position };
  });
}

/** A slot takes cards; the backplane is what the slots are on. */
export async function requireCard(tx: Transaction, scope: ProjectScope, boardId: string) {
  const board = await findBoard(tx, scope, boardId);
  if (!board || board.archivedAt) {
    const sentence = "There is no such board in this project. Choose one from the list.";
    return reject("invalid", sentence, { fields: { boardId: sentence } });
  }
  if (board.kind === "backplane") {
    const sentence = `${board.name} is the backplane. Choose a card that plugs into it.`;
    return reject("invalid", sentence, { fields: { boardId: sentence } });
  }
  return board;
}

export function rejectTakenPosition(position: number): never {
  const sentence = `There is a slot ${position} already. Choose another position.`;
  reject("conflict", sentence, { fields: { position: sentence } });
}
