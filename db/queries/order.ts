import { and, asc, eq, inArray, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { boardOrders } from "@/db/schema/order";
import { users } from "@/db/schema/people";

type InProject = { projectId: string };

const other = alias(boards, "other_board");

/** What people say about the order of the boards in work, the oldest first. */
export async function findBoardOrders(db: Queryable, scope: InProject) {
  return db
    .select({
      id: boardOrders.id,
      rule: boardOrders.rule,
      reason: boardOrders.reason,
      board: boards.code,
      other: other.code,
      by: users.name,
      at: boardOrders.createdAt,
    })
    .from(boardOrders)
    .innerJoin(boards, eq(boards.id, boardOrders.boardId))
    .innerJoin(other, eq(other.id, boardOrders.otherId))
    .leftJoin(users, eq(users.id, boardOrders.createdBy))
    .where(
      and(
        eq(boardOrders.projectId, scope.projectId),
        sql`${boards.archivedAt} is null`,
        sql`${other.archivedAt} is null`,
      ),
    )
    .orderBy(asc(boardOrders.createdAt), asc(boardOrders.id));
}

export type BoardOrderRow = Awaited<ReturnType<typeof findBoardOrders>>[number];

/** The two boards of a rule, as they are in this project. */
export async function findTwoBoards(db: Queryable, scope: InProject, ids: readonly [string, string]) {
  const rows = await db
    .select({ id: boards.id, code: boards.code })
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), inArray(boards.id, [...ids]), sql`${boards.archivedAt} is null`));
  return ids.map((id) => rows.find((row) => row.id === id));
}

/** Each slot's and each loose unit's serial with whether its checks up to power-on hold; false without such checks. */
export async function findProvenSerials(db: Queryable, scope: InProject): Promise<string[]> {
  const rows = await db.execute<{ serial: string }>(sql`
    select units.serial from units
    join checks on checks.unit_id = units.id and checks.retired_at is null
      and checks.stage in ('inspection', 'continuity', 'power-on')
    where units.project_id = ${scope.projectId} and units.archived_at is null
    group by units.id, units.serial
    having bool_and(checks.state in ('passed', 'conceded'))`);
  return rows.map(({ serial }) => serial);
}

/** Boards in work, for choosing. */
export async function findBoardsToOrder(db: Queryable, scope: InProject) {
  return db
    .select({ id: boards.id, code: boards.code, name: boards.name })
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), sql`${boards.archivedAt} is null`))
    .orderBy(asc(boards.code));
}
