import { z } from "zod";
import { email, personName } from "@/lib/account/schema";
import { PASSWORD_MAX } from "@/lib/account/password-rules";
import { timeZone } from "@/lib/form/time-zone";
import { writeId } from "@/lib/form/write-id";

export const role = z.enum(["maintainer", "builder", "collaborator"], { message: "Choose what the person may do." });

export const inviteInput = z.object({ project: z.string(), writeId, email, role });
export type InviteInput = z.output<typeof inviteInput>;
export type InviteTyped = z.input<typeof inviteInput>;

/** For resending and withdrawing. */
export const changeInvitationInput = z.object({
  project: z.string(),
  writeId,
  invitation: z.uuid({ message: "Name the invitation." }),
});
export type ChangeInvitationInput = z.output<typeof changeInvitationInput>;

const token = z
  .string({ message: "The link is not complete." })
  .min(20, "The link is not complete.")
  .max(200, "The link is not complete.");

export const acceptInput = z.object({ writeId, token });
export type AcceptInput = z.output<typeof acceptInput>;

/** The address comes from the invitation, so the password is weighed against it by the use case. */
export const signUpByInvitationInput = z.object({
  writeId,
  token,
  name: personName,
  password: z
    .string({ message: "Choose a password." })
    .max(PASSWORD_MAX * 4, `Use at most ${PASSWORD_MAX} characters.`),
  timeZone,
});
export type SignUpByInvitationInput = z.output<typeof signUpByInvitationInput>;
export type SignUpByInvitationTyped = z.input<typeof signUpByInvitationInput>;
