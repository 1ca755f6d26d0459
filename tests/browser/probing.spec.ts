import type { Page } from "@playwright/test";
import { SIX_NETS } from "../support/probing";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { awake } from "./bench-page";
import { expect, test } from "./journey";

/** 2,000 nets of three pins, of which the first six are those that are probed. */
const BIG = [
  SIX_NETS,
  ...Array.from({ length: 1994 }, (_, at) => ["J3", "U2", "U3"].map((part) => `N${at},${part},${at + 1}`).join("\n")),
].join("\n");

const PINS: Record<string, string> = { "J2-1": "2", "J2-2": "1", "U1-5": "lost" };
const wire = (name: string) => PINS[name] ?? name.slice(name.indexOf("-") + 1);

test("A netlist of 2,000 nets is taken, six of its signals are probed by keyboard, and the lost pin becomes a fault @desk", async ({
  pageOf,
}) => {
  const project = await makeProject<"maintainer" | "builder">({ roles: ["maintainer", "builder"] });
  const board = await makeBoard(project, "CON", [{ title: "No opens, no shorts", stage: "continuity" }]);
  await makeUnit(project.scopes.maintainer, board, "CON-01");
  const page = await pageOf(project.viewers.builder);
  const home = `/projects/${project.slug}`;

  await page.goto(`${home}/boards/CON/netlists`);
  await awake(page);
  const file = { name: "con.csv", mimeType: "text/csv", buffer: Buffer.from(BIG) };
  await page.locator("input[type=file]").setInputFiles(file);
  await expect(page.getByText("2,000")).toBeVisible();
  await page.getByRole("button", { name: "Keep as a new version" }).click();
  await expect(page.getByText(/Rev A, netlist 1/)).toBeVisible();

  await page.goto(`${home}/units/CON-01/probing`);
  await awake(page);
  await page.getByText("Some signals").click();
  const signals = page.getByRole("combobox", { name: "Add a signal" });
  const chosen = page.getByRole("list", { name: "Signals of the round" });
  for (const signal of ["A", "B", "C", "D", "E", "F"]) {
    // The field empties itself after a choice; what is typed in that moment is typed again.
    await expect(async () => {
      await signals.fill(signal);
      await page.getByRole("option", { name: signal, exact: true }).click({ timeout: 2000 });
      await expect(chosen.getByText(signal, { exact: true })).toBeVisible({ timeout: 2000 });
    }).toPass();
  }
  await page.getByRole("button", { name: /^Start with \d+ probes$/ }).click();
  await page.waitForURL(/\/probe\//);
  await awake(page);

  await probeByKeyboard(page);
  await page.getByRole("link", { name: "See what it comes to" }).click();
  await awake(page);
  const more = page.getByRole("button", { name: /^Probe (it|them)$/ });
  await expect(page.getByRole("heading", { name: "What it comes to" })).toBeVisible();
  if (await more.isVisible()) {
    await more.click();
    await page.waitForURL(/\/probe\//);
    await awake(page);
    await probeByKeyboard(page);
    await page.getByRole("link", { name: "See what it comes to" }).click();
    await awake(page);
  }
  await expect(page.getByRole("heading", { name: /crossed/ })).toContainText("A / B");
  const open = page.getByRole("listitem").filter({ has: page.getByRole("heading", { name: /^open/ }) });
  await expect(open).toContainText("U1-5");

  await open.getByRole("link", { name: "Make a fault" }).click();
  await awake(page);
  await expect(page.getByRole("textbox", { name: /Title|What is wrong/ }).first()).toHaveValue("E is open");
  await page.getByRole("button", { name: "Write it down" }).click();
  await page.waitForURL(/\/faults\/\d+$/);
  await expect(page.getByRole("heading", { level: 1 })).toContainText("E is open");
});

/** What stands on the screen is answered as the wires really run, until every pair has its answer. */
async function probeByKeyboard(page: Page) {
  const done = page.getByText("Every pair here has its answer.");
  for (let guard = 0; guard < 200 && !(await done.isVisible()); guard += 1) {
    const pair = page.getByRole("region", { name: /^Probe \d+$/ });
    const name = await pair.getAttribute("aria-label");
    const [a = "", b = ""] = await pair.locator("h2 > span.block.break-words").allTextContents();
    await page.keyboard.press(wire(a) === wire(b) ? "Space" : "x");
    await expect(async () => {
      const isNext = (await pair.getAttribute("aria-label")) !== name;
      expect(isNext || (await done.isVisible())).toBe(true);
    }).toPass();
  }
  await expect(page.getByText(/on this device/)).toHaveCount(0);
}
