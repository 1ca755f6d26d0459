import { expect } from "@playwright/test";
import { z } from "zod";

const sink = process.env["FAKE_MAIL_SINK_URL"] ?? "http://localhost:4313";

const listed = z.array(z.object({ id: z.string(), subject: z.string() }));
const message = z.object({
  id: z.string(),
  subject: z.string(),
  text: z.string(),
  html: z.string().nullable(),
  links: z.array(z.string()),
  headers: z.record(z.string(), z.string()),
});
export type Mail = z.infer<typeof message>;

async function ask(path: string): Promise<unknown> {
  return (await fetch(`${sink}${path}`)).json();
}

/** Every message to the address whose subject fits, newest first. */
export async function mailsTo(address: string, subject = /./): Promise<Mail[]> {
  const all = listed.parse(await ask(`/api/messages?to=${encodeURIComponent(address)}`));
  const fitting = all.filter((one) => subject.test(one.subject));
  return Promise.all(fitting.map(async ({ id }) => message.parse(await ask(`/api/messages/${id}`))));
}

/** The newest message to the address whose subject fits; waits until the worker has sent it. */
export async function mailTo(address: string, subject = /./): Promise<Mail> {
  const arrived: { mail?: Mail } = {};
  await expect
    .poll(async () => Boolean((arrived.mail = (await mailsTo(address, subject))[0])), {
      message: `a mail to ${address}`,
      timeout: 20_000,
    })
    .toBe(true);
  if (!arrived.mail) throw new Error("the mail is gone again");
  return arrived.mail;
}

/** The one link of the message that contains the words. */
export function linkIn({ links, subject }: Mail, words: string): string {
  const found = links.find((link) => link.includes(words));
  if (!found) throw new Error(`“${subject}” has no link with ${words}: ${links.join(" ")}`);
  return found;
}
