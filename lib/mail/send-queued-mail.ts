import { database } from "@/db/client";
import { noteBounce } from "@/db/queries/mails";
import { log } from "@/lib/http/log";
import type { JobPayload } from "@/lib/jobs/payloads";
import { mailFor } from "./mails";
import { sendMail } from "./send";

/**
 * Sends the mail of one job. Throws when the service did not take it, and the queue tries again later, with the job's
 * id as key so that a try whose answer was lost does not arrive twice. Stops for good when the address was refused.
 */
export async function sendQueuedMail(payload: JobPayload<"send-mail">, jobId: string): Promise<void> {
  const message = await mailFor(payload);
  if (!message) return log().info({ kind: payload.kind, id: payload.id }, "the mail has become pointless");
  const idempotencyKey = `${payload.kind}-${payload.id}-${jobId}`;
  const sent = await sendMail(message, { idempotencyKey });
  if (sent.ok) return;
  if (!sent.bounced) throw new Error(`The mail service did not take the mail: ${sent.message}`);
  log().warn({ kind: payload.kind, id: payload.id }, "the address was refused for good");
  await noteBounce(database(), message.to);
}
