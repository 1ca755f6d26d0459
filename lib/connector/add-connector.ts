import { lockBoard } from "@/db/queries/boards";
import { findConnectorsOfBoard } from "@/db/queries/connectors";
import { connectors } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { requireJoins } from "./require-joins";
import type { AddConnectorInput } from "./schema";

/** The board's next connector, last in its order. */
export async function addConnector(
  scope: ProjectScope,
  input: AddConnectorInput,
): Promise<Answer<{ id: string; name: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "add-connector" }, async (tx) => {
    const board = await lockBoard(tx, scope, input.boardId);
    if (!board || board.archivedAt) return reject("not-found", "There is no such board in this project.");
    await requireJoins(tx, scope, { ...board, boardId: board.id, id: undefined }, input);
    const all = await findConnectorsOfBoard(tx, scope, board.id);
    const { reference, type, grid, slotId, takes, cabledTo } = input;
    const position = Math.max(0, ...all.map((one) => one.position)) + 1;
    const [row] = await tx
      .insert(connectors)
      .values({
        projectId,
        boardId: board.id,
        reference,
        ...faceColumns(type, grid),
        position,
        slotId,
        takes,
        cabledTo,
      })
      .returning({ id: connectors.id });
    if (!row) return reject("conflict", `${board.code} has a connector ${reference} already.`);
    const { code } = board;
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: row.id }, "connector.added", {
      code,
      reference,
    });
    await refreshFindings(tx, scope);
    return { id: row.id, name: `${code}.${reference}` };
  });
}

/** A grid belongs to a face of one's own and to nothing else. */
export const faceColumns = (type: string, grid: AddConnectorInput["grid"]) => ({
  type,
  grid: type === "grid" ? grid : null,
});
