import { eq } from "drizzle-orm";
import { database } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import { checkOf, statesOf } from "../support/bench";
import { html, plainPng, scopeText } from "../support/hostile-files";
import { benchOn } from "./bench-page";
import { makeCard } from "./card";
import { expect, test } from "./journey";

const photo = async (name = "solder side.png") => ({ name, mimeType: "image/png", buffer: await plainPng() });

test("A builder walks a traveler with the thumb: statement, photo, reading, table, capture @phone", async ({
  pageOf,
}) => {
  const card = await makeCard();
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  await bench.goTo(card.bench);

  await expect(bench.title("Look over the solder joints")).toBeVisible();
  await expect(page.getByText("check 1 of 5")).toBeVisible();
  await expect(page.getByText("This is a hold point.")).toBeVisible();
  await bench.conforms.tap();

  await expect(bench.title("Photograph the solder side")).toBeVisible();
  await bench.conforms.tap();
  await expect(bench.record.getByRole("status").filter({ hasText: "photo" })).toBeVisible();
  await bench.choose("Take a photo", await photo());
  await expect(bench.record.getByText("1 of 1 photo taken")).toBeVisible();
  await bench.conforms.tap();

  await expect(bench.title("Supply rail under load")).toBeVisible();
  await bench.reading.tap();
  await bench.press(["6", "Decimal point"]);
  await expect(bench.record.getByText("does not conform")).toBeVisible();
  await bench.press(["Clear the reading", "5", "Decimal point", "0", "1"]);
  await expect(bench.reading).toHaveValue("5.01");
  await expect(bench.record.getByText("conforms", { exact: true })).toBeVisible();
  await bench.recordButton.tap();

  await expect(bench.title("Rails at both ends")).toBeVisible();
  await bench.record.getByRole("textbox", { name: "+5 V, near" }).fill("5.02");
  await bench.record.getByRole("button", { name: "Next cell" }).tap();
  await bench.record.getByRole("textbox", { name: "+5 V, far" }).fill("4.98");
  await bench.recordButton.first().tap();

  await expect(bench.title("Clock at the buffer")).toBeVisible();
  await bench.choose("Add a capture", { name: "clk.csv", mimeType: "text/csv", buffer: scopeText(200) });
  await expect(bench.record.getByText("Scope data")).toBeVisible();
  await bench.conforms.tap();

  await expect.poll(() => statesOf(card.unit)).toBe("passed passed passed passed passed");
  const evidence = await database().select().from(attachments).where(eq(attachments.projectId, card.id));
  expect(evidence.map(({ kind }) => kind).sort()).toEqual(["photo", "scope-data"]);
  expect(evidence.every(({ attemptId }) => attemptId !== null)).toBe(true);

  await page.goto(card.traveler);
  await page.getByRole("button", { name: /Photograph the solder side/ }).click();
  const picture = page.getByRole("complementary", { name: "Check" }).locator("img").first();
  await expect.poll(() => picture.evaluate((img: HTMLImageElement) => img.naturalWidth)).toBeGreaterThan(0);
});

test("A page that calls itself a photo is refused with its reason, and the check waits for a real one @phone", async ({
  pageOf,
}) => {
  const card = await makeCard([
    { title: "Photograph the solder side", kind: "photo", typed: { expects: "", minimum: "1" } },
  ]);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  await bench.choose("Take a photo", { name: "solder.jpg", mimeType: "image/jpeg", buffer: html });
  await expect(bench.record.getByText(/web page|HTML|not a picture/i)).toBeVisible();
  await expect(bench.record.getByText("0 of 1 photo taken")).toBeVisible();
  await bench.record.getByRole("button", { name: "Leave out solder.jpg" }).tap();
  await bench.choose("Take a photo", await photo());
  await expect(bench.record.getByText("1 of 1 photo taken")).toBeVisible();
  await bench.conforms.tap();
  await expect.poll(() => statesOf(card.unit)).toBe("passed");
  const kept = await database().select().from(attachments).where(eq(attachments.projectId, card.id));
  expect(kept.map(({ fileName }) => fileName)).toEqual(["solder side.png"]);
});

test("The whole traveler is walked by keys alone, as a foot pedal sends them", async ({ pageOf }) => {
  const card = await makeCard([
    { title: "Look over the solder joints", stage: "inspection" },
    { title: "Ground is one net", stage: "continuity" },
    { title: "Supply rail under load", limits: "4.75 … 5.25 V" },
  ]);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  await page.keyboard.press("Space");
  await expect(bench.title("Ground is one net")).toBeVisible();
  await page.keyboard.press("x");
  await expect(page.getByRole("dialog")).toBeVisible();
  await page.keyboard.type("12 Ω between TP1 and the shield.");
  await page.keyboard.press("Control+Enter");
  await expect(bench.title("Supply rail under load")).toBeVisible();
  await page.keyboard.type("4.7");
  await expect(bench.record.getByText("does not conform")).toBeVisible();
  await page.keyboard.type("9");
  await page.keyboard.press("Enter");
  await expect.poll(() => statesOf(card.unit)).toBe("passed failed passed");
  await page.keyboard.press("ArrowLeft");
  await page.keyboard.press("?");
  await expect(page.getByRole("dialog").getByText("does not conform")).toBeVisible();
});

test("A slip of the finger is taken back and stays on the traveler, struck through @phone", async ({ pageOf }) => {
  const card = await makeCard([{ title: "Look over the solder joints" }, { title: "Ground is one net" }]);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  await bench.conforms.tap();
  await expect.poll(() => statesOf(card.unit)).toBe("passed untested");
  await page.getByRole("button", { name: "Undo" }).tap();
  await expect.poll(() => statesOf(card.unit)).toBe("untested untested");
  const { id } = await checkOf(card.unit, "Look over the solder joints");
  await page.goto(`${card.traveler}?check=${id}`);
  await expect(page.getByText(/Voided by Bram.*slip of the finger/)).toBeVisible();
});

test("A collaborator looks on at the bench and has nothing to press", async ({ pageOf }) => {
  const card = await makeCard();
  const page = await pageOf(card.viewers.collaborator);
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  await expect(bench.title("Look over the solder joints")).toBeVisible();
  await expect(bench.conforms).toHaveCount(0);
  await expect(page.getByText("Builders and maintainers record.")).toBeVisible();
  await page.keyboard.press("Space");
  await expect(bench.title("Look over the solder joints")).toBeVisible();
  expect(await statesOf(card.unit)).toBe("untested waiting waiting waiting waiting");
});
