import { z } from "zod";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { writeId } from "@/lib/form/write-id";
import { limit } from "@/lib/http/rate-limit";
import { sendMail } from "@/lib/mail/send";
import { writePreview } from "./load-preview";

export const sendPreviewInput = z.object({ project: z.string(), writeId });

/** Sends this week's e-mail to the maintainer who asks, and to nobody else. A repeat of the same press sends nothing. */
export async function sendPreview(
  scope: ProjectScope,
  input: z.output<typeof sendPreviewInput>,
): Promise<Answer<{ email: string }>> {
  const { viewer } = scope;
  const counted = await limit("previews", viewer.userId);
  if (!counted.ok) return counted;
  const written = await writePreview(scope);
  if (!written) return refuse("not-found", "There is no such project.");
  const { subject, html, text, inline } = written;
  const message = { to: viewer.email, subject: `Preview: ${subject}`, html, text, inline };
  const sent = await sendMail(message, { idempotencyKey: `preview-${input.writeId}`, timeoutMs: 10_000 });
  if (sent.ok) return ok({ email: viewer.email });
  return refuse("unavailable", "The mail service did not take the mail. Nothing was sent; try again in a moment.");
}
