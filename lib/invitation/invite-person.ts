import { and, eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { lockOpenInvitationTo } from "@/db/queries/invitations";
import { users } from "@/db/schema/people";
import { invitations, memberships } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { tokenFor, tokenHash } from "@/lib/auth/token";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { limit } from "@/lib/http/rate-limit";
import { enqueue } from "@/lib/jobs/enqueue";
import type { InviteInput } from "./schema";

const DAY = 86_400_000;
export const INVITATION_DAYS = 14;
export const invitationExpiry = () => new Date(Date.now() + INVITATION_DAYS * DAY);

/** Invites a person to the project by mail. An expired invitation to the same address gives way to the new one. */
export async function invitePerson(scope: ProjectScope, input: InviteInput): Promise<Answer<{ id: string }>> {
  const { projectId, viewer } = scope;
  const counted = await limit("invitations", viewer.userId);
  if (!counted.ok) return counted;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "invite-person" }, async (tx) => {
    await rejectMember(tx, projectId, input.email);
    await makeRoom(tx, projectId, input.email);
    const id = crypto.randomUUID();
    const made = await tx
      .insert(invitations)
      .values({
        id,
        projectId,
        email: input.email,
        role: input.role,
        tokenHash: tokenHash(tokenFor("invitation", id)),
        expiresAt: invitationExpiry(),
        invitedBy: viewer.userId,
      })
      .onConflictDoNothing()
      .returning({ id: invitations.id });
    if (made.length === 0) rejectInvited(input.email);
    await enqueue(tx, "send-mail", { kind: "invitation", id });
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: id }, "invitation.sent", {
      role: input.role,
    });
    return { id };
  });
}

async function rejectMember(tx: Transaction, projectId: string, email: string): Promise<void> {
  const [member] = await tx
    .select({ role: memberships.role })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.projectId, projectId), eq(users.email, email)));
  if (member) {
    reject(
      "conflict",
      `${email} is already a ${member.role} of the project. Change the role in the table of members.`,
      {
        fields: { email: "This person is already a member." },
      },
    );
  }
}

async function makeRoom(tx: Transaction, projectId: string, email: string): Promise<void> {
  const open = await lockOpenInvitationTo(tx, projectId, email);
  if (!open) return;
  if (open.expiresAt > new Date()) rejectInvited(email);
  await tx.update(invitations).set({ withdrawnAt: new Date() }).where(eq(invitations.id, open.id));
}

function rejectInvited(email: string): never {
  reject("conflict", `${email} has an open invitation already. Send it again from the list, or withdraw it first.`, {
    fields: { email: "This address has an open invitation already." },
  });
}
