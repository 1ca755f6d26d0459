import type { Page } from "@playwright/test";
import { withTwoDrivers } from "../support/wired-project";
import { awake } from "./bench-page";
import { expect, test } from "./journey";

const at = (project: { slug: string }, path: string) => `/projects/${project.slug}${path}`;

/** What a spreadsheet puts on the clipboard: signal, role, family and loads of the 60 pins from a3 to b30. */
function sixtyRows(): string {
  const known: Record<number, string> = {
    0: "AUX0\tpush-pull output\tHC\t0",
    7: "PH6\tpush-pull output\tHC\t0",
    8: "PH7\tpush-pull output\tLS\t0",
  };
  return Array.from({ length: 60 }, (_, row) => known[row] ?? `AUX${row}\tpassive\t\t0`).join("\r\n") + "\r\n";
}

const grid = (page: Page) => page.getByRole("grid");
const cell = (page: Page, name: RegExp) => grid(page).getByRole("row", { name }).getByRole("gridcell");

/** From wherever one is, Tab until it is there: no pointer is used. */
async function tabTo(page: Page, isThere: () => Promise<boolean>): Promise<void> {
  for (let step = 0; step < 120; step += 1) {
    if (await isThere()) return;
    await page.keyboard.press("Tab");
  }
  throw new Error("Tab does not get there");
}

const hasFocus = (page: Page, name: RegExp) => () =>
  page
    .locator(":focus")
    .evaluateAll((found) => found.map((one) => one.getAttribute("aria-label") ?? one.textContent ?? ""))
    .then(([label]) => label !== undefined && name.test(label));

test("By keyboard alone: sixty rows are pasted from a spreadsheet, two findings mended, one accepted, and the rack says so @desk", async ({
  pageOf,
}) => {
  const project = await withTwoDrivers();
  const page = await pageOf(project.viewers.maintainer);
  await page.context().grantPermissions(["clipboard-read", "clipboard-write"]);
  await page.goto(at(project, "/wiring?connector=TIM.J1"));
  await awake(page);
  await page.evaluate((text) => navigator.clipboard.writeText(text), sixtyRows());

  await tabTo(page, () => page.locator(":focus").evaluateAll(([one]) => one?.getAttribute("role") === "gridcell"));
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("Control+v");
  await expect(page.getByRole("button", { name: /^Save \d+ pins$/ })).toBeVisible();
  await expect(page.getByText(/2 must be mended/)).toBeVisible();

  await page.keyboard.press("Control+z");
  await expect(page.getByRole("button", { name: "All saved" })).toBeVisible();
  await page.keyboard.press("Control+Shift+z");
  await page.keyboard.press("Control+s");
  await expect(page.getByRole("button", { name: "All saved" })).toBeVisible();
  await page.goto(at(project, "/rack"));
  await expect(page.getByText(/2 findings in the wiring must be mended/)).toBeVisible();

  await page.goto(at(project, "/wiring?connector=TIM.J1"));
  await awake(page);
  for (const left of [1, 0]) {
    await tabTo(page, hasFocus(page, /^Do this: /));
    await page.keyboard.press("Enter");
    await expect(page.getByText(left === 0 ? /must be mended/ : new RegExp(`${left} must be mended`))).toHaveCount(
      left,
    );
  }
  await page.keyboard.press("Control+s");
  await expect(page.getByRole("button", { name: "All saved" })).toBeVisible();

  await page.goto(at(project, "/wiring/findings"));
  await awake(page);
  const before = await page.getByRole("button", { name: /^Accept “/ }).count();
  await tabTo(page, hasFocus(page, /^Accept “/));
  await page.keyboard.press("Enter");
  const dialog = page.getByRole("dialog");
  await dialog.getByRole("textbox", { name: /Why it may stay/ }).focus();
  await page.keyboard.type("Spare lines for the next card.");
  await tabTo(page, hasFocus(page, /^Accept the finding$/));
  await page.keyboard.press("Enter");
  await expect(page.getByText("Spare lines for the next card.").first()).toBeVisible();
  await expect(page.getByRole("button", { name: /^Accept “/ })).toHaveCount(before - 1);

  await page.goto(at(project, "/rack"));
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expect(page.getByText(/must be mended/)).toHaveCount(0);
});

