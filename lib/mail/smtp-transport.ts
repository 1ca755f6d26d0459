import nodemailer, { type Transporter } from "nodemailer";
import { env } from "@/lib/env";
import type { Message, SendOptions, Sent } from "./message";

const pools = new Map<number, Transporter>();

function pool(timeoutMs: number): Transporter {
  const kept = pools.get(timeoutMs);
  if (kept) return kept;
  const made = nodemailer.createTransport({
    url: env().SMTP_URL,
    pool: true,
    maxConnections: 4,
    connectionTimeout: timeoutMs,
    greetingTimeout: timeoutMs,
    socketTimeout: timeoutMs,
  });
  pools.set(timeoutMs, made);
  return made;
}

/**
 * SMTP knows no idempotency key: the Message-ID is made from it, so that a mail that was taken just before a crash and is
 * sent again can be recognised as the same by mail stores and readers.
 */
export async function sendBySmtp(message: Message, options: SendOptions): Promise<Sent> {
  const host = new URL(env().APP_URL).hostname;
  try {
    const info = await pool(options.timeoutMs).sendMail({
      from: env().MAIL_FROM,
      to: message.to,
      subject: message.subject,
      html: message.html,
      text: message.text,
      messageId: `<${options.idempotencyKey}@${host}>`,
      headers: message.headers,
      attachments: message.inline?.map((picture) => ({
        cid: picture.contentId,
        filename: picture.fileName,
        contentType: picture.mediaType,
        content: picture.content,
      })),
    });
    return { ok: true, id: String(info.messageId) };
  } catch (error) {
    const code = error instanceof Error && "responseCode" in error ? Number(error.responseCode) : 0;
    const permanent = code >= 500 && code < 600;
    return {
      ok: false,
      retry: !permanent,
      bounced: permanent,
      message: error instanceof Error ? error.message : String(error),
    };
  }
}
