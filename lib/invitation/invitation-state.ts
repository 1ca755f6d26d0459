import type { Refusal } from "@/lib/actions/answer";

export type InvitationFailure = "unknown" | "expired" | "used" | "withdrawn" | "archived";

type Dates = { acceptedAt: Date | null; withdrawnAt: Date | null; expiresAt: Date };

/** Why an invitation does not work any more, or "open". */
export function invitationState(invitation: Dates, now = new Date()): "open" | "used" | "withdrawn" | "expired" {
  if (invitation.acceptedAt) return "used";
  if (invitation.withdrawnAt) return "withdrawn";
  return invitation.expiresAt <= now ? "expired" : "open";
}

/** One sentence for what happened and one for what to do. */
export const INVITATION_REFUSALS: Record<InvitationFailure, Refusal> = {
  unknown: {
    code: "not-found",
    message: "There is no such invitation. Open the link from the mail once more: it may have been cut in two.",
  },
  expired: { code: "gone", message: "This invitation has expired. Ask the person who invited you to send it again." },
  used: { code: "gone", message: "This invitation was used already. If that was you, sign in and open the project." },
  withdrawn: {
    code: "gone",
    message: "This invitation was withdrawn. Ask a maintainer of the project whether that was meant.",
  },
  archived: {
    code: "conflict",
    message: "The project of this invitation is archived. Ask a maintainer to restore it; the invitation keeps.",
  },
};

export function wrongAddress(invited: string, signedIn: string): Refusal {
  return {
    code: "forbidden",
    message: `This invitation is for ${invited}, and you are signed in as ${signedIn}. Sign out and come back as ${invited}, or ask for an invitation to ${signedIn}.`,
  };
}
