import { findTwoBoards } from "@/db/queries/order";
import { boardOrders } from "@/db/schema/order";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { orderBoards } from "@/lib/calc/sequence";
import { lockStructure } from "@/lib/check/lock-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { overrideOf, saySaid } from "./overrides";
import { readBoardOrder } from "./read-board-order";
import type { SayBoardOrderInput } from "./schema";

const GONE = "This board is not in the project any more. Choose another one.";

/** Says that one board waits for another, or that it may come before one that the machine puts first. Never in a circle. */
export async function sayBoardOrder(scope: ProjectScope, input: SayBoardOrderInput): Promise<Answer<{ id: string }>> {
  const { projectId, viewer } = scope;
  const { boardId, otherId, rule, reason } = input;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "say-board-order" }, async (tx) => {
    await lockStructure(tx, projectId);
    const [board, other] = await findTwoBoards(tx, scope, [boardId, otherId]);
    if (!board) return reject("not-found", GONE, { fields: { boardId: GONE } });
    if (!other) return reject("not-found", GONE, { fields: { otherId: GONE } });
    const words = { board: board.code, other: other.code, rule };
    const { input: machine, said } = await readBoardOrder(tx, scope);
    if (said.some((one) => saySaid(one) === saySaid(words))) {
      reject("conflict", `It is said already that ${saySaid(words)}. Nothing was changed.`);
    }
    const before = orderBoards({ ...machine, overrides: [] });
    const isDerived = before.ok && before.value.links.some(({ from, to }) => from === other.code && to === board.code);
    if (rule === "despite" && !isDerived) {
      const sentence = `Nothing in the machine puts ${other.code} before ${board.code}, so there is nothing to set aside.`;
      reject("invalid", sentence, { fields: { otherId: sentence } });
    }
    const order = orderBoards({ ...machine, overrides: [...machine.overrides, overrideOf({ ...words, reason })] });
    if (!order.ok) {
      const { circle, message } = order;
      reject("conflict", `That goes round in a circle: ${message} Nothing was changed.`, { details: { circle } });
    }
    const [row] = await tx
      .insert(boardOrders)
      .values({ projectId, boardId, otherId, rule, reason, createdBy: viewer.userId })
      .returning({ id: boardOrders.id });
    if (!row) throw new Error("inserting an order of boards returned no row");
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: row.id }, "order.said", { ...words, reason });
    return row;
  });
}
