import { and, asc, count, eq, sql } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { users } from "@/db/schema/people";
import { digestSubscriptions, memberships, projects } from "@/db/schema/projects";

export function listMembers(db: Queryable, projectId: string) {
  return db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      role: memberships.role,
      since: memberships.createdAt,
      digest: digestSubscriptions.enabled,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(
      digestSubscriptions,
      and(eq(digestSubscriptions.projectId, memberships.projectId), eq(digestSubscriptions.userId, memberships.userId)),
    )
    .where(eq(memberships.projectId, projectId))
    .orderBy(sql`array_position(array['maintainer','builder','collaborator'], ${memberships.role})`, asc(users.name));
}

/**
 * Locks who is in the project: changes of two maintainers at once come one after the other, so that both cannot take
 * the last one's role away.
 */
export async function lockMembers(tx: Transaction, projectId: string): Promise<void> {
  await tx.select({ id: projects.id }).from(projects).where(eq(projects.id, projectId)).for("no key update");
}

export async function findMember(db: Queryable, projectId: string, userId: string) {
  const [row] = await db
    .select({ role: memberships.role, name: users.name, email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.projectId, projectId), eq(memberships.userId, userId)));
  return row;
}

export async function countMaintainers(db: Queryable, projectId: string): Promise<number> {
  const [row] = await db
    .select({ n: count() })
    .from(memberships)
    .where(and(eq(memberships.projectId, projectId), eq(memberships.role, "maintainer")));
  return row?.n ?? 0;
}
