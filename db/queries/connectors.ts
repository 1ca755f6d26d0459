import { and, asc, eq, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { connectors, type ConnectorGrid } from "@/db/schema/wiring";

type InProject = { projectId: string };

/**
 * The first connector of a board, which the rack draws and the bench lights; columns for a query of boards.
 * Written out, because a query of one table names its columns without the table.
 */
export const edgeColumns = {
  connectorType: sql<string | null>`(select edge.type from connectors edge
    where edge.board_id = boards.id and edge.position = 1)`,
  /** Rows and positions of a face of one's own; see ConnectorGrid. */
  connectorGrid: sql<ConnectorGrid | null>`(select edge.grid from connectors edge
    where edge.board_id = boards.id and edge.position = 1)`,
  connectorReference: sql<string>`coalesce((select edge.reference from connectors edge
    where edge.board_id = boards.id and edge.position = 1), 'J1')`,
};

export async function findConnectorsOfBoard(db: Queryable, scope: InProject, boardId: string) {
  return db
    .select()
    .from(connectors)
    .where(and(eq(connectors.projectId, scope.projectId), eq(connectors.boardId, boardId)))
    .orderBy(asc(connectors.position));
}

export async function findEdgeConnector(db: Queryable, scope: InProject, boardId: string) {
  const [first] = await findConnectorsOfBoard(db, scope, boardId);
  return first;
}

export async function findConnector(db: Queryable, scope: InProject, connectorId: string) {
  const [row] = await db
    .select()
    .from(connectors)
    .where(and(eq(connectors.projectId, scope.projectId), eq(connectors.id, connectorId)));
  return row;
}

/** The row stays locked until the transaction ends: changes of one pin map come one after another. */
export async function lockConnector(db: Queryable, scope: InProject, connectorId: string) {
  const [row] = await db
    .select()
    .from(connectors)
    .where(and(eq(connectors.projectId, scope.projectId), eq(connectors.id, connectorId)))
    .for("update");
  return row;
}
