import { and, eq } from "drizzle-orm";
import { z } from "zod";
import { database } from "@/db/client";
import { digestSubscriptions, memberships, projects } from "@/db/schema/projects";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { sameToken, tokenFor } from "@/lib/auth/token";
import { nextDue } from "./next-due";

const WRONG =
  "This link does not belong to a weekly e-mail. Open the link from the mail once more: it may have been cut.";

export const unsubscribeInput = z.object({
  subscription: z.string().max(200),
  token: z.string().max(200),
});
type Link = z.output<typeof unsubscribeInput>;

/** Holds without asking the database, so that a wrong token learns nothing of which subscriptions there are. */
const isOurs = ({ subscription, token }: Link) =>
  z.uuid().safeParse(subscription).success && sameToken(token, tokenFor("unsubscribe", subscription));

/** Ends the weekly e-mail by the link that only its mails carry. Doing it twice, or after having left, is as good. */
export async function endSubscription(link: Link): Promise<Answer<{ enabled: false }>> {
  if (!isOurs(link)) return refuse("not-found", WRONG);
  await database()
    .update(digestSubscriptions)
    .set({ enabled: false })
    .where(eq(digestSubscriptions.id, link.subscription));
  return ok({ enabled: false });
}

/** Turns it on again with the same link, as it was set before. The next one is due in the future. */
export async function restoreSubscription(link: Link): Promise<Answer<{ enabled: true }>> {
  if (!isOurs(link)) return refuse("not-found", WRONG);
  const [row] = await findWithProject(link.subscription);
  if (!row) return refuse("gone", "You are not a member of the project any more, so there is no e-mail to turn on.");
  await database()
    .update(digestSubscriptions)
    .set({ enabled: true, nextDueAt: nextDue(row.subscription, new Date()) })
    .where(eq(digestSubscriptions.id, link.subscription));
  return ok({ enabled: true });
}

/** What the page behind the link shows; it changes nothing. */
export async function lookAtSubscription(
  link: Link,
): Promise<{ state: "unknown"; sentence: string } | { state: "on" | "off"; projectName: string | null }> {
  if (!isOurs(link)) return { state: "unknown", sentence: WRONG };
  const [row] = await findWithProject(link.subscription);
  if (!row) return { state: "off", projectName: null };
  return { state: row.subscription.enabled ? "on" : "off", projectName: row.name };
}

function findWithProject(id: string) {
  return database()
    .select({ subscription: digestSubscriptions, name: projects.name })
    .from(digestSubscriptions)
    .innerJoin(projects, eq(projects.id, digestSubscriptions.projectId))
    .innerJoin(
      memberships,
      and(eq(memberships.projectId, projects.id), eq(memberships.userId, digestSubscriptions.userId)),
    )
    .where(eq(digestSubscriptions.id, id));
}
