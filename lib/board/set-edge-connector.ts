import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findConnectorsOfBoard } from "@/db/queries/connectors";
import { connectors } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";

type Edge = { connectorType: string | null; connectorReference: string };

/** What the board's form says of its first connector. Its pins stay when the face changes; the rule check tells of misfits. */
export async function setEdgeConnector(
  tx: Transaction,
  scope: ProjectScope,
  boardId: string,
  edge: Edge,
): Promise<void> {
  const { connectorType: type, connectorReference: reference } = edge;
  const all = await findConnectorsOfBoard(tx, scope, boardId);
  const [first] = all;
  if (type === null) {
    if (first) {
      const sentence = `${first.reference} is in the pin map. Remove it there, under Wiring.`;
      reject("conflict", sentence, { fields: { connectorType: sentence } });
    }
    return;
  }
  if (type === "grid" && first?.type !== "grid") {
    const sentence = "A face of one's own is set up under Wiring.";
    reject("invalid", sentence, { fields: { connectorType: sentence } });
  }
  if (all.some((one) => one !== first && one.reference.toUpperCase() === reference.toUpperCase())) {
    const sentence = `This board has another connector ${reference}. Choose another name.`;
    reject("conflict", sentence, { fields: { connectorReference: sentence } });
  }
  if (!first) {
    await tx.insert(connectors).values({ projectId: scope.projectId, boardId, type, reference, position: 1 });
  } else if (first.type !== type || first.reference !== reference) {
    await tx
      .update(connectors)
      .set({ type, reference, version: first.version + 1 })
      .where(eq(connectors.id, first.id));
  }
}
