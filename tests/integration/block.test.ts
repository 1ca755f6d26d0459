import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { database } from "@/db/client";
import { units } from "@/db/schema/boards";
import { boardPlans } from "@/db/schema/power";
import { archiveBlock, restoreBlock } from "@/lib/block/archive-block";
import { loadBlock } from "@/lib/block/load-block";
import { loadBlocks } from "@/lib/block/load-blocks";
import { loadBoardPlan } from "@/lib/board-plan/load-board-plan";
import { tieSpares } from "@/lib/board-plan/tie-spares";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { FULL_ADDER, keepBlock, planBoard } from "../support/parts";
import { makeBoard, makeProject, makeUnit } from "../support/project";

useDatabase();

/** A full adder, four of them in an adder, and the summing card that uses the adder. */
async function adders() {
  const project = await makeProject();
  const scope = project.scopes.builder;
  const board = await makeBoard(project, "SUM");
  const adder = await must(keepBlock(scope, FULL_ADDER));
  const four = await must(keepBlock(scope, { name: "Four-bit adder", children: { [adder.id]: 4 } }));
  await must(planBoard(scope, { board: "SUM", blocks: { [four.id]: 2 } }));
  return { project, scope, board, adder, four };
}

const write = (scope: { slug: string }, block: string) => ({ project: scope.slug, writeId: randomUUID(), block });

test("a block counts its gates with everything inside it, and says on which boards it stands", async () => {
  const { scope } = await adders();
  const blocks = await loadBlocks(scope);
  expect(blocks.map(({ name, allGates, boards }) => [name, allGates.map(({ count }) => count), boards])).toEqual([
    ["Four-bit adder", [8, 8, 4], [{ code: "SUM", count: 2 }]],
    ["Full adder", [2, 2, 1], [{ code: "SUM", count: 8 }]],
  ]);
});

describe("before a change of a block", () => {
  test("every board that uses it is named, through which blocks, with the units that are built", async () => {
    const { project, scope, board, adder } = await adders();
    await makeUnit(project.scopes.maintainer, board, "SUM-01");
    const view = await loadBlock(scope, adder.id);
    expect(view?.uses).toEqual([
      { code: "SUM", name: "Board SUM", count: 8, through: ["Four-bit adder"], units: ["SUM-01"] },
    ]);
    expect(view?.outdated).toEqual([]);
  });

  test("a block that holds it is not offered to be put inside it", async () => {
    const { scope, adder } = await adders();
    expect((await loadBlock(scope, adder.id))?.choices).toEqual([]);
  });
});

describe("a changed block", () => {
  test("no longer describes units that were built before, and their board says so", async () => {
    const { project, scope, board, adder } = await adders();
    await makeUnit(project.scopes.maintainer, board, "SUM-01");
    const saved = await must(
      keepBlock(scope, { block: adder.id, version: 1, ...FULL_ADDER, gates: { ...FULL_ADDER.gates, or2: 2 } }),
    );
    expect(saved.outdated).toEqual(["SUM-01"]);
    await makeUnit(project.scopes.maintainer, board, "SUM-02");
    const plan = await loadBoardPlan(scope, "SUM");
    expect(plan?.outdated.map(({ serial, block }) => [serial, block.name])).toEqual([["SUM-01", "Full adder"]]);
  });

  test("still describes them when only its name and words change, or the order of its rows", async () => {
    const { project, scope, board, adder } = await adders();
    await makeUnit(project.scopes.maintainer, board, "SUM-01");
    const saved = await must(
      keepBlock(scope, {
        block: adder.id,
        version: 1,
        name: "Adder",
        summary: "One bit.",
        gates: { or2: 1, and2: 2, xor2: 2 },
      }),
    );
    expect(saved.outdated).toEqual([]);
    expect((await loadBoardPlan(scope, "SUM"))?.outdated).toEqual([]);
  });

  test("makes nothing outdated that was built before the block was first written down", async () => {
    const { project, scope, board, adder } = await adders();
    const unit = await makeUnit(project.scopes.maintainer, board, "SUM-01");
    await database()
      .update(units)
      .set({ createdAt: new Date("2020-01-01") })
      .where(eq(units.id, unit.id));
    await must(keepBlock(scope, { block: adder.id, version: 1, ...FULL_ADDER, summary: "One bit." }));
    expect((await loadBoardPlan(scope, "SUM"))?.outdated).toEqual([]);
  });

  test("opens the question of the ties anew where other gates are left over", async () => {
    const { scope, board, adder } = await adders();
    const tie = { project: scope.slug, writeId: randomUUID(), board: "SUM", version: 1, tied: true };
    await must(tieSpares(scope, tie));
    const saved = await must(
      keepBlock(scope, { block: adder.id, version: 1, ...FULL_ADDER, gates: { ...FULL_ADDER.gates, inv: 1 } }),
    );
    expect(saved.tiesReopened).toEqual(["SUM"]);
    const [plan] = await database().select().from(boardPlans).where(eq(boardPlans.boardId, board.id));
    expect(plan).toMatchObject({ sparesTied: false, version: 3 });
  });
});

