import { and, eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { digestSubscriptions, memberships } from "@/db/schema/projects";
import { recordEvent } from "@/lib/event/record-event";

type Ending = { projectId: string; userId: string; actorId: string; name: string };

/** The person's records stay with their name; the way in and the digest end. */
export async function endMembership(tx: Transaction, { projectId, userId, actorId, name }: Ending): Promise<void> {
  await tx.delete(memberships).where(and(eq(memberships.projectId, projectId), eq(memberships.userId, userId)));
  await tx
    .update(digestSubscriptions)
    .set({ enabled: false })
    .where(and(eq(digestSubscriptions.projectId, projectId), eq(digestSubscriptions.userId, userId)));
  await recordEvent(tx, { projectId, actorId, subjectId: userId }, "member.removed", { name });
}
