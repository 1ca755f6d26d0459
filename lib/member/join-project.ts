import { and, eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { digestSubscriptions, memberships, type Role } from "@/db/schema/projects";
import { nextDue } from "@/lib/digest/next-due";
import { recordEvent } from "@/lib/event/record-event";

type Joining = { projectId: string; userId: string; role: Role; zone: string };

/** Sunday at 18: the week is over and the next evening at the bench is near. */
const DEFAULT_DIGEST = { weekday: 7, hour: 18 };

/**
 * Makes a person a member, with a weekly digest that is on for collaborators from the start. Somebody who is a member
 * already keeps the role.
 */
export async function joinProject(tx: Transaction, { projectId, userId, role, zone }: Joining): Promise<void> {
  const joined = await tx
    .insert(memberships)
    .values({ projectId, userId, role })
    .onConflictDoNothing()
    .returning({ role: memberships.role });
  if (joined.length === 0) return;
  await subscribe(tx, { projectId, userId, role, zone });
  await recordEvent(tx, { projectId, actorId: userId, subjectId: userId }, "member.joined", { role });
}

/** Everybody's subscription, also of those for whom it is off at first. */
export async function subscribe(tx: Transaction, { projectId, userId, role, zone }: Joining): Promise<void> {
  const enabled = role === "collaborator";
  const nextDueAt = nextDue({ ...DEFAULT_DIGEST, zone }, new Date());
  const made = await tx
    .insert(digestSubscriptions)
    .values({ projectId, userId, enabled, ...DEFAULT_DIGEST, zone, nextDueAt })
    .onConflictDoNothing()
    .returning({ id: digestSubscriptions.id });
  if (made.length > 0) return;
  // Back after having left: as chosen then, but on or off as for anybody new, and nothing of the time between.
  const own = and(eq(digestSubscriptions.projectId, projectId), eq(digestSubscriptions.userId, userId));
  const [kept] = await tx.select().from(digestSubscriptions).where(own);
  if (kept)
    await tx
      .update(digestSubscriptions)
      .set({ enabled, nextDueAt: nextDue(kept, new Date()) })
      .where(own);
}
