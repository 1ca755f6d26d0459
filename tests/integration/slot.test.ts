import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { loadBoards } from "@/lib/board/load-boards";
import { archiveSlot } from "@/lib/slot/archive-slot";
import { createSlot } from "@/lib/slot/create-slot";
import { editSlot } from "@/lib/slot/edit-slot";
import { placeUnit } from "@/lib/slot/place-unit";
import { removeUnit } from "@/lib/slot/remove-unit";
import { restoreSlot } from "@/lib/slot/restore-slot";
import { archiveUnit } from "@/lib/unit/archive-unit";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject, makeUnit } from "../support/project";

useDatabase();

const write = (project: { slug: string }) => ({ project: project.slug, writeId: randomUUID() });

async function machine() {
  const project = await makeProject();
  const scope = project.scopes.builder;
  const board = await makeBoard(project, "TIM");
  const other = await makeBoard(project, "CON");
  const units = [await makeUnit(scope, board, "TIM-01"), await makeUnit(scope, board, "TIM-02")];
  const stranger = await makeUnit(scope, other, "CON-01");
  const add = async (position: number) => {
    const slot = await createSlot(scope, { ...write(project), position, label: "", pitchHp: 4, boardId: board.id });
    if (!slot.ok) throw new Error(slot.error.message);
    return slot.value.id;
  };
  const slots = [await add(1), await add(2)];
  const place = (slot: string | undefined, unit: { id: string } | undefined) =>
    placeUnit(scope, { ...write(project), slotId: slot ?? "", unitId: unit?.id ?? "" });
  const take = (unit: { id: string } | undefined) => removeUnit(scope, { ...write(project), unitId: unit?.id ?? "" });
  const seats = async () => (await loadBoards(scope)).slots.map((slot) => slot.unit?.serial ?? null);
  return { project, scope, board, other, units, stranger, slots, place, take, seats };
}

describe("a unit and its slot", () => {
  test("it sits in one slot only, and is told where it sits", async () => {
    const { units, slots, place, seats } = await machine();
    expect((await place(slots[0], units[0])).ok).toBe(true);
    const again = await place(slots[1], units[0]);
    expect(again).toMatchObject({ ok: false, error: { code: "conflict", message: expect.stringContaining("slot 1") } });
    expect(await seats()).toEqual(["TIM-01", null]);
  });

  test("two people place it in two slots at once: one does, the other is told", async () => {
    const { units, slots, place, seats } = await machine();
    const both = await Promise.all([place(slots[0], units[0]), place(slots[1], units[0])]);
    expect(both.filter((answer) => answer.ok)).toHaveLength(1);
    expect((await seats()).filter(Boolean)).toEqual(["TIM-01"]);
  });

  test("two units into one slot at once: one sits, the other is told which", async () => {
    const { units, slots, place, seats } = await machine();
    const both = await Promise.all([place(slots[0], units[0]), place(slots[0], units[1])]);
    expect(both.filter((answer) => answer.ok)).toHaveLength(1);
    expect(both.find((answer) => !answer.ok)).toMatchObject({
      error: { code: "conflict", message: expect.stringContaining("sits in slot 1") },
    });
    expect((await seats()).filter(Boolean)).toHaveLength(1);
  });

  test("a card goes only into a slot that is wired for it", async () => {
    const { stranger, slots, place } = await machine();
    expect(await place(slots[0], stranger)).toMatchObject({
      ok: false,
      error: { code: "invalid", message: expect.stringContaining("wired for Board TIM") },
    });
  });

  test("who sat where stays on the slot's history", async () => {
    const { scope, units, slots, place, take } = await machine();
    await place(slots[0], units[0]);
    await take(units[0]);
    await place(slots[0], units[1]);
    const [slot] = (await loadBoards(scope)).slots;
    expect(slot?.history.map(({ serial, removedAt }) => [serial, removedAt !== null])).toEqual([
      ["TIM-02", false],
      ["TIM-01", true],
    ]);
  });

  test("archiving the unit takes it out", async () => {
    const { project, scope, units, slots, place, seats } = await machine();
    await place(slots[0], units[0]);
    await archiveUnit(scope, { ...write(project), unitId: units[0]?.id ?? "" });
    expect(await seats()).toEqual([null, null]);
  });

  test("taking out what sits nowhere says so", async () => {
    const { units, take } = await machine();
    expect(await take(units[0])).toMatchObject({ ok: false, error: { code: "conflict" } });
  });
});

describe("a slot", () => {
  test("has its position to itself", async () => {
    const { project, scope } = await machine();
    const again = await createSlot(scope, { ...write(project), position: 2, label: "", pitchHp: 4, boardId: null });
    expect(again).toMatchObject({ ok: false, error: { fields: { position: expect.any(String) } } });
  });

  test("does not get another board under a unit, nor leave while one sits in it", async () => {
    const { project, scope, other, units, slots, place } = await machine();
    await place(slots[0], units[0]);
    const slotId = slots[0] ?? "";
    const edit = { ...write(project), slotId, version: 1, position: 1, label: "", pitchHp: 4, boardId: other.id };
    expect(await editSlot(scope, edit)).toMatchObject({
      ok: false,
      error: { fields: { boardId: expect.any(String) } },
    });
    expect(await archiveSlot(scope, { ...write(project), slotId })).toMatchObject({
      ok: false,
      error: { code: "conflict" },
    });
  });

  test("a stale edit is refused with the slot as it is", async () => {
    const { project, scope, board, slots } = await machine();
    const edit = (label: string) =>
      editSlot(scope, {
        ...write(project),
        slotId: slots[0] ?? "",
        version: 1,
        position: 1,
        label,
        pitchHp: 8,
        boardId: board.id,
      });
    expect((await edit("left")).ok).toBe(true);
    expect(await edit("right")).toMatchObject({
      ok: false,
      error: { code: "conflict", details: { current: { label: "left", pitchHp: 8, version: 2 } } },
    });
  });

  test("comes back where it was, unless the position is taken", async () => {
    const { project, scope, slots } = await machine();
    const slotId = slots[1] ?? "";
    await archiveSlot(scope, { ...write(project), slotId });
    expect((await loadBoards(scope)).archivedSlots.map(({ position }) => position)).toEqual([2]);
    expect((await restoreSlot(scope, { ...write(project), slotId })).ok).toBe(true);
    await archiveSlot(scope, { ...write(project), slotId });
    await createSlot(scope, { ...write(project), position: 2, label: "", pitchHp: 4, boardId: null });
    expect(await restoreSlot(scope, { ...write(project), slotId })).toMatchObject({
      ok: false,
      error: { code: "conflict" },
    });
  });

  test("takes cards, not the backplane's own board from another project", async () => {
    const { project, scope } = await machine();
    const foreign = await makeBoard(await makeProject(), "TIM");
    const answer = await createSlot(scope, {
      ...write(project),
      position: 9,
      label: "",
      pitchHp: 4,
      boardId: foreign.id,
    });
    expect(answer).toMatchObject({ ok: false, error: { code: "invalid", fields: { boardId: expect.any(String) } } });
  });
});
