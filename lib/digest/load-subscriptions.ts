import { and, asc, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { digestSubscriptions, memberships, projects, type QuietWeek } from "@/db/schema/projects";
import type { OwnScope } from "@/lib/access/scope";

export type SubscriptionLine = {
  project: string;
  projectName: string;
  enabled: boolean;
  weekday: number;
  hour: number;
  zone: string;
  quietWeek: QuietWeek;
  nextDueAt: Date | null;
};

/** One's own digests, one line for each project that one is a member of. */
export async function loadSubscriptions(scope: OwnScope): Promise<SubscriptionLine[]> {
  const { userId, timeZone } = scope.viewer;
  const rows = await database()
    .select({ slug: projects.slug, name: projects.name, subscription: digestSubscriptions })
    .from(memberships)
    .innerJoin(projects, eq(projects.id, memberships.projectId))
    .leftJoin(
      digestSubscriptions,
      and(eq(digestSubscriptions.projectId, memberships.projectId), eq(digestSubscriptions.userId, memberships.userId)),
    )
    .where(and(eq(memberships.userId, userId), isNull(projects.archivedAt)))
    .orderBy(asc(projects.name));
  return rows.map(({ slug, name, subscription }) => ({
    project: slug,
    projectName: name,
    enabled: subscription?.enabled ?? false,
    weekday: subscription?.weekday ?? 7,
    hour: subscription?.hour ?? 18,
    zone: subscription?.zone ?? timeZone,
    quietWeek: subscription?.quietWeek ?? "line",
    nextDueAt: subscription?.enabled ? subscription.nextDueAt : null,
  }));
}
