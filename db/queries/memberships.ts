import { and, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { memberships, projects } from "@/db/schema/projects";

/** The project by its slug, only if the person is a member of it. */
export async function findMembership(db: Queryable, userId: string, slug: string) {
  const [row] = await db
    .select({
      projectId: projects.id,
      slug: projects.slug,
      projectName: projects.name,
      timeZone: projects.timeZone,
      decisionRule: projects.decisionRule,
      archivedAt: projects.archivedAt,
      role: memberships.role,
    })
    .from(memberships)
    .innerJoin(projects, eq(projects.id, memberships.projectId))
    .where(and(eq(memberships.userId, userId), eq(projects.slug, slug)))
    .limit(1);
  return row;
}
