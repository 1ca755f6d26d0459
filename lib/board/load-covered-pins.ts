import { and, asc, eq, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { procedureChecks, procedures } from "@/db/schema/procedures";
import { faceOf, type ConnectorGrid } from "@/lib/calc/connector";
import { coveredPins, type CoveredPin } from "./covered-pins";

type Board = {
  id: string;
  connectorType: string | null;
  connectorGrid: ConnectorGrid | null;
  connectorReference: string;
};

/** What the newest issued procedure of a board of the granted project covers of its connector. */
export async function loadCoveredPins(db: Queryable, board: Board): Promise<CoveredPin[]> {
  const connector = faceOf({ type: board.connectorType ?? "", grid: board.connectorGrid });
  if (!connector) return [];
  const rows = await db
    .select({ title: procedureChecks.title, covers: procedureChecks.covers })
    .from(procedureChecks)
    .innerJoin(procedures, eq(procedures.id, procedureChecks.procedureId))
    .where(
      and(
        eq(procedures.boardId, board.id),
        eq(
          procedures.number,
          sql`(select max(issued.number) from procedures issued where issued.board_id = ${board.id} and issued.state = 'issued')`,
        ),
      ),
    )
    .orderBy(asc(procedureChecks.position));
  return coveredPins(
    connector,
    board.connectorReference,
    rows.map(({ title, covers }) => ({ title, pins: covers.pins })),
  );
}
