import { and, asc, count, eq, isNull, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { boards, units } from "@/db/schema/boards";
import { memberships, projects, type MachineLayout, type Role } from "@/db/schema/projects";
import { checks } from "@/db/schema/travelers";
import type { OwnScope } from "@/lib/access/scope";

export type ProjectCardView = {
  slug: string;
  name: string;
  summary: string;
  layout: MachineLayout;
  role: Role;
  archived: boolean;
  boards: number;
  units: number;
  checks: number;
  holding: number;
  failing: number;
  doubtful: number;
};

/** The projects a person is a member of, the ones in work first. */
export async function loadProjects(scope: OwnScope): Promise<ProjectCardView[]> {
  const db = database();
  const boardCounts = db
    .select({ projectId: boards.projectId, total: count().as("board_total") })
    .from(boards)
    .where(isNull(boards.archivedAt))
    .groupBy(boards.projectId)
    .as("board_counts");
  const unitCounts = db
    .select({ projectId: units.projectId, total: count().as("unit_total") })
    .from(units)
    .where(isNull(units.archivedAt))
    .groupBy(units.projectId)
    .as("unit_counts");
  const checkCounts = db
    .select({
      projectId: checks.projectId,
      total: count().as("check_total"),
      holding: sql<number>`count(*) filter (where ${checks.state} in ('passed', 'conceded'))`
        .mapWith(Number)
        .as("holding"),
      failing: sql<number>`count(*) filter (where ${checks.state} = 'failed')`.mapWith(Number).as("failing"),
      doubtful: sql<number>`count(*) filter (where ${checks.state} in ('doubtful', 'reopened'))`
        .mapWith(Number)
        .as("doubtful"),
    })
    .from(checks)
    .innerJoin(units, eq(units.id, checks.unitId))
    .where(and(isNull(checks.retiredAt), isNull(units.archivedAt)))
    .groupBy(checks.projectId)
    .as("check_counts");
  const rows = await db
    .select({
      slug: projects.slug,
      name: projects.name,
      summary: projects.summary,
      layout: projects.layout,
      role: memberships.role,
      archivedAt: projects.archivedAt,
      boards: boardCounts.total,
      units: unitCounts.total,
      checks: checkCounts.total,
      holding: checkCounts.holding,
      failing: checkCounts.failing,
      doubtful: checkCounts.doubtful,
    })
    .from(memberships)
    .innerJoin(projects, eq(projects.id, memberships.projectId))
    .leftJoin(boardCounts, eq(boardCounts.projectId, projects.id))
    .leftJoin(unitCounts, eq(unitCounts.projectId, projects.id))
    .leftJoin(checkCounts, eq(checkCounts.projectId, projects.id))
    .where(eq(memberships.userId, scope.viewer.userId))
    .orderBy(asc(projects.name), asc(projects.slug));
  return rows.map(({ archivedAt, ...row }) => ({
    ...row,
    archived: archivedAt !== null,
    boards: row.boards ?? 0,
    units: row.units ?? 0,
    checks: row.checks ?? 0,
    holding: row.holding ?? 0,
    failing: row.failing ?? 0,
    doubtful: row.doubtful ?? 0,
  }));
}
