import { z } from "zod";
import { Refusal } from "../http/refusal";

const address = /^(?:[^<>\r\n]*<)?[^\s<>@,;]+@[^\s<>@,;]+\.[^\s<>@,;]+>?$/;
const oneAddress = z
  .string()
  .max(1000)
  .regex(address, "should be an address such as name@example.org or Name <name@example.org>");
const addresses = z.union([oneAddress.transform((one) => [one]), z.array(oneAddress).min(1).max(50)]);
const line = (max: number) =>
  z
    .string()
    .max(max)
    .regex(/^[^\r\n]*$/, "should be one line");

const attachment = z.object({
  filename: line(500).optional(),
  content: z.string({ error: "should be base64; a path is not supported by this stand-in" }).max(40_000_000),
  content_type: line(200).optional(),
  content_id: line(128).optional(),
});

const tagText = z
  .string()
  .max(256)
  .regex(/^[\w-]+$/, "should only hold ASCII letters, digits, underscores and dashes");

/** A message as POST /emails takes it. */
export const mailSchema = z.object({
  from: oneAddress,
  to: addresses,
  cc: addresses.optional(),
  bcc: addresses.optional(),
  reply_to: addresses.optional(),
  subject: line(2000).min(1),
  html: z.string().max(5_000_000).nullish(),
  text: z.string().max(5_000_000).nullish(),
  headers: z.record(z.string().regex(/^[\w-]+$/), line(10_000)).optional(),
  attachments: z.array(attachment).max(100).optional(),
  tags: z.array(z.object({ name: tagText, value: tagText })).optional(),
});

export type Mail = z.infer<typeof mailSchema>;

/** The refusal of the real service for a message that cannot be sent: a 422 that names the field. */
export function readMail(body: unknown): Mail {
  const parsed = mailSchema.safeParse(body);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    const field = issue?.path.join(".") ?? "";
    const given = typeof body === "object" && body !== null && field in body;
    if (!given && !field.includes(".")) throw new Refusal(422, "missing_required_field", `Missing \`${field}\` field.`);
    throw new Refusal(
      422,
      field === "from" ? "invalid_from_address" : "validation_error",
      `The \`${field}\` field ${issue?.message}.`,
    );
  }
  if (!parsed.data.html && !parsed.data.text)
    throw new Refusal(422, "missing_required_field", "Missing `html` or `text` field.");
  return parsed.data;
}
