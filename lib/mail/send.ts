import { env } from "@/lib/env";
import { log } from "@/lib/http/log";
import type { Message, Sent } from "./message";
import { sendByResend } from "./resend-transport";
import { sendBySmtp } from "./smtp-transport";

const TIMEOUT_MS = 15_000;
const lineBreaks = /[\r\n]+/g;

/** Nobody writes headers through a name or a title. */
function guarded(message: Message): Message {
  const headers = Object.entries(message.headers ?? {}).map(([name, value]) => [name, value.replace(lineBreaks, " ")]);
  return {
    ...message,
    subject: message.subject.replace(lineBreaks, " ").slice(0, 200),
    headers: Object.fromEntries(headers),
  };
}

/** Sends one mail through the service that MAIL_TRANSPORT names. Never throws; never takes longer than its timeout. */
export async function sendMail(
  message: Message,
  options: { idempotencyKey: string; timeoutMs?: number },
): Promise<Sent> {
  const transport = env().MAIL_TRANSPORT === "smtp" ? sendBySmtp : sendByResend;
  const timeoutMs = options.timeoutMs ?? TIMEOUT_MS;
  if (/[\r\n]/.test(message.to))
    return { ok: false, retry: false, bounced: true, message: "The address has a line break." };
  try {
    return await transport(guarded(message), { idempotencyKey: options.idempotencyKey, timeoutMs });
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    log().warn({ reason }, "the mail service did not answer");
    return { ok: false, retry: true, bounced: false, message: reason };
  }
}
