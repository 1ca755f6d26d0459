import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findConnectorsOfBoard } from "@/db/queries/connectors";
import { connectors } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { faceColumns } from "./add-connector";
import { lockWithBoard } from "./lock-with-board";
import { requireJoins } from "./require-joins";
import type { EditConnectorInput } from "./schema";

/** Reference, face, what it joins, and its place in the board's order. Pins stay, also those that the face has not. */
export async function editConnector(
  scope: ProjectScope,
  input: EditConnectorInput,
): Promise<Answer<{ name: string; version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "edit-connector" }, async (tx) => {
    const { connector: current, board } = await lockWithBoard(tx, scope, input.connectorId);
    if (current.version !== input.version) rejectChanged(current, `${board.code} ${current.reference}`);
    await requireJoins(tx, scope, { ...board, boardId: board.id, id: current.id }, input);
    const { reference, type, grid, slotId, takes, cabledTo } = input;
    const version = current.version + 1;
    await tx
      .update(connectors)
      .set({ reference, ...faceColumns(type, grid), slotId, takes, cabledTo, version })
      .where(eq(connectors.id, current.id));
    await moveTo(tx, scope, board.id, { id: current.id, position: input.position });
    const { code } = board;
    const subject = { projectId, actorId: viewer.userId, subjectId: current.id };
    await recordEvent(tx, subject, "connector.edited", { code, reference });
    await refreshFindings(tx, scope);
    return { name: `${code}.${reference}`, version };
  });
}

/** The others keep their order and close up. Below zero first: two rows may never hold one place. */
async function moveTo(tx: Transaction, scope: ProjectScope, boardId: string, moved: { id: string; position: number }) {
  const before = await findConnectorsOfBoard(tx, scope, boardId);
  const order = before.filter(({ id }) => id !== moved.id).map(({ id }) => id);
  order.splice(moved.position - 1, 0, moved.id);
  const wanted = order.map((id, index) => ({ id, position: index + 1 }));
  const changed = wanted.filter(({ id, position }) => before.find((one) => one.id === id)?.position !== position);
  for (const sign of [-1, 1]) {
    for (const { id, position } of changed) {
      await tx
        .update(connectors)
        .set({ position: sign * position })
        .where(eq(connectors.id, id));
    }
  }
}

type Row = Awaited<ReturnType<typeof findConnectorsOfBoard>>[number];

export function rejectChanged(current: Row, name: string): never {
  const { reference, type, grid, slotId, takes, cabledTo, position, version } = current;
  reject("conflict", `Somebody changed ${name} meanwhile. Look at both and save again.`, {
    details: { current: { reference, type, grid, slotId, takes, cabledTo, position, version } },
  });
}
