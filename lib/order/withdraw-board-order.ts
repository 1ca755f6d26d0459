import { and, eq } from "drizzle-orm";
import { findBoardOrders } from "@/db/queries/order";
import { boardOrders } from "@/db/schema/order";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockStructure } from "@/lib/check/lock-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { WithdrawBoardOrderInput } from "./schema";

/** What was said about two boards is said no longer. */
export async function withdrawBoardOrder(
  scope: ProjectScope,
  input: WithdrawBoardOrderInput,
): Promise<Answer<{ board: string; other: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "withdraw-board-order" }, async (tx) => {
    await lockStructure(tx, projectId);
    const said = (await findBoardOrders(tx, scope)).find(({ id }) => id === input.id);
    if (!said) return reject("not-found", "Somebody withdrew this already. Nothing was changed.");
    await tx.delete(boardOrders).where(and(eq(boardOrders.projectId, projectId), eq(boardOrders.id, said.id)));
    const { board, other, rule } = said;
    const subject = { projectId, actorId: viewer.userId, subjectId: said.id };
    await recordEvent(tx, subject, "order.withdrawn", { board, other, rule });
    return { board, other };
  });
}
