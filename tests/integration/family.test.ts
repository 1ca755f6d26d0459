import { describe, expect, it } from "vitest";
import { loadFamilies } from "@/lib/family/load-families";
import { removeFamily } from "@/lib/family/remove-family";
import { saveFamily } from "@/lib/family/save-family";
import { saveFamilyInput } from "@/lib/family/schema";
import { must, refusal } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { SHEET, type DataSheet } from "../support/data-sheet";
import { makeWiredProject, withTwoDrivers, type WiredProject } from "../support/wired-project";

useDatabase();

type Given = { name?: string; familyId?: string; version?: number; typed?: Partial<DataSheet> };

function save(project: WiredProject, { typed, ...given }: Given = {}) {
  const head = { familyId: "", version: 0, name: "HCX", technology: "CMOS", source: "Maker B, HC data book, p. 12" };
  const input = { ...project.write(), ...head, ...given, typed: { ...SHEET, ...typed } };
  return saveFamily(project.scopes.builder, saveFamilyInput.parse(input));
}

describe("the figures of a data sheet", () => {
  it("are typed as the sheet prints them and kept as they are, signs of direction left out", async () => {
    const project = await makeWiredProject();
    await must(save(project));
    expect(one((await loadFamilies(project.scopes.builder)).own).family).toMatchObject({
      name: "HCX",
      vohMin: 3.84,
      iohA: 0.004,
      iihA: 1e-6,
      inputPf: 3.5,
      tpdTypicalS: 9e-9,
      inputMaxVolts: null,
      source: "Maker B, HC data book, p. 12",
    });
  });

  it("under a name of the built-in table stand for it, in whatever spelling", async () => {
    const project = await withTwoDrivers();
    const before = await project.findings("two-push-pull");
    await must(save(project, { name: "74HC" }));
    const { own, builtIn } = await loadFamilies(project.scopes.builder);
    expect(one(own)).toMatchObject({ replaces: "HC", pins: 4 });
    expect(builtIn.find(({ family }) => family.name === "HC")).toMatchObject({ replacedBy: "74HC", pins: 0 });
    expect(before).toHaveLength(1);
  });

  it("are kept once a family", async () => {
    const project = await makeWiredProject();
    await must(save(project, { name: "HC" }));
    expect((await refusal(save(project, { name: "74hc" }))).fields).toMatchObject({
      name: expect.stringContaining("name the same family"),
    });
  });

  it("change the findings at once, and so does taking them away", async () => {
    const project = await withTwoDrivers();
    const levels = async () => (await project.findings()).filter(({ rule }) => rule.startsWith("levels"));
    expect(await levels()).toEqual([]);
    const { id } = await must(save(project, { name: "HC", typed: { vohMin: "2.4 V" } }));
    expect((await levels()).length).toBeGreaterThan(0);
    await must(removeFamily(project.scopes.builder, { ...project.write(), familyId: id, version: 1 }));
    expect(await levels()).toEqual([]);
  });

  it("an edit of a stale version is refused with what stands there now", async () => {
    const project = await makeWiredProject();
    const { id } = await must(save(project));
    await must(save(project, { familyId: id, version: 1, typed: { vohMin: "3.9 V" } }));
    expect(await refusal(save(project, { familyId: id, version: 1 }))).toMatchObject({
      code: "conflict",
      details: { current: { figures: { vohMin: 3.9 }, version: 2 } },
    });
  });

  it("of another project are not found", async () => {
    const [project, other] = [await makeWiredProject(), await makeWiredProject()];
    const { id } = await must(save(project));
    const take = removeFamily(other.scopes.builder, { ...other.write(), familyId: id, version: 1 });
    expect(await refusal(take)).toMatchObject({ code: "not-found" });
  });
});
