import AxeBuilder from "@axe-core/playwright";
import { eq } from "drizzle-orm";
import type { Page } from "@playwright/test";
import { database } from "@/db/client";
import { users } from "@/db/schema/people";
import { DEMO_ACCOUNTS } from "@/db/seed/accounts";
import { one } from "../support/database";
import { signInAs } from "../support/session";
import { expect, test } from "./journey";

const demo = (path: string) => `/projects/tide-computer${path}`;

/** Every kind of page, on the demo's data: only looked at. */
const OPEN = ["/", "/safety", "/sign-in", "/sign-up", "/forgot", "/check-email", "/nothing-here"];
const OWN = [
  "/settings",
  "/settings/password",
  "/settings/instruments",
  "/settings/digest",
  "/projects",
  "/projects/new",
];
const MACHINE = [
  ...[
    "/rack",
    "/rack?as=table",
    "/boards",
    "/boards/TIM",
    "/boards/TIM/procedure",
    "/units/TIM-01",
    "/units/TIM-01/print",
  ],
  ...[
    "/wiring",
    "/wiring?connector=CON.J1",
    "/wiring/nets",
    "/wiring/nets?net=BUSY_N",
    "/wiring/findings",
    "/wiring/signals",
    "/wiring/families",
    "/wiring/power",
    "/wiring/take",
  ],
  ...[
    "/parts",
    "/parts/boards",
    "/parts/boards/CON",
    "/parts/blocks",
    "/parts/logic",
    "/parts/logic?part=283",
    "/parts/delay",
  ],
  ...[
    "/faults",
    "/faults/1",
    "/faults/new?unit=CON-01",
    "/units/CON-01/reworks",
    "/units/CON-01/reworks/new",
    "/units/CON-01/reworks/print",
    "/units/CON-01/probing",
    "/boards/CON/netlists",
    "/order",
    "/order/boards",
    "/order/checks",
    "/order/sessions",
  ],
  ...["/bench", "/bench/TIM-01", "/captures", "/log", "/log/new", "/people", "/settings", "/search?q=clock", "/digest"],
];
const THEMES = ["light", "dark"] as const;
const LEVELS = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"];

async function asMaintainer(page: Page): Promise<void> {
  const [account] = DEMO_ACCOUNTS;
  const user = one(
    await database()
      .select()
      .from(users)
      .where(eq(users.email, account?.email ?? "")),
  );
  await signInAs(page.context(), { userId: user.id });
}

/** Colours that are still on their way from one theme to the other would be judged halfway. */
const atRest = (page: Page) =>
  page.evaluate(async () => {
    const moving = document
      .getAnimations()
      .filter((one) => Number.isFinite(Number(one.effect?.getComputedTiming().endTime)));
    await Promise.allSettled(moving.map((one) => one.finished));
  });

async function violations(page: Page): Promise<string[]> {
  await atRest(page);
  // The one frame there is shows a mail without scripts, which axe could not enter.
  const axe = new AxeBuilder({ page }).setLegacyMode(true).withTags(LEVELS);
  const { violations: found } = await axe.analyze();
  return found.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id} ${target.join(" ")}: ${failureSummary}`),
  );
}

const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

for (const path of [...OPEN, ...OWN, ...MACHINE.map(demo)]) {
  test(`${path} has no fault that axe knows, in light and in dark`, async ({ page }, { project }) => {
    if (!OPEN.includes(path)) await asMaintainer(page);
    await page.emulateMedia({ reducedMotion: "reduce", colorScheme: "light" });
    await page.goto(path);
    await expect(page.getByRole("heading", { level: 1 })).toHaveCount(1);
    expect(await page.title()).toMatch(/.Boardwake|Boardwake./);
    // At phone width the layout differs, the colours do not.
    for (const colorScheme of project.name === "phone" ? (["light"] as const) : THEMES) {
      await page.emulateMedia({ colorScheme });
      expect(await violations(page), colorScheme).toEqual([]);
    }
    expect(await sideways(page), "pixels to scroll sideways").toBe(0);
  });
}

test("No page has to be scrolled sideways at 320 pixels @phone", async ({ page }) => {
  test.slow();
  await page.setViewportSize({ width: 320, height: 640 });
  const look = async (paths: string[]) => {
    for (const path of paths) {
      await page.goto(path);
      await expect(page.getByRole("heading", { level: 1 })).toHaveCount(1);
      expect.soft(await sideways(page), path).toBe(0);
    }
  };
  await look(OPEN);
  await asMaintainer(page);
  await look([...OWN, ...MACHINE.filter((path) => !path.endsWith("/print")).map(demo)]);
});
