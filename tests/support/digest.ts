import { randomUUID } from "node:crypto";
import { eq, inArray } from "drizzle-orm";
import { z } from "zod";
import { database } from "@/db/client";
import { users } from "@/db/schema/people";
import { digestDeliveries, digestSubscriptions, memberships, type QuietWeek } from "@/db/schema/projects";

const service = () => process.env.FAKE_MAIL_SERVICE_URL ?? "";
const sink = () => process.env.FAKE_MAIL_SINK_URL ?? "";

export type Subscriber = { userId: string; subscriptionId: string; email: string };
type Given = { zone?: string; weekday?: number; hour?: number; quietWeek?: QuietWeek; dueAt?: Date; address?: string };

/** Collaborators whose digest has been due for an hour, unless said otherwise. */
export async function subscribe(project: { id: string }, count: number, given: Given = {}): Promise<Subscriber[]> {
  const db = database();
  const { zone = "UTC", weekday = 7, hour = 18, quietWeek = "line" } = given;
  const nextDueAt = given.dueAt ?? new Date(Date.now() - 3_600_000);
  const people = Array.from({ length: count }, (_, index) => ({
    id: randomUUID(),
    name: `Reader ${index + 1}`,
    email: given.address ?? `reader-${index + 1}.${randomUUID()}@example.org`,
    emailVerified: new Date(),
  }));
  await db.insert(users).values(people);
  await db
    .insert(memberships)
    .values(people.map(({ id }) => ({ projectId: project.id, userId: id, role: "collaborator" as const })));
  const rows = people.map(({ id }) => ({
    id: randomUUID(),
    projectId: project.id,
    userId: id,
    zone,
    weekday,
    hour,
    quietWeek,
    nextDueAt,
  }));
  await db.insert(digestSubscriptions).values(rows);
  return people.map(({ id, email }, index) => ({ userId: id, email, subscriptionId: rows[index]?.id ?? "" }));
}

export const deliveriesOf = (project: { id: string }) =>
  database().select().from(digestDeliveries).where(eq(digestDeliveries.projectId, project.id));

/** As if the wait before the next try, or the lease of a killed worker, were over. */
export const endWaits = (project: { id: string }) =>
  database()
    .update(digestDeliveries)
    .set({ nextTryAt: new Date(0) })
    .where(eq(digestDeliveries.projectId, project.id));

export const disable = (subscribers: readonly Subscriber[]) =>
  database()
    .delete(memberships)
    .where(
      inArray(
        memberships.userId,
        subscribers.map((one) => one.userId),
      ),
    );

const listed = z.array(z.object({ id: z.string(), to: z.array(z.string()) }));
const message = z.object({
  subject: z.string(),
  html: z.string(),
  text: z.string(),
  headers: z.record(z.string(), z.string()),
  links: z.array(z.string()),
  attachments: z.array(z.object({ filename: z.string(), contentType: z.string(), size: z.number() })),
});

const idsFor = async (email: string) =>
  listed.parse(await (await fetch(`${sink()}/api/messages?to=${encodeURIComponent(email)}`)).json());

/** How many mails each of them got, e.g. { 1: 60 } when everybody got one. */
export async function countMails(subscribers: readonly { email: string }[]): Promise<Record<number, number>> {
  const all = listed.parse(await (await fetch(`${sink()}/api/messages`)).json()).flatMap((one) => one.to);
  const counts: Record<number, number> = {};
  for (const { email } of subscribers) {
    const count = all.filter((to) => to === email).length;
    counts[count] = (counts[count] ?? 0) + 1;
  }
  return counts;
}

/** The one mail that arrived for the address. */
export async function mailTo(email: string) {
  const found = await idsFor(email);
  if (found.length !== 1) throw new Error(`${found.length} mails for ${email}`);
  return message.parse(await (await fetch(`${sink()}/api/messages/${found[0]?.id}`)).json());
}

/** Orders the mail service to fail: "mode=500&count=3". */
export async function orderFault(query: string): Promise<void> {
  const answer = await fetch(`${service()}/__fake/fail?${query}`, { method: "POST" });
  if (!answer.ok) throw new Error(await answer.text());
}

export const clearFaults = () => fetch(`${service()}/__fake/fail`, { method: "DELETE" });

/** Asks again and again until it is so; fails with what was last answered. */
export async function until<Answer>(ask: () => Promise<Answer>, isSo: (answer: Answer) => boolean, ms = 60_000) {
  const deadline = Date.now() + ms;
  for (;;) {
    const answer = await ask();
    if (isSo(answer)) return answer;
    if (Date.now() > deadline) throw new Error(`it did not come to be: ${JSON.stringify(answer)}`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}
