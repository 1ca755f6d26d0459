import { and, asc, eq, isNull } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { users } from "@/db/schema/people";
import { invitations, projects } from "@/db/schema/projects";

/** The invitation behind a link: whoever holds the link may read it, whatever became of it. */
export async function findInvitationByToken(db: Queryable, tokenHash: string) {
  const [row] = await db
    .select({ invitation: invitations, project: projects, inviter: users.name })
    .from(invitations)
    .innerJoin(projects, eq(projects.id, invitations.projectId))
    .leftJoin(users, eq(users.id, invitations.invitedBy))
    .where(eq(invitations.tokenHash, tokenHash))
    .limit(1);
  return row;
}

/** The same row, locked: two people who press at once come one after the other. */
export async function lockInvitationByToken(tx: Transaction, tokenHash: string) {
  const [row] = await tx.select().from(invitations).where(eq(invitations.tokenHash, tokenHash)).for("update");
  return row;
}

const isOpen = and(isNull(invitations.acceptedAt), isNull(invitations.withdrawnAt));

/** An open invitation of this project, expired or not, locked. */
export async function lockOpenInvitation(tx: Transaction, projectId: string, id: string) {
  const [row] = await tx
    .select()
    .from(invitations)
    .where(and(eq(invitations.projectId, projectId), eq(invitations.id, id), isOpen))
    .for("update");
  return row;
}

export async function lockOpenInvitationTo(tx: Transaction, projectId: string, email: string) {
  const [row] = await tx
    .select()
    .from(invitations)
    .where(and(eq(invitations.projectId, projectId), eq(invitations.email, email), isOpen))
    .for("update");
  return row;
}

export function listOpenInvitations(db: Queryable, projectId: string) {
  return db
    .select({
      id: invitations.id,
      email: invitations.email,
      role: invitations.role,
      expiresAt: invitations.expiresAt,
      createdAt: invitations.createdAt,
      inviter: users.name,
    })
    .from(invitations)
    .leftJoin(users, eq(users.id, invitations.invitedBy))
    .where(and(eq(invitations.projectId, projectId), isOpen))
    .orderBy(asc(invitations.email));
}
