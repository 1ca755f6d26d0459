import { and, eq, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { digestSubscriptions, memberships } from "@/db/schema/projects";
import { users } from "@/db/schema/people";
import { freshAddress, PASSWORD } from "./account";
import { checkOf, must, send } from "../support/bench";
import { one } from "../support/database";
import { makeCard } from "./card";
import { expect, test } from "./journey";
import { linkIn, mailsTo, mailTo } from "./mailbox";

const WEEK = [
  { title: "Look over the solder joints", stage: "inspection" as const },
  { title: "Supply rail under load", limits: "4.75 … 5.25 V" },
];

/** A card on which something passed and something failed this week. */
async function makeWeek() {
  const card = await makeCard(WEEK);
  const { builder } = card.scopes;
  const [passed, failed] = [
    await checkOf(card.unit, "Look over the solder joints"),
    await checkOf(card.unit, "Supply rail under load"),
  ];
  await must(send(builder, passed.id, { record: { conforms: true } }));
  await must(send(builder, failed.id, { record: { typed: "4.61" } }));
  await dateBack(card);
  return { ...card, failed };
}

test("A person invited by e-mail signs up, follows along, and the week's e-mail leads to the check that failed @desk", async ({
  pageOf,
  page,
}) => {
  const card = await makeWeek();
  const email = freshAddress("ines");
  const desk = await pageOf(card.viewers.maintainer);
  await desk.goto(card.at("/people"));
  await desk.getByLabel("E-mail address").fill(email);
  await desk.getByRole("button", { name: "Send the invitation" }).click();
  await expect(desk.getByText(`The invitation to ${email} is on its way.`)).toBeVisible();

  await page.goto(linkIn(await mailTo(email), "/invitation/"));
  await page.getByLabel("Name").fill("Ines Farrow");
  await page.getByLabel("Password", { exact: true }).fill(PASSWORD);
  await page.getByRole("button", { name: "Sign up and join" }).click();
  await expect(page).toHaveURL(new RegExp(`${card.slug}/rack$`));

  await makeDue(card, email);
  const digest = await mailTo(email, /^Tide computer:/);
  expect(digest.subject).toBe("Tide computer: 1 check passed, 1 did not conform");
  expect(digest.text).toContain("Supply rail under load");
  expect(digest.html).toContain("Supply rail under load");
  await page.goto(linkIn(digest, card.failed.id));
  await expect(page.getByRole("complementary", { name: "Check" }).getByText("4.61 V").first()).toBeVisible();
  expect((await mailsTo(email, /^Tide computer:/)).length).toBe(1);

  const header = digest.headers["list-unsubscribe"] ?? "";
  expect(digest.headers["list-unsubscribe-post"]).toBe("List-Unsubscribe=One-Click");
  const address = /<(https?:[^>]+)>/.exec(header)?.[1] ?? "";
  const answer = await fetch(address, {
    method: "POST",
    headers: { "content-type": "application/x-www-form-urlencoded" },
    body: "List-Unsubscribe=One-Click",
  });
  expect(answer.status).toBe(200);
  expect((await subscriptionOf(card, email)).enabled).toBe(false);
});

test("A maintainer looks at this week's e-mail before it goes out, and sends it to themselves @desk", async ({
  pageOf,
}) => {
  const card = await makeWeek();
  const page = await pageOf(card.viewers.maintainer);
  await page.goto(card.at("/digest"));
  await page.getByRole("button", { name: /send it to me/i }).click();
  const mail = await mailTo(card.viewers.maintainer.email, /^Preview: Tide computer/);
  expect(mail.text).toContain("Supply rail under load");
});

test("An invitation to another address cannot be taken by whoever is signed in @desk", async ({ pageOf }) => {
  const card = await makeCard(WEEK);
  const email = freshAddress("ines");
  const desk = await pageOf(card.viewers.maintainer);
  await desk.goto(card.at("/people"));
  await desk.getByLabel("E-mail address").fill(email);
  await desk.getByRole("button", { name: "Send the invitation" }).click();
  await desk.goto(linkIn(await mailTo(email), "/invitation/"));
  await expect(desk.getByText(email).first()).toBeVisible();
  await expect(desk.getByRole("button", { name: /^Join / })).toHaveCount(0);
});

async function subscriptionOf(project: { id: string }, email: string) {
  const user = one(await database().select().from(users).where(eq(users.email, email)));
  const own = and(eq(digestSubscriptions.projectId, project.id), eq(digestSubscriptions.userId, user.id));
  return one(await database().select().from(digestSubscriptions).where(own));
}

/** The subscriber's weekday and hour have come: joined a week ago, due just now, and the worker is told to look. */
async function makeDue(project: { id: string }, email: string): Promise<void> {
  const { id, userId } = await subscriptionOf(project, email);
  const weekAgo = new Date(Date.now() - 7 * 86_400_000);
  await database().update(memberships).set({ createdAt: weekAgo }).where(eq(memberships.userId, userId));
  const due = { nextDueAt: new Date(), createdAt: weekAgo };
  await database().update(digestSubscriptions).set(due).where(eq(digestSubscriptions.id, id));
  await database().execute(sql`select graphile_worker.add_job('find-due-digests', '{}'::json)`);
}

/** Two days ago: a digest tells what has settled. History is final, but for whoever says that this is no history. */
async function dateBack(project: { id: string }): Promise<void> {
  await database().transaction(async (tx) => {
    await tx.execute(sql`select set_config('boardwake.purge', 'on', true)`);
    await tx.execute(
      sql`update events set created_at = created_at - interval '2 days' where project_id = ${project.id}`,
    );
    await tx.execute(sql`
      update attempts set recorded_at = recorded_at - interval '2 days', performed_at = performed_at - interval '2 days'
      where project_id = ${project.id}`);
  });
}
