import { database } from "@/db/client";
import { findInvitationByToken } from "@/db/queries/invitations";
import { findMembership } from "@/db/queries/memberships";
import { findUserByEmail } from "@/db/queries/users";
import type { Role } from "@/db/schema/projects";
import type { Viewer } from "@/lib/access/scope";
import { tokenHash } from "@/lib/auth/token";
import { INVITATION_REFUSALS, invitationState, wrongAddress } from "./invitation-state";

export type InvitationDetails = {
  email: string;
  role: Role;
  projectName: string;
  inviter: string | null;
  expiresAt: Date;
  zone: string;
};

export type InvitationView =
  /** It does not work; `open` is the project's path for who is in it already. */
  | { step: "failed"; sentence: string; open?: { name: string; path: string } }
  | { step: "wrong-address"; sentence: string; details: InvitationDetails }
  /** Signed in as the person invited: one press. */
  | { step: "accept"; details: InvitationDetails }
  /** The address has an account: sign in and come back. */
  | { step: "sign-in"; details: InvitationDetails }
  /** No account yet: name and password, nothing to confirm since the link came by mail. */
  | { step: "sign-up"; details: InvitationDetails };

/** What the page of an invitation shows to whoever opened its link. */
export async function lookAtInvitation(viewer: Viewer | undefined, token: string): Promise<InvitationView> {
  const row = await findInvitationByToken(database(), tokenHash(token));
  if (!row) return { step: "failed", sentence: INVITATION_REFUSALS.unknown.message };
  const { invitation, project, inviter } = row;
  const state = invitationState(invitation);
  if (state !== "open") {
    const member = viewer && (await findMembership(database(), viewer.userId, project.slug));
    const open = member ? { name: project.name, path: `/projects/${project.slug}` } : undefined;
    return { step: "failed", sentence: INVITATION_REFUSALS[state].message, ...(open ? { open } : {}) };
  }
  if (project.archivedAt) return { step: "failed", sentence: INVITATION_REFUSALS.archived.message };
  const { email, role, expiresAt } = invitation;
  const details = { email, role, projectName: project.name, inviter, expiresAt, zone: project.timeZone };
  if (viewer && viewer.email !== email) {
    return { step: "wrong-address", sentence: wrongAddress(email, viewer.email).message, details };
  }
  if (viewer) return { step: "accept", details };
  const account = await findUserByEmail(database(), email);
  return { step: account?.emailVerified ? "sign-in" : "sign-up", details };
}
