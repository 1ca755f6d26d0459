import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { lockInvitationByToken } from "@/db/queries/invitations";
import { invitations, projects } from "@/db/schema/projects";
import type { OwnScope } from "@/lib/access/scope";
import { reject, RefusalError, type Answer } from "@/lib/actions/answer";
import { tokenHash } from "@/lib/auth/token";
import { change } from "@/lib/event/change";
import { joinProject } from "@/lib/member/join-project";
import { INVITATION_REFUSALS, invitationState, wrongAddress } from "./invitation-state";
import type { AcceptInput } from "./schema";

/** Joins the project as the person who is signed in. */
export async function acceptInvitation(scope: OwnScope, input: AcceptInput): Promise<Answer<{ slug: string }>> {
  const { userId, email, timeZone } = scope.viewer;
  return change({ writeId: input.writeId, userId, action: "accept-invitation" }, async (tx) => {
    const invitation = await lockWorkingInvitation(tx, input.token);
    if (invitation.email !== email) throw new RefusalError(wrongAddress(invitation.email, email));
    return joinByInvitation(tx, invitation, { userId, timeZone });
  });
}

/** The invitation, locked until the transaction ends, or the sentence why it does not work. */
export async function lockWorkingInvitation(tx: Transaction, token: string) {
  const invitation = await lockInvitationByToken(tx, tokenHash(token));
  if (!invitation) throw new RefusalError(INVITATION_REFUSALS.unknown);
  const state = invitationState(invitation);
  if (state !== "open") throw new RefusalError(INVITATION_REFUSALS[state]);
  return invitation;
}

/** Uses the invitation up: membership, digest, event. */
export async function joinByInvitation(
  tx: Transaction,
  invitation: typeof invitations.$inferSelect,
  person: { userId: string; timeZone: string },
): Promise<{ slug: string }> {
  const { projectId, role, id } = invitation;
  const [project] = await tx.select().from(projects).where(eq(projects.id, projectId));
  if (!project) return reject("not-found", INVITATION_REFUSALS.unknown.message);
  if (project.archivedAt) throw new RefusalError(INVITATION_REFUSALS.archived);
  await joinProject(tx, { projectId, userId: person.userId, role, zone: person.timeZone });
  await tx.update(invitations).set({ acceptedAt: new Date(), acceptedBy: person.userId }).where(eq(invitations.id, id));
  return { slug: project.slug };
}
