import { eq } from "drizzle-orm";
import { countPinsOf } from "@/db/queries/pin-map";
import { connectors } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectChanged } from "./edit-connector";
import { lockWithBoard } from "./lock-with-board";
import type { RemoveConnectorInput } from "./schema";

/** Its pins go with it. Refused when somebody changed them since they were looked at. */
export async function removeConnector(
  scope: ProjectScope,
  input: RemoveConnectorInput,
): Promise<Answer<{ pins: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-connector" }, async (tx) => {
    const { connector: current, board } = await lockWithBoard(tx, scope, input.connectorId);
    const { reference } = current;
    if (current.version !== input.version) rejectChanged(current, `${board.code} ${reference}`);
    const pins = await countPinsOf(tx, current.id);
    await tx.delete(connectors).where(eq(connectors.id, current.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: current.id };
    await recordEvent(tx, subject, "connector.removed", { code: board.code, reference, pins });
    await refreshFindings(tx, scope);
    return { pins };
  });
}
