import { createElement } from "react";
import { database } from "@/db/client";
import { findInvitationToMail } from "@/db/queries/mails";
import { InvitationMail, invitationSubject } from "@/emails/InvitationMail";
import { tokenFor } from "@/lib/auth/token";
import { appLink } from "./app-link";
import type { Message } from "./message";
import { renderMail } from "./render-mail";
import { writeMoment } from "./write-day";

/** The mail of an invitation; undefined once it is accepted, withdrawn or expired, or its project archived. */
export async function invitationMail(id: string): Promise<Message | undefined> {
  const row = await findInvitationToMail(database(), id);
  if (!row) return undefined;
  const { project } = row;
  const mail = createElement(InvitationMail, {
    projectName: project.name,
    projectSummary: project.summary,
    invitedBy: row.inviter ?? "A maintainer",
    role: row.role,
    link: appLink(`/invitation/${tokenFor("invitation", id)}`),
    validUntil: `${writeMoment(row.expiresAt, project.timeZone)} (${project.timeZone})`,
  });
  return { to: row.email, subject: invitationSubject(project.name), ...(await renderMail(mail)) };
}
