import { database } from "@/db/client";
import { findEdgeConnector } from "@/db/queries/connectors";
import type { ConnectorGrid } from "@/lib/calc/connector";

/** The first connector of a board, which the drawings light. */
export async function loadBoardFace(
  scope: { projectId: string },
  boardId: string,
): Promise<{ connectorType: string | null; connectorGrid: ConnectorGrid | null; connectorReference: string }> {
  const edge = await findEdgeConnector(database(), scope, boardId);
  return {
    connectorType: edge?.type ?? null,
    connectorGrid: edge?.grid ?? null,
    connectorReference: edge?.reference ?? "J1",
  };
}
