import { database } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import type { Role } from "@/db/schema/projects";
import { checkOf, must, send, statesOf } from "../support/bench";
import { one } from "../support/database";
import { makeProject } from "../support/project";
import { makeCard } from "./card";
import { expect, test } from "./journey";

const CARD = [
  { title: "Look over the solder joints", stage: "inspection" as const },
  { title: "Parts stand the right way round", stage: "inspection" as const },
  { title: "Pull-up at RESET", stage: "continuity" as const, limits: "4.2 … 5.2 kΩ" },
];

test("A maintainer writes the next version: limits as people write them, a new order by keys, and moves a unit over @desk", async ({
  pageOf,
}) => {
  const card = await makeCard(CARD);
  for (const title of ["Look over the solder joints", "Parts stand the right way round"]) {
    await must(send(card.scopes.builder, (await checkOf(card.unit, title)).id, { record: { conforms: true } }));
  }
  const page = await pageOf(card.viewers.maintainer);
  await page.goto(card.at("/boards/TIM/procedure"));
  await page.getByRole("button", { name: "Begin the draft" }).click();
  await expect(page.getByRole("heading", { level: 1, name: /draft of version 2/ })).toBeVisible();

  await page.getByRole("button", { name: "Change Pull-up at RESET" }).click();
  const dialog = page.getByRole("dialog");
  const limits = dialog.getByRole("textbox", { name: "Limits" });
  await limits.fill("between four and five");
  await dialog.getByRole("button", { name: "Save the check" }).click();
  await expect(limits).toHaveAttribute("aria-invalid", "true");
  await expect(limits).toHaveValue("between four and five");
  await limits.fill("4k7 ± 5 %");
  await dialog.getByRole("button", { name: "Save the check" }).click();
  await expect(dialog).toBeHidden();
  await expect(page.getByText(/4\.7\skΩ ± 5\s%/).first()).toBeVisible();

  const rows = page.getByRole("grid", { name: "Checks of the stage Inspection, in order" }).getByRole("row");
  await rows.first().focus();
  for (const key of ["ArrowDown", "ArrowRight"]) await page.keyboard.press(key);
  await expect(page.getByRole("button", { name: "Move Parts stand the right way round" })).toBeFocused();
  for (const key of ["Enter", "ArrowUp", "ArrowUp", "Enter"]) await page.keyboard.press(key);
  await expect(rows.first()).toContainText("Parts stand the right way round");

  await page.getByRole("button", { name: "Issue it" }).click();
  await page.getByRole("dialog").getByLabel("Note").fill("Tighter pull-up.");
  await page.getByRole("dialog").getByRole("button", { name: "Issue version 2" }).click();
  await expect(page.getByRole("link", { name: "Version 2" })).toBeVisible();
  expect(await statesOf(card.unit)).toBe("passed passed untested");

  await page.getByRole("button", { name: "Move over" }).click();
  const move = page.getByRole("dialog");
  await expect(move.getByText("Pull-up at RESET")).toBeVisible();
  await move.getByRole("button", { name: "Move TIM-01 over" }).click();
  await expect(page.getByText("TIM-01 follows version 2 now.")).toBeVisible();
  await page.goto(card.traveler);
  await expect(page.getByText(/procedure version 2/i).first()).toBeVisible();
  expect(await statesOf(card.unit)).toBe("passed passed untested");
});

test("A starter is taken over, changed and issued; the unit that waited for it gets its traveler @desk", async ({
  pageOf,
}) => {
  const project = await makeProject<Role>({ roles: ["maintainer", "builder", "collaborator"] });
  const board = one(
    await database().insert(boards).values({ projectId: project.id, code: "SUP", name: "Supply entry" }).returning(),
  );
  const revision = one(await database().insert(revisions).values({ boardId: board.id, letter: "A" }).returning());
  const ids = { projectId: project.id, boardId: board.id, revisionId: revision.id };
  const unit = one(
    await database()
      .insert(units)
      .values({ ...ids, serial: "SUP-01" })
      .returning(),
  );
  const page = await pageOf(project.viewers.maintainer);
  await page.goto(`/projects/${project.slug}/boards/SUP/procedure`);
  await page.getByRole("radio", { name: /supply/i }).click({ force: true });
  await page.getByRole("button", { name: "Begin the draft" }).click();
  await expect(page.getByRole("heading", { level: 1, name: /draft of version 1/ })).toBeVisible();
  for (const stage of ["Inspection", "Continuity", "Power-on", "Function", "Integration"]) {
    await expect(page.getByRole("heading", { level: 2, name: stage })).toBeVisible();
  }
  await page.getByRole("button", { name: "Issue it" }).click();
  await expect(page.getByRole("dialog").getByText(/SUP-01 gets it as the traveler at once/)).toBeVisible();
  await page.getByRole("dialog").getByRole("button", { name: "Issue version 1" }).click();
  await expect(page.getByText(/1 unit has it as the traveler/)).toBeVisible();
  expect((await statesOf(unit)).split(" ").length).toBeGreaterThan(10);
});
