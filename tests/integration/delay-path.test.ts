import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import type { ProjectScope } from "@/lib/access/scope";
import { archiveDelayPath, restoreDelayPath } from "@/lib/delay-path/archive-delay-path";
import { loadDelayPaths } from "@/lib/delay-path/load-delay-paths";
import { saveDelayPath } from "@/lib/delay-path/save-delay-path";
import { saveDelayPathInput, type SaveDelayPathTyped } from "@/lib/delay-path/schema";
import { windowLimits } from "@/lib/delay-path/window-limits";
import { workOut } from "@/lib/delay-path/work-out";
import { offerToCheck } from "@/lib/offer/offer-to-check";
import { offerToCheckInput } from "@/lib/offer/schema";
import { loadProcedure } from "@/lib/procedure/load-procedure";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject } from "../support/project";

useDatabase();

const step = (part: string, count: string, figures: { minS?: string; typicalS?: string; maxS?: string } = {}) => ({
  ...{ part, family: "HC", name: "", count, minS: "", typicalS: "", maxS: "" },
  ...figures,
});

const PATH: SaveDelayPathTyped["path"] = {
  measure: "A0 rising to C7, at 50 %",
  steps: [step("86", "1"), step("08", "8"), step("32", "8", { maxS: "15 ns" })],
  unknownMinShare: "25 %",
  unknownMaxShare: "",
  derating: null,
  clock: { clockToOutputMaxS: "30 ns", setupS: "15 ns", skewS: "2 ns", holdS: "", clockToOutputMinS: "" },
};

const keep = (scope: ProjectScope, given: Partial<SaveDelayPathTyped> = {}) =>
  saveDelayPath(
    scope,
    saveDelayPathInput.parse({
      project: scope.slug,
      writeId: randomUUID(),
      id: "",
      version: 0,
      name: "Ripple carry",
      board: "SUM",
      path: PATH,
      ...given,
    }),
  );

async function summing() {
  const project = await makeProject();
  const expects = { expects: "", windowOf: "", window: "" };
  const check = { title: "Carry delay", stage: "function" as const, kind: "capture", typed: expects };
  await makeBoard(project, "SUM", [{ title: "Joints", stage: "inspection" }, check]);
  return { project, scope: project.scopes.builder };
}

test("a path comes back as it was typed, and is worked out with the figures of its parts", async () => {
  const { scope } = await summing();
  await must(keep(scope));
  const view = await loadDelayPaths(scope);
  const [line] = view.paths;
  expect(line).toMatchObject({ name: "Ripple carry", board: "SUM", version: 1, archived: false });
  expect(line?.typed).toEqual(PATH);
  const worked = line && workOut(line.path, view);
  if (!worked?.ok) throw new Error("not worked out");
  // 11 + 8 · (7 + 6) ns typical; 24 + 8 · (18 + 15) ns at worst, of the built-in figures of HC.
  expect(worked.delay.typicalS).toBeCloseTo(115e-9, 12);
  expect(worked.delay.worstCaseS).toBeCloseTo(288e-9, 12);
  expect(windowLimits(worked.window)?.replaceAll("\u202f", " ")).toBe("28 ns … 288 ns");
  expect(worked.clock?.sentences[0]).toContain("335\u202fns");
});

describe("is refused:", () => {
  test("a step of which no delay is known, at its row", async () => {
    const { scope } = await summing();
    const steps = [step("86", "1"), { ...step("", "2"), name: "relay" }];
    const error = await refusal(keep(scope, { path: { ...PATH, steps } }));
    expect(error.fields?.["path.steps.1.typicalS"]).toMatch(/^Step 2 \(relay\) has no delay/);
  });

  test("counts that are no counts, each at its row", () => {
    const steps = [step("86", "0"), step("08", "-1"), step("32", "1.5")];
    const read = saveDelayPathInput.safeParse({
      ...{ project: "x", writeId: randomUUID(), id: "", version: 0, name: "Carry", board: "" },
      path: { ...PATH, steps },
    });
    expect(read.error?.issues.map(({ path, message }) => [path.join("."), message])).toEqual([
      ["path.steps.0.count", "Row 1: 0 is too few; at least 1."],
      ["path.steps.1.count", "Row 2: -1 is too few; at least 1."],
      ["path.steps.2.count", "Row 3: 1.5 is no whole number. There is no part of one."],
    ]);
  });

  test("a stale edit and a name that is taken", async () => {
    const { scope } = await summing();
    const { id } = await must(keep(scope));
    await must(keep(scope, { id, version: 1, name: "Carry out" }));
    expect(await refusal(keep(scope, { id, version: 1 }))).toMatchObject({
      code: "conflict",
      details: { current: { name: "Carry out", version: 2 } },
    });
    expect((await refusal(keep(scope, { name: "CARRY OUT" }))).fields?.name).toContain("Choose another name.");
    expect((await refusal(keep(scope, { name: "Other", board: "NIX" }))).fields?.board).toContain("no board NIX");
  });
});

test("a path that is archived can be restored", async () => {
  const { scope } = await summing();
  const { id } = await must(keep(scope));
  const write = () => ({ project: scope.slug, writeId: randomUUID(), id });
  await must(archiveDelayPath(scope, write()));
  expect((await loadDelayPaths(scope)).paths[0]?.archived).toBe(true);
  await must(restoreDelayPath(scope, write()));
  expect((await loadDelayPaths(scope)).paths[0]?.archived).toBe(false);
});

test("the window goes into a capture check of the draft, and what is issued stays as it is", async () => {
  const { project, scope } = await summing();
  await must(keep(scope));
  const { places } = await loadDelayPaths(scope);
  const place = places.find(({ board }) => board === "SUM");
  expect(place?.checks.map(({ title, typed }) => [title, typed.window])).toEqual([["Carry delay", ""]]);
  const target = {
    is: "existing",
    key: place?.checks[0]?.key,
    typed: { windowOf: "A0 rising to C7, at 50 %", window: "28 … 288 ns" },
  };
  const { draftVersion, issuedNumber } = place ?? { draftVersion: null, issuedNumber: null };
  const write = { project: scope.slug, writeId: randomUUID(), board: "SUM", draftVersion, issuedNumber, caution: null };
  await must(offerToCheck(project.scopes.maintainer, offerToCheckInput.parse({ ...write, target })));
  const procedure = await loadProcedure(scope, "SUM");
  const specOf = (checks: readonly { title: string; spec: unknown }[] | undefined) =>
    checks?.find(({ title }) => title === "Carry delay")?.spec;
  expect(specOf(procedure?.newest)).toEqual({ expects: "" });
  expect(specOf(procedure?.draft?.checks)).toMatchObject({
    window: { of: "A0 rising to C7, at 50 %", limits: { typed: "28 … 288 ns", value: { unit: "s", upper: 288e-9 } } },
  });
});
