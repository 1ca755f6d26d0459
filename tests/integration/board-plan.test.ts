import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { database } from "@/db/client";
import { boardPlans } from "@/db/schema/power";
import { ruleFindings } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { archiveBoard } from "@/lib/board/archive-board";
import { loadBoardPlan } from "@/lib/board-plan/load-board-plan";
import { loadBoardSpares } from "@/lib/board-plan/load-board-spares";
import { loadPlanOverview } from "@/lib/board-plan/load-plan-overview";
import { loadDesigns } from "@/lib/board-plan/load-designs";
import { TIE_CHECK_TITLE, tieCheck } from "@/lib/board-plan/tie-check";
import { tieSpares } from "@/lib/board-plan/tie-spares";
import { untiedSpares } from "@/lib/board-plan/untied-spares";
import { offerToCheck } from "@/lib/offer/offer-to-check";
import { offerToCheckInput } from "@/lib/offer/schema";
import { loadProcedure } from "@/lib/procedure/load-procedure";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { FULL_ADDER, keepBlock, listBoard, planBoard } from "../support/parts";
import { makeBoard, makeProject } from "../support/project";

useDatabase();

/** The summing card with three full adders: two XOR, two AND and one OR gate are left over. */
async function summing() {
  const project = await makeProject();
  const scope = project.scopes.builder;
  const board = await makeBoard(project, "SUM", [{ title: "Joints", stage: "inspection" }]);
  const adder = await must(keepBlock(scope, FULL_ADDER));
  const { version } = await must(planBoard(scope, { board: "SUM", blocks: { [adder.id]: 3 } }));
  return { project, scope, board, adder, version };
}

const tie = (scope: ProjectScope, version: number, tied: boolean) =>
  tieSpares(scope, { project: scope.slug, writeId: randomUUID(), board: "SUM", version, tied });

const untied = async (projectId: string) => untiedSpares(await loadDesigns(database(), { projectId }));

const untiedFindings = (projectId: string) =>
  database()
    .select({ key: ruleFindings.key, boards: ruleFindings.boards, title: ruleFindings.rule })
    .from(ruleFindings)
    .where(eq(ruleFindings.projectId, projectId));

describe("a plan of a board", () => {
  test("comes back as it was typed, with what packing needs to count it", async () => {
    const { scope, adder } = await summing();
    const plan = await must(
      planBoard(scope, {
        board: "sum",
        version: 1,
        packing: "per-block",
        family: "HCT",
        clockHz: "1.8432 MHz",
        activity: "12.5 %",
        loadPf: "47p",
        unitsPlanned: "2",
        blocks: { [adder.id]: 4 },
      }),
    );
    const view = await loadBoardPlan(scope, "SUM");
    expect(view).toMatchObject({ version: plan.version, board: { code: "SUM" }, units: [] });
    expect(view?.plan).toEqual({
      packing: "per-block",
      family: "HCT",
      clockHz: "1.8432 MHz",
      activity: "12.5 %",
      loadPf: "47 pF",
      unitsPlanned: "2",
      blocks: [{ block: adder.id, count: "4" }],
    });
    expect((await loadPlanOverview(scope)).lines).toMatchObject([
      { code: "SUM", family: "HCT", packages: 12, blocks: [{ name: "Full adder", count: 4 }], planned: 2 },
    ]);
  });

  test("is refused when somebody changed it meanwhile, and for a family that is not there", async () => {
    const { scope, adder } = await summing();
    expect(await refusal(planBoard(scope, { board: "SUM", version: 0 }))).toMatchObject({
      code: "conflict",
      details: { current: { version: 1 } },
    });
    const error = await refusal(
      planBoard(scope, { board: "SUM", version: 1, family: "XYZ", blocks: { [adder.id]: 1 } }),
    );
    expect(error.fields?.family).toContain("There is no family XYZ.");
  });

  test("keeps its other parts in their order, and raises one version for all of it", async () => {
    const { scope } = await summing();
    const lines = [
      { partNumber: "J", count: "1", designators: "J1" },
      { partNumber: "470 Ω", count: "8", designators: "R1–R8" },
    ];
    expect(await must(listBoard(scope, { board: "SUM", version: 1, lines }))).toEqual({ version: 2 });
    expect((await loadBoardPlan(scope, "SUM"))?.lines).toMatchObject(lines);
    expect((await refusal(listBoard(scope, { board: "SUM", version: 1, lines: [] }))).code).toBe("conflict");
    expect((await loadBoardPlan(scope, "SUM"))?.lines).toHaveLength(2);
  });

  test("of an archived board cannot be changed", async () => {
    const { project, scope, board } = await summing();
    const archived = { project: scope.slug, writeId: randomUUID(), boardId: board.id };
    await must(archiveBoard(project.scopes.maintainer, archived));
    expect((await refusal(planBoard(scope, { board: "SUM", version: 1 }))).message).toContain("is archived");
  });
});

