import { createElement } from "react";
import { database } from "@/db/client";
import { findOpenAccountToken } from "@/db/queries/mails";
import { ConfirmAddressMail, confirmAddressSubject } from "@/emails/ConfirmAddressMail";
import { ResetPasswordMail, resetPasswordSubject } from "@/emails/ResetPasswordMail";
import { tokenFor } from "@/lib/auth/token";
import { appLink } from "./app-link";
import type { Message } from "./message";
import { renderMail } from "./render-mail";

const HOUR = 3_600_000;

/** The mail that confirms an address or sets a new password; undefined once the link is used, replaced or expired. */
export async function accountMail(id: string): Promise<Message | undefined> {
  const row = await findOpenAccountToken(database(), id);
  if (!row) return undefined;
  const { token, email } = row;
  const name = row.name ?? email;
  const secret = tokenFor(token.purpose, id);
  const hoursValid = Math.round((token.expiresAt.getTime() - token.createdAt.getTime()) / HOUR);
  if (token.purpose === "confirm-address") {
    const link = appLink(`/confirm/${secret}`);
    const mail = createElement(ConfirmAddressMail, { name, link, hoursValid });
    return { to: email, subject: confirmAddressSubject, ...(await renderMail(mail)) };
  }
  const mail = createElement(ResetPasswordMail, { name, link: appLink(`/reset/${secret}`), hoursValid });
  return { to: email, subject: resetPasswordSubject, ...(await renderMail(mail)) };
}