describe("is refused:", () => {
  test("a block that would come to hold itself, naming the blocks on the way", async () => {
    const { scope, adder, four } = await adders();
    const error = await refusal(
      keepBlock(scope, { block: adder.id, version: 1, ...FULL_ADDER, children: { [four.id]: 1 } }),
    );
    expect(error.code).toBe("conflict");
    expect(error.fields?.["children.0.block"]).toBe(
      "Row 1: Full adder holds Four-bit adder holds Full adder: that goes round in a circle.",
    );
    const itself = await refusal(
      keepBlock(scope, { block: four.id, version: 1, name: "Four-bit adder", children: { [four.id]: 1 } }),
    );
    expect(itself.message).toContain("Four-bit adder cannot hold itself.");
  });

  test("a circle that two people close at once", async () => {
    const { scope } = await adders();
    const one = await must(keepBlock(scope, { name: "One" }));
    const two = await must(keepBlock(scope, { name: "Two" }));
    const both = await Promise.all([
      keepBlock(scope, { block: one.id, version: 1, name: "One", children: { [two.id]: 1 } }),
      keepBlock(scope, { block: two.id, version: 1, name: "Two", children: { [one.id]: 1 } }),
    ]);
    expect(both.filter(({ ok }) => ok)).toHaveLength(1);
  });

  test("a stale edit, with the block as it is now", async () => {
    const { scope, adder } = await adders();
    await must(keepBlock(scope, { block: adder.id, version: 1, ...FULL_ADDER, summary: "One bit." }));
    const error = await refusal(keepBlock(scope, { block: adder.id, version: 1, ...FULL_ADDER, summary: "Two bits." }));
    expect(error).toMatchObject({ code: "conflict", details: { current: { summary: "One bit.", version: 2 } } });
  });

  test("a gate that no part does, at its row", async () => {
    const { scope } = await adders();
    const error = await refusal(keepBlock(scope, { name: "Odd", gates: { inv: 1, nand99: 1 } }));
    expect(error.fields?.["gates.1.gateFunction"]).toMatch(/^Row 2: no part does “nand99”/);
  });

  test("a name that another block has, also in other letters", async () => {
    const { scope } = await adders();
    expect((await refusal(keepBlock(scope, { name: "FULL ADDER" }))).fields?.name).toContain("Choose another name.");
  });

  test("archiving a block that is used, saying where", async () => {
    const { scope, adder, four } = await adders();
    expect((await refusal(archiveBlock(scope, write(scope, adder.id)))).message).toBe(
      "Full adder is used in Four-bit adder. Take it out there first.",
    );
    expect((await refusal(archiveBlock(scope, write(scope, four.id)))).message).toBe(
      "Four-bit adder is used on SUM. Take it out there first.",
    );
  });

  test("an archived block on another board", async () => {
    const { project, scope } = await adders();
    await makeBoard(project, "OUT");
    const old = await must(keepBlock(scope, { name: "Old" }));
    await must(archiveBlock(scope, write(scope, old.id)));
    const error = await refusal(planBoard(scope, { board: "OUT", blocks: { [old.id]: 1 } }));
    expect(error.message).toBe("Row 1: Old is archived. Restore it first.");
    await must(restoreBlock(scope, write(scope, old.id)));
    expect((await planBoard(scope, { board: "OUT", blocks: { [old.id]: 1 } })).ok).toBe(true);
  });

  test("restoring a block whose parts are archived", async () => {
    const { scope } = await adders();
    const inner = await must(keepBlock(scope, { name: "Inner" }));
    const outer = await must(keepBlock(scope, { name: "Outer", children: { [inner.id]: 2 } }));
    await must(archiveBlock(scope, write(scope, outer.id)));
    await must(archiveBlock(scope, write(scope, inner.id)));
    expect((await refusal(restoreBlock(scope, write(scope, outer.id)))).message).toBe(
      "Outer holds Inner, which is archived. Restore that first.",
    );
  });
});
