import { statesOf } from "../support/bench";
import { awake, benchOn } from "./bench-page";
import { makeCard } from "./card";
import { expect, test } from "./journey";

/** The last of them waits for the first; the clock has nothing to do with either. */
const CARD = [
  { title: "PH7 to U6", stage: "continuity" as const, covers: { signals: ["PH7"] } },
  { title: "CLK to U3", stage: "continuity" as const, covers: { signals: ["CLK"] } },
  { title: "Counts through", stage: "function" as const, covers: { signals: ["PH[7:0]"] }, needs: ["PH7 to U6"] },
];

test("A fault is written down and mended by a wire: exactly what the wire touches is in doubt, and repeating it makes the rack green", async ({
  pageOf,
}) => {
  const card = await makeCard(CARD);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  for (const { title } of CARD) {
    await expect(bench.title(title)).toBeVisible();
    await bench.conforms.click();
  }
  await expect.poll(() => statesOf(card.unit)).toBe("passed passed passed");

  await page.goto(card.at("/faults/new?unit=TIM-01"));
  await awake(page);
  await page.getByRole("textbox", { name: "What is wrong" }).fill("Bit 7 hangs when the card is bent");
  await page.getByRole("button", { name: "Write it down" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Bit 7 hangs");
  await expect(page).toHaveURL(/\/faults\/1/);

  await page.goto(card.at("/units/TIM-01/reworks/new?fault=1"));
  await awake(page);
  await page.getByRole("textbox", { name: "What was done" }).fill("Wire from U6-12 to U9-3");
  await page.getByRole("textbox", { name: "From" }).fill("U6-12");
  await page.getByRole("textbox", { name: "To", exact: true }).fill("U9-3");
  await page.getByRole("combobox", { name: "Signals" }).fill("PH7");
  await page.keyboard.press("Tab");
  const save = page.getByRole("button", { name: "Record it and doubt 2 checks" });
  await expect(save).toBeVisible();
  for (const title of ["PH7 to U6", "Counts through"]) {
    await expect(page.getByRole("button", { name: `Spare “${title}”` })).toBeVisible();
  }
  await expect(page.getByRole("button", { name: "Spare “CLK to U3”" })).toHaveCount(0);
  await save.click();

  await expect.poll(() => statesOf(card.unit)).toBe("doubtful passed doubtful");
  await page.goto(card.at("/rack"));
  await expect(
    page
      .getByText(/2 in doubt/)
      .filter({ visible: true })
      .first(),
  ).toBeVisible();

  await bench.goTo(card.bench);
  await expect(bench.title("PH7 to U6")).toBeVisible();
  await bench.conforms.click();
  await expect.poll(() => statesOf(card.unit)).toBe("passed passed doubtful");
  await expect(bench.title("Counts through")).toBeVisible();
  await bench.conforms.click();
  await expect.poll(() => statesOf(card.unit)).toBe("passed passed passed");
  await page.goto(card.at("/rack"));
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expect(page.getByText(/in doubt/)).toHaveCount(0);
});