test("A typed bus range over eight pins fills D7 to D0, and one of another length changes nothing @desk", async ({
  pageOf,
}) => {
  const project = await withTwoDrivers();
  const page = await pageOf(project.viewers.builder);
  await page.goto(at(project, "/wiring?connector=CON.J1"));
  await awake(page);
  await tabTo(page, () => page.locator(":focus").evaluateAll(([one]) => one?.getAttribute("role") === "gridcell"));
  for (let down = 0; down < 11; down += 1) await page.keyboard.press("ArrowDown");
  for (let more = 0; more < 7; more += 1) await page.keyboard.press("Shift+ArrowDown");
  await page.keyboard.type("D[6:0]");
  await page.keyboard.press("Control+Enter");
  await expect(page.getByText(/7 .*8|8 .*7/).first()).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(page.getByRole("button", { name: "All saved" })).toBeVisible();
  await page.keyboard.type("D[7:0]");
  await page.keyboard.press("Control+Enter");
  await expect(page.getByRole("button", { name: "Save 8 pins" })).toBeVisible();
  await expect(cell(page, /a12/).filter({ hasText: "D7" })).toBeVisible();
  await expect(cell(page, /a19/).filter({ hasText: "D0" })).toBeVisible();
  await page.reload();
  await awake(page);
  await expect(page.getByRole("button", { name: "Save 8 pins" })).toBeVisible();
});

test("A file with five bad rows names each with its line, and takes nothing until one says so @desk", async ({
  pageOf,
}) => {
  const project = await withTwoDrivers();
  const before = await project.versionOf("TIM.J1");
  const page = await pageOf(project.viewers.builder);
  const lines = [
    "Pin;Signal;Role;Family;Loads;Pull-up",
    "a3;AUX1;passive;;;",
    "a3;AUX2;passive;;;",
    "z9;AUX3;passive;;;",
    "a5;AUX4;amplifier;;;",
    "a6;AUX5;input;XYZ;1;",
    "a7;AUX6;open-drain output;HC;0;4k7",
    "a8;AUX7;input;HC;1;four",
  ];
  await page.goto(at(project, "/wiring/take?connector=TIM.J1"));
  await awake(page);
  const file = { name: "pins.csv", mimeType: "text/csv", buffer: Buffer.from(lines.join("\r\n"), "latin1") };
  await page.locator("input[type=file]").setInputFiles(file);
  await expect(page.getByRole("heading", { name: "5 rows cannot be taken" })).toBeVisible();
  for (const line of [3, 4, 5, 6, 8]) await expect(page.getByText(`line ${line}`, { exact: true })).toBeVisible();
  const take = page.getByRole("button", { name: /^Take \d+ change/ });
  await expect(take).toBeDisabled();
  expect(await project.versionOf("TIM.J1")).toEqual(before);

  await page.getByRole("checkbox", { name: /good rows without the 5 rows/ }).press("Space");
  await expect(take).toBeEnabled();
  await take.press("Enter");
  await expect.poll(async () => (await project.versionOf("TIM.J1")).version).toBeGreaterThan(before.version);
});

test("At phone width the pins are a list to read, with what each net meets, and nothing scrolls sideways @phone", async ({
  pageOf,
}) => {
  const project = await withTwoDrivers();
  const page = await pageOf(project.viewers.collaborator);
  await page.goto(at(project, "/wiring?connector=TIM.J1"));
  await awake(page);
  await expect(page.getByText("PH6").first()).toBeVisible();
  await expect(page.getByText(/Two push-pull outputs drive PH6/).first()).toBeVisible();
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390);
});
