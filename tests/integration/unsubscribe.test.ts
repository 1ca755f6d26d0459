import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, it, vi } from "vitest";
import { digestSubscriptions } from "@/db/schema/projects";
import { POST } from "@/app/api/unsubscribe/[subscription]/[token]/route";
import { endSubscription, lookAtSubscription, restoreSubscription } from "@/lib/digest/end-subscription";
import { tokenFor } from "@/lib/auth/token";
import { must, refusal } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { disable, subscribe } from "../support/digest";
import { makeProject } from "../support/project";

// Nobody is signed in: a mail reader's post brings no cookie.
vi.mock("@/lib/auth/current-viewer", () => ({ currentViewer: async () => undefined }));

const db = useDatabase();

async function reader() {
  const project = await makeProject();
  const [subscriber] = await subscribe(project, 1);
  if (!subscriber) throw new Error("nobody subscribed");
  const link = { subscription: subscriber.subscriptionId, token: tokenFor("unsubscribe", subscriber.subscriptionId) };
  const isOn = async () =>
    one(await db.select().from(digestSubscriptions).where(eq(digestSubscriptions.id, link.subscription))).enabled;
  return { project, subscriber, link, isOn };
}

function post(link: { subscription: string; token: string }, body: BodyInit, headers: Record<string, string> = {}) {
  const request = new Request(`https://boardwake.example/api/unsubscribe/${link.subscription}/${link.token}`, {
    method: "POST",
    body,
    // As a mail service's server or another site's page would send it.
    headers: { origin: "https://mail.example", "sec-fetch-site": "cross-site", ...headers },
  });
  return POST(request, { params: Promise.resolve(link) });
}

describe("RFC 8058, one-click unsubscribe", () => {
  it("ends the digest by a form-encoded post without cookies", async () => {
    const { link, isOn } = await reader();
    const body = "List-Unsubscribe=One-Click";
    expect(Buffer.byteLength(body)).toBe(26);
    const answer = await post(link, body, { "content-type": "application/x-www-form-urlencoded" });
    expect(answer.status).toBe(200);
    expect(answer.redirected).toBe(false);
    expect(await isOn()).toBe(false);
  });

  it("ends it by a multipart post, and twice is as good as once", async () => {
    const { link, isOn } = await reader();
    const body = new FormData();
    body.set("List-Unsubscribe", "One-Click");
    expect((await post(link, body)).status).toBe(200);
    expect((await post(link, body)).status).toBe(200);
    expect(await isOn()).toBe(false);
  });

  it("gives one and the same answer to every wrong token, and changes nothing", async () => {
    const { link, isOn } = await reader();
    const wrong = [
      { ...link, token: tokenFor("unsubscribe", randomUUID()) },
      { ...link, token: "x" },
      { subscription: randomUUID(), token: link.token },
      { subscription: "1; drop table users", token: link.token },
      { ...link, token: tokenFor("invitation", link.subscription) },
    ];
    const answers = await Promise.all(wrong.map((one) => refusal(endSubscription(one))));
    expect(new Set(answers.map((one) => JSON.stringify(one))).size).toBe(1);
    expect((await post({ ...link, token: "x" }, "List-Unsubscribe=One-Click")).status).toBe(404);
    expect(await isOn()).toBe(true);
  });
});

describe("the page behind the link", () => {
  it("changes nothing by being opened, ends it by a press, and turns it on again", async () => {
    const { link, isOn } = await reader();
    expect(await lookAtSubscription(link)).toEqual({ state: "on", projectName: "Tide computer" });
    expect(await isOn()).toBe(true);
    await must(endSubscription(link));
    expect(await lookAtSubscription(link)).toEqual({ state: "off", projectName: "Tide computer" });
    await must(restoreSubscription(link));
    expect(await isOn()).toBe(true);
    const row = one(await db.select().from(digestSubscriptions).where(eq(digestSubscriptions.id, link.subscription)));
    expect(row.nextDueAt.getTime()).toBeGreaterThan(Date.now());
  });

  it("cannot bring it back to somebody who has left", async () => {
    const { link, subscriber } = await reader();
    await disable([subscriber]);
    expect(await lookAtSubscription(link)).toEqual({ state: "off", projectName: null });
    expect(await refusal(restoreSubscription(link))).toMatchObject({ code: "gone" });
  });
});