describe("spare gates", () => {
  test("are a finding until somebody says that their ties are on the drawing", async () => {
    const { project, scope, version } = await summing();
    expect([...(await untied(project.id))]).toEqual([
      [
        "SUM",
        [
          { part: "74HC86", gates: 2, inputs: 4, family: "HC" },
          { part: "74HC08", gates: 2, inputs: 4, family: "HC" },
          { part: "74HC32", gates: 1, inputs: 2, family: "HC" },
        ],
      ],
    ]);
    expect((await untiedFindings(project.id)).some(({ boards }) => boards.includes("SUM"))).toBe(true);
    await must(tie(scope, version, true));
    expect(await untiedFindings(project.id)).toEqual([]);
    expect((await loadBoardSpares(scope, "SUM"))?.tied).toBe(true);
    await must(tie(scope, version + 1, false));
    expect(await untiedFindings(project.id)).not.toEqual([]);
  });

  test("of a bipolar family are no finding: an open input reads high", async () => {
    const { project, scope, adder } = await summing();
    await must(planBoard(scope, { board: "SUM", version: 1, family: "LS", blocks: { [adder.id]: 3 } }));
    expect((await untied(project.id)).size).toBe(0);
  });

  test("of a board that uses no blocks are not spoken of", async () => {
    const { project, scope } = await summing();
    await makeBoard(project, "OUT");
    expect((await untied(project.id)).has("OUT")).toBe(false);
    expect(await loadBoardSpares(scope, "OUT")).toBeUndefined();
  });

  test("want their ties looked at again when other gates are left over, and not when only the clock changes", async () => {
    const { scope, board, adder, version } = await summing();
    await must(tie(scope, version, true));
    const same = { board: "SUM", blocks: { [adder.id]: 3 } };
    expect(await must(planBoard(scope, { ...same, version: 2, clockHz: "2 MHz" }))).toEqual({
      version: 3,
      tiesReopened: false,
    });
    expect(await must(planBoard(scope, { board: "SUM", version: 3, blocks: { [adder.id]: 2 } }))).toEqual({
      version: 5,
      tiesReopened: true,
    });
    const [plan] = await database().select().from(boardPlans).where(eq(boardPlans.boardId, board.id));
    expect(plan).toMatchObject({ sparesTied: false, version: 5 });
  });
});

describe("the ties as an inspection check", () => {
  test("go into a draft, never into what is issued, and are brought up to date in the same check", async () => {
    const { project, scope } = await summing();
    const { maintainer } = project.scopes;
    const offer = async () => {
      const view = await loadBoardPlan(scope, "SUM");
      const spares = (await loadBoardSpares(scope, "SUM"))?.spares ?? [];
      const check = tieCheck("SUM", spares);
      const there = view?.place?.checks.find(({ title }) => title === TIE_CHECK_TITLE);
      return offerToCheck(
        maintainer,
        offerToCheckInput.parse({
          project: scope.slug,
          writeId: randomUUID(),
          board: "SUM",
          draftVersion: view?.place?.draftVersion ?? null,
          issuedNumber: view?.place?.issuedNumber ?? null,
          target: there
            ? { is: "existing", key: there.key, typed: check.typed, instruction: check.instruction }
            : { is: "new", check },
          caution: null,
        }),
      );
    };
    expect(await must(offer())).toMatchObject({ begun: true });
    const adder = (await loadBoardPlan(scope, "SUM"))?.plan.blocks[0]?.block ?? "";
    await must(planBoard(scope, { board: "SUM", version: 1, blocks: { [adder]: 2 } }));
    expect(await must(offer())).toMatchObject({ begun: false });
    const procedure = await loadProcedure(scope, "SUM");
    expect(procedure?.newest.map(({ title }) => title)).toEqual(["Joints"]);
    const checks = procedure?.draft?.checks.filter(({ title }) => title === TIE_CHECK_TITLE);
    expect(checks).toHaveLength(1);
    expect(checks?.[0]).toMatchObject({
      stage: "inspection",
      kind: "statement",
      spec: { expects: expect.stringContaining("2 ties") },
    });
    expect(checks?.[0]?.instruction).toContain("U3 gate C (74HC32): pins 9 and 10 to ground, pin 8 stays open.");
  });
});
