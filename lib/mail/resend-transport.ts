import { setTimeout as pause } from "node:timers/promises";
import { Resend } from "resend";
import { env } from "@/lib/env";
import type { Message, SendOptions, Sent } from "./message";

/** A key that was used with another payload was sent then: what changed since (a newer open failure) is not worth a second mail. */
const SENT_BEFORE = "invalid_idempotent_request";
const RETRY_NAMES = new Set([
  "concurrent_idempotent_requests",
  "rate_limit_exceeded",
  "daily_quota_exceeded",
  "application_error",
  "internal_server_error",
]);

let client: Resend | undefined;

/** The service takes a few requests a second; who was too fast waits about so long. */
const TOO_FAST_MS = 700;

/** Waits its turn within the time limit when the service says that requests come too fast. */
export async function sendByResend(message: Message, { idempotencyKey, timeoutMs }: SendOptions): Promise<Sent> {
  const deadline = Date.now() + timeoutMs;
  for (;;) {
    const sent = await sendOnce(message, { idempotencyKey, timeoutMs: Math.max(1, deadline - Date.now()) });
    const isTooFast = !sent.ok && sent.name === "rate_limit_exceeded";
    if (!isTooFast || Date.now() + 2 * TOO_FAST_MS > deadline) return sent;
    await pause(TOO_FAST_MS * (0.5 + Math.random()));
  }
}

type Outcome = Extract<Sent, { ok: true }> | (Extract<Sent, { ok: false }> & { name: string });

async function sendOnce(message: Message, options: SendOptions): Promise<Outcome> {
  client ??= new Resend(env().RESEND_API_KEY, env().RESEND_BASE_URL ? { baseUrl: env().RESEND_BASE_URL } : undefined);
  const request = client.emails.send(
    {
      from: env().MAIL_FROM,
      to: message.to,
      subject: message.subject,
      html: message.html,
      text: message.text,
      headers: message.headers,
      attachments: message.inline?.map((picture) => ({
        content: picture.content,
        filename: picture.fileName,
        contentType: picture.mediaType,
        contentId: picture.contentId,
      })),
    },
    { idempotencyKey: options.idempotencyKey, signal: AbortSignal.timeout(options.timeoutMs) },
  );
  const { data, error } = await request;
  if (data) return { ok: true, id: data.id };
  if (error.name === SENT_BEFORE) return { ok: true, id: options.idempotencyKey };
  const status = error.statusCode ?? 500;
  const retry = RETRY_NAMES.has(error.name) || status >= 500 || status === 429 || status === 408;
  // A 422 that names another field than the recipient is a mistake of ours and says nothing of the address.
  const bounced = status === 422 && /`to`/.test(error.message);
  return { ok: false, retry, bounced, message: error.message, name: error.name };
}
