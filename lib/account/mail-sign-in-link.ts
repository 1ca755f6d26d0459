import { setTimeout as pause } from "node:timers/promises";
import { createElement } from "react";
import { SignInLinkMail, signInLinkSubject } from "@/emails/SignInLinkMail";
import { log } from "@/lib/http/log";
import { renderMail } from "@/lib/mail/render-mail";
import { sendMail } from "@/lib/mail/send";
import { LINK_MINUTES } from "./link-minutes";

/** Waits between the tries. The link lives for minutes only, so this mail does not go through the queue. */
const PAUSES_MS = [0, 2_000, 8_000];

/** Mails the link; the same key for every try, so that a slow answer does not send it twice. */
export async function mailSignInLink(to: string, link: string, idempotencyKey: string): Promise<void> {
  const mail = await renderMail(createElement(SignInLinkMail, { link, minutesValid: LINK_MINUTES }));
  for (const wait of PAUSES_MS) {
    await pause(wait);
    const sent = await sendMail({ to, subject: signInLinkSubject, ...mail }, { idempotencyKey });
    if (sent.ok) return;
    log().warn({ reason: sent.message }, "the sign-in link could not be mailed");
    if (!sent.retry) return;
  }
}
