import { database } from "@/db/client";
import { slotOccupancies, slots } from "@/db/schema/boards";
import { one } from "../support/database";
import { makeUnit } from "../support/project";
import { awake } from "./bench-page";
import { makeCard } from "./card";
import { expect, test } from "./journey";

/** Two cards in a rack of three slots. */
async function makeRack() {
  const card = await makeCard();
  const second = await makeUnit(card.scopes.maintainer, card.board, "TIM-02");
  for (const [index, unit] of [card.unit, second, undefined].entries()) {
    const row = { projectId: card.id, position: index + 1, boardId: card.board.id };
    const slot = one(await database().insert(slots).values(row).returning());
    if (unit) await database().insert(slotOccupancies).values({ slotId: slot.id, unitId: unit.id });
  }
  return card;
}

test("Arrows walk the slots of the rack, Enter opens the unit, t shows the same as a table @desk", async ({
  pageOf,
}) => {
  const card = await makeRack();
  const page = await pageOf(card.viewers.builder);
  await page.goto(card.at("/rack"));
  await awake(page);
  const drawing = page.getByRole("table", { name: /Slots from the top/ });
  await drawing.getByRole("link", { name: /TIM-01/ }).focus();
  await page.keyboard.press("ArrowDown");
  await expect(drawing.getByRole("link", { name: /TIM-02/ })).toBeFocused();
  await page.keyboard.press("End");
  await expect(drawing.getByRole("link", { name: /empty slot/ })).toBeFocused();
  await page.keyboard.press("t");
  await expect(
    page.getByRole("rowheader").or(page.getByRole("row")).filter({ hasText: "TIM-02" }).first(),
  ).toBeVisible();
  await expect(page).toHaveURL(/as=table/);
  await page.keyboard.press("t");
  await drawing.getByRole("link", { name: /TIM-01/ }).focus();
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/units\/TIM-01/);
});

test("The slash key searches the project, and Enter goes to the check found @desk", async ({ pageOf }) => {
  const card = await makeCard();
  const page = await pageOf(card.viewers.collaborator);
  await page.goto(card.at("/log"));
  await awake(page);
  await page.keyboard.press("/");
  const sheet = page.getByRole("dialog", { name: "Search the project" });
  await sheet.getByRole("searchbox").fill("solder joints");
  await expect(sheet.getByRole("link", { name: /Look over the solder joints/ })).toBeVisible();
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/units\/TIM-01\?check=/);
});

test("The colours one chooses stay chosen on the next visit", async ({ pageOf }) => {
  const card = await makeCard();
  const page = await pageOf(card.viewers.builder);
  await page.goto(card.at("/rack"));
  await awake(page);
  await page.getByRole("button", { name: "Colours" }).click();
  await page.getByRole("menuitemradio", { name: "Dark" }).click();
  const ground = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
  await expect(page.locator("html")).toHaveAttribute("data-theme", "dark");
  const dark = await ground();
  await page.reload();
  await expect(page.locator("html")).toHaveAttribute("data-theme", "dark");
  expect(await ground()).toBe(dark);
});

test("What is not there says so, with a way on, and answers 404 @desk", async ({ pageOf }) => {
  const card = await makeCard();
  const page = await pageOf(card.viewers.builder);
  for (const address of ["/nothing-here", card.at("/units/XXX-99"), "/projects/no-such-project/rack"]) {
    const answer = await page.goto(address);
    expect(answer?.status(), address).toBe(404);
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    await expect(page.getByRole("link", { name: "Go to the projects" })).toBeVisible();
  }
});

test("A log entry is written with a picture; a missing title is told at its field and nothing typed is lost @desk", async ({
  pageOf,
}) => {
  const card = await makeCard();
  const page = await pageOf(card.viewers.builder);
  await page.goto(card.at("/log/new"));
  await awake(page);
  const title = page.getByRole("textbox", { name: "Title" });
  const text = page.getByRole("textbox", { name: /Text/ });
  await text.fill("The **timebase** counts.");
  await page
    .getByRole("button", { name: /^(Write|Save|Publish|Put)/ })
    .first()
    .click();
  await expect(page.getByText("Give the entry a title.")).toBeVisible();
  await expect(text).toHaveValue("The **timebase** counts.");
  await title.fill("First count");
  await page
    .getByRole("button", { name: /^(Write|Save|Publish|Put)/ })
    .first()
    .click();
  await expect(page.getByRole("heading", { name: "First count" })).toBeVisible();
  await expect(page.locator("strong", { hasText: "timebase" })).toBeVisible();
});
