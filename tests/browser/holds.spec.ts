import { checkOf, fails, send, must, stateOf, statesOf } from "../support/bench";
import { benchOn } from "./bench-page";
import { makeCard } from "./card";
import { expect, test } from "./journey";
import { linkIn, mailTo } from "./mailbox";

const HELD = [
  { title: "No short from +5 V to ground", stage: "continuity" as const, holdPoint: true },
  { title: "First power behind a limit", stage: "power-on" as const },
];
const REASON = "Measured on the bare board before; the limit was set too tight.";

test("An open hold point blocks what comes after it, and opens it when it passes", async ({ pageOf }) => {
  const card = await makeCard(HELD);
  const page = await pageOf(card.viewers.builder);
  const bench = benchOn(page);
  const later = await checkOf(card.unit, "First power behind a limit");
  await bench.goTo(`${card.bench}?check=${later.id}`);
  await expect(page.getByText("It waits. It cannot be recorded yet.")).toBeVisible();
  await expect(bench.conforms).toBeDisabled();
  await page.keyboard.press("Space");
  expect(await statesOf(card.unit)).toBe("untested waiting");

  await page.keyboard.press("ArrowLeft");
  await expect(bench.title("No short from +5 V to ground")).toBeVisible();
  await bench.conforms.click();
  await expect(bench.title("First power behind a limit")).toBeVisible();
  await expect(bench.conforms).toBeEnabled();
  await bench.conforms.click();
  await expect.poll(() => statesOf(card.unit)).toBe("passed passed");
});

test("A maintainer lifts a hold for one unit, and the reason stands on its traveler for ever", async ({ pageOf }) => {
  const card = await makeCard(HELD);
  const page = await pageOf(card.viewers.maintainer);
  await page.goto(card.traveler);
  await page.getByRole("button", { name: /No short from \+5 V to ground/ }).click();
  await page.getByRole("button", { name: "Lift the hold" }).click();
  const dialog = page.getByRole("dialog");
  await expect(dialog.getByRole("button", { name: "Lift the hold for this unit" })).toBeDisabled();
  await dialog.getByRole("textbox", { name: "Why this unit may go on" }).fill(REASON);
  await dialog.getByRole("button", { name: "Lift the hold for this unit" }).click();
  await expect.poll(() => statesOf(card.unit)).toBe("untested untested");
  const builder = await pageOf(card.viewers.builder);
  await builder.goto(card.traveler);
  await expect(builder.getByText(REASON).first()).toBeVisible();
});

test("A maintainer reopens a failed check; the builder's mail leads to it, and the builder repeats it", async ({
  pageOf,
}) => {
  const card = await makeCard([{ title: "Supply rail under load", limits: "4.75 … 5.25 V" }]);
  const check = await checkOf(card.unit, "Supply rail under load");
  await must(send(card.scopes.builder, check.id, { record: { typed: "4.61" } }));
  expect(await stateOf(card.unit, "Supply rail under load")).toBe("failed");

  const desk = await pageOf(card.viewers.maintainer);
  await desk.goto(card.traveler);
  await desk.getByRole("button", { name: /Supply rail under load/ }).click();
  await desk.getByRole("button", { name: "Reopen", exact: true }).click();
  const dialog = desk.getByRole("dialog");
  await dialog.getByRole("textbox").fill("Measure at TP4, not at the supply's terminals.");
  await dialog.getByRole("button", { name: "Reopen the check" }).click();
  await expect.poll(() => stateOf(card.unit, "Supply rail under load")).toBe("reopened");

  const mail = await mailTo(card.viewers.builder.email);
  expect(mail.subject).toContain("Supply rail under load");
  expect(mail.text).toContain("Measure at TP4, not at the supply's terminals.");
  const page = await pageOf(card.viewers.builder);
  await page.goto(linkIn(mail, check.id));
  await expect(page.getByRole("heading", { level: 2, name: "Supply rail under load" })).toBeVisible();
  const bench = benchOn(page);
  await bench.goTo(card.bench);
  await expect(page.getByText(/Measure at TP4/).first()).toBeVisible();
  await bench.reading.fill("5.02");
  await bench.recordButton.click();
  await expect.poll(() => stateOf(card.unit, "Supply rail under load")).toBe("passed");
});

test("A maintainer accepts a failed check with a reason, and takes the concession back", async ({ pageOf }) => {
  const card = await makeCard([{ title: "Front panel is straight", stage: "inspection" }]);
  const check = await checkOf(card.unit, "Front panel is straight");
  await must(send(card.scopes.builder, check.id, { record: fails, note: "1 mm off at the left." }));
  const page = await pageOf(card.viewers.maintainer);
  await page.goto(`${card.traveler}?check=${check.id}`);
  await page.getByRole("button", { name: "Concede" }).click();
  await page.getByRole("dialog").getByRole("textbox").fill("Nobody sees it behind the frame.");
  await page.getByRole("button", { name: "Grant the concession" }).click();
  await expect.poll(() => statesOf(card.unit)).toBe("conceded");
  await expect(page.getByText("Nobody sees it behind the frame.").first()).toBeVisible();
  await page.getByRole("button", { name: "Withdraw the concession" }).click();
  await page.getByRole("dialog").getByRole("textbox").fill("The frame is gone.");
  await page.getByRole("button", { name: "Withdraw it" }).click();
  await expect.poll(() => statesOf(card.unit)).toBe("failed");
});

test("Two builders who record the same check at once are both told, and both attempts stay", async ({ pageOf }) => {
  const card = await makeCard([{ title: "Look over the solder joints" }]);
  const [first, second] = [await pageOf(card.viewers.builder), await pageOf(card.viewers.maintainer)];
  await Promise.all([benchOn(first).goTo(card.bench), benchOn(second).goTo(card.bench)]);
  // Both look at the untested check; neither hears of the other before recording.
  const sent = first.waitForResponse(/\/attempts$/);
  await benchOn(first).conforms.click();
  await sent;
  await benchOn(second).conforms.click();
  await expect(second.getByText(/Bram recorded this check just before you/)).toBeVisible();
  await expect(first.getByText(/Mira recorded this check/)).toBeVisible();
  await expect(second.getByRole("region", { name: "Last attempts" }).getByRole("listitem")).toHaveCount(2);
});
