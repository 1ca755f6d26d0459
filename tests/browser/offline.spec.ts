import { asc, eq } from "drizzle-orm";
import type { Page } from "@playwright/test";
import { database } from "@/db/client";
import { procedureChecks } from "@/db/schema/procedures";
import { attempts } from "@/db/schema/travelers";
import { statesOf } from "../support/bench";
import { benchOn } from "./bench-page";
import { makeCard } from "./card";
import { expect, test } from "./journey";

const CARD = [
  { title: "Look over the solder joints", stage: "inspection" as const },
  { title: "Ground is one net", stage: "continuity" as const },
  { title: "Supply rail under load", limits: "4.75 … 5.25 V" },
];

const arrivals = async (project: { id: string }) =>
  (
    await database()
      .select({ title: procedureChecks.title, record: attempts.record })
      .from(attempts)
      .innerJoin(procedureChecks, eq(procedureChecks.id, attempts.procedureCheckId))
      .where(eq(attempts.projectId, project.id))
      .orderBy(asc(attempts.arrival))
  ).map(({ title }) => title);

/** The device has kept the page and what it is made of. */
async function keptOffline(page: Page): Promise<void> {
  const isKept = async () => {
    const pages = await caches.open("boardwake-bench-pages-1");
    const files = await caches.open("boardwake-bench-static-1");
    const needed = performance.getEntriesByType("resource").filter(({ name }) => name.includes("/_next/static/"));
    const hasPage = (await pages.keys()).some(({ url }) => new URL(url).pathname === location.pathname);
    return hasPage && (await files.keys()).length >= new Set(needed.map(({ name }) => name)).size;
  };
  // Not waitForFunction: to it the promise of an answer is as good as the answer.
  await expect.poll(() => page.evaluate(isKept)).toBe(true);
}

test("Without network two are recorded and held on the device; they go out in order, once, when it is back @phone", async ({
  pageOf,
}) => {
  const card = await makeCard(CARD);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  await keptOffline(page);
  await page.context().setOffline(true);
  await bench.conforms.tap();
  await expect(bench.title("Ground is one net")).toBeVisible();
  await bench.conforms.tap();
  await expect(bench.held).toHaveText(/Held on this device \(2\)/);

  await page.reload();
  await expect(bench.title("Supply rail under load")).toBeVisible();
  await expect(bench.held).toHaveText(/Held on this device \(2\)/);
  await bench.reading.fill("4.9");
  expect(await arrivals(card)).toEqual([]);
  await bench.held.tap();
  await expect(page.getByRole("dialog").getByRole("listitem")).toHaveCount(2);
  await page.keyboard.press("Escape");

  await page.context().setOffline(false);
  await expect(bench.held).toBeHidden();
  await expect.poll(() => statesOf(card.unit)).toBe("passed passed untested");
  expect(await arrivals(card)).toEqual(["Look over the solder joints", "Ground is one net"]);
  await expect(bench.reading).toHaveValue("4.9");
});

test("While the server cannot reach its database the bench keeps what was recorded and typed, and sends it later", async ({
  pageOf,
}) => {
  const card = await makeCard(CARD);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  // Requests that the service worker carries pass by the test's own routes.
  await page.addInitScript(() => void Reflect.deleteProperty(Navigator.prototype, "serviceWorker"));
  await bench.goTo(card.bench);
  const away = { status: 503, contentType: "application/problem+json" };
  const body = JSON.stringify({ title: "Unavailable", status: 503, detail: "The database does not answer just now." });
  await page.route(/\/api\/projects\//, (route) => route.fulfill({ ...away, body }));
  await bench.conforms.click();
  await expect(bench.title("Ground is one net")).toBeVisible();
  await expect(bench.held).toHaveText(/Held on this device \(1\)/);
  await page.keyboard.press("n");
  await page.getByRole("dialog").getByRole("textbox").fill("Beeper on, probes at TP1 and TP9.");
  await page.getByRole("button", { name: "Keep the note" }).click();
  await expect(page.getByText("Beeper on, probes at TP1 and TP9.")).toBeVisible();

  // The sheet is opened and the button there before the server is back: then it may go out by itself as well.
  await bench.held.click();
  const tryNow = page.getByRole("button", { name: "Try now" });
  await expect(tryNow).toBeVisible();
  await page.unroute(/\/api\/projects\//);
  await tryNow.click({ timeout: 2000 }).catch(() => undefined);
  await expect.poll(() => statesOf(card.unit)).toBe("passed untested untested");
  await page.keyboard.press("Escape");
  await expect(page.getByText("Beeper on, probes at TP1 and TP9.")).toBeVisible();
});

test("An answer lost on the way is asked for again and recorded once", async ({ pageOf }) => {
  const card = await makeCard(CARD);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  // Requests that the service worker carries pass by the test's own routes.
  await page.addInitScript(() => void Reflect.deleteProperty(Navigator.prototype, "serviceWorker"));
  await bench.goTo(card.bench);
  let lost = 0;
  await page.route(
    /\/attempts$/,
    async (route) => {
      await route.fetch();
      lost += 1;
      await route.abort("connectionreset");
    },
    { times: 1 },
  );
  await bench.conforms.click();
  await expect.poll(() => lost).toBe(1);
  await expect(bench.held).toBeHidden();
  await page.reload();
  await expect(bench.held).toBeHidden();
  expect(await arrivals(card)).toEqual(["Look over the solder joints"]);
});
