import { and, asc, desc, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { users } from "@/db/schema/people";
import { digestDeliveries, digestSubscriptions, memberships } from "@/db/schema/projects";

type InProject = { projectId: string };
const RECENT = 60;

/** Every member with the state of their digest. */
export async function findSubscribers(db: Queryable, { projectId }: InProject) {
  return db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      role: memberships.role,
      verifiedAt: users.emailVerified,
      bouncedAt: users.mailBouncedAt,
      enabled: digestSubscriptions.enabled,
      weekday: digestSubscriptions.weekday,
      hour: digestSubscriptions.hour,
      zone: digestSubscriptions.zone,
      nextDueAt: digestSubscriptions.nextDueAt,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(
      digestSubscriptions,
      and(eq(digestSubscriptions.projectId, memberships.projectId), eq(digestSubscriptions.userId, memberships.userId)),
    )
    .where(eq(memberships.projectId, projectId))
    .orderBy(asc(users.name));
}

/** The last digests, the newest first. */
export async function findRecentDeliveries(db: Queryable, { projectId }: InProject) {
  return db
    .select({
      id: digestDeliveries.id,
      name: users.name,
      email: users.email,
      dueAt: digestDeliveries.dueAt,
      state: digestDeliveries.state,
      tries: digestDeliveries.tries,
      error: digestDeliveries.lastError,
      sentAt: digestDeliveries.sentAt,
    })
    .from(digestDeliveries)
    .innerJoin(digestSubscriptions, eq(digestSubscriptions.id, digestDeliveries.subscriptionId))
    .innerJoin(users, eq(users.id, digestSubscriptions.userId))
    .where(eq(digestDeliveries.projectId, projectId))
    .orderBy(desc(digestDeliveries.dueAt), asc(users.name))
    .limit(RECENT);
}
