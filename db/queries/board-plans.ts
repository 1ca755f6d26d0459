import { and, eq, isNull } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { boardPlans } from "@/db/schema/power";
import { lockBoard } from "./boards";

type InProject = { projectId: string };
type PlanRow = Omit<typeof boardPlans.$inferSelect, "createdAt">;

/** The defaults of the table, while nobody planned the board. Version 0: there is no row. */
export const unplanned = (boardId: string): PlanRow => ({
  boardId,
  packing: "pooled",
  family: "HC",
  clockHz: 1_000_000,
  activity: 0.25,
  loadPf: 50,
  unitsPlanned: null,
  sparesTied: false,
  version: 0,
});

/** Plans of the boards in work that have one. */
export async function findBoardPlans(db: Queryable, scope: InProject): Promise<PlanRow[]> {
  const rows = await db
    .select({ plan: boardPlans })
    .from(boardPlans)
    .innerJoin(boards, eq(boards.id, boardPlans.boardId))
    .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)));
  return rows.map(({ plan }) => plan);
}

/** The board and its plan; the board's row stays locked, so that changes of one plan come one after another. */
export async function lockBoardPlan(tx: Transaction, scope: InProject, boardId: string) {
  const board = await lockBoard(tx, scope, boardId);
  if (!board) return undefined;
  const [row] = await tx.select().from(boardPlans).where(eq(boardPlans.boardId, board.id));
  return { board, plan: row ?? unplanned(board.id) };
}

/** Writes what changes of a plan, and raises its version. The plan must have been locked. */
export async function writeBoardPlan(
  tx: Transaction,
  plan: PlanRow,
  values: Partial<Omit<PlanRow, "boardId" | "version">>,
): Promise<number> {
  const version = plan.version + 1;
  const { boardId, ...rest } = plan;
  await tx
    .insert(boardPlans)
    .values({ ...rest, ...values, boardId, version })
    .onConflictDoUpdate({ target: boardPlans.boardId, set: { ...values, version } });
  return version;
}
