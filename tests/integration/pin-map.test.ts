import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { database } from "@/db/client";
import { findPinsOf } from "@/db/queries/pin-map";
import { createBoard } from "@/lib/board/create-board";
import { addConnector } from "@/lib/connector/add-connector";
import { editConnector } from "@/lib/connector/edit-connector";
import { removeConnector } from "@/lib/connector/remove-connector";
import { addConnectorInput, type AddConnectorInput } from "@/lib/connector/schema";
import { copyPinMap } from "@/lib/pin-map/copy-pin-map";
import { loadWiring } from "@/lib/pin-map/load-wiring";
import { EMPTY_TEXTS, type PinTexts } from "@/lib/pin-map/pin-columns";
import { savePinMap } from "@/lib/pin-map/save-pin-map";
import { savePinMapInput } from "@/lib/pin-map/schema";
import { createSlot } from "@/lib/slot/create-slot";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeProject } from "../support/project";

useDatabase();

type Form = Omit<AddConnectorInput, "project" | "writeId" | "boardId" | "reference">;
const form: Form = { type: "din41612-c64", grid: null, slotId: null, takes: "J1", cabledTo: null };

/** A backplane with two slots for CON and TIM, and a connector on each card. */
async function machine() {
  const project = await makeProject();
  const scope = project.scopes.maintainer;
  const write = () => ({ project: project.slug, writeId: randomUUID() });
  const board = async (code: string, kind: "card" | "backplane") => {
    const edge = { connectorType: null, connectorReference: "J1" };
    const { id } = await must(
      createBoard(scope, { ...write(), code, name: `Board ${code}`, summary: "", kind, ...edge }),
    );
    return id;
  };
  const [bp, con, tim] = [await board("BP", "backplane"), await board("CON", "card"), await board("TIM", "card")];
  const slot = async (position: number, boardId: string) =>
    (await must(createSlot(scope, { ...write(), position, label: "", pitchHp: 4, boardId }))).id;
  const slots = [await slot(1, con), await slot(2, tim)] as const;
  const add = (boardId: string, more: Partial<Form> & { reference: string }) =>
    addConnector(scope, { ...write(), ...form, ...more, boardId });
  const save = (connectorId: string, version: number, pins: (Partial<PinTexts> & { pin: string })[]) =>
    savePinMap(
      scope,
      savePinMapInput.parse({
        ...write(),
        connectorId,
        version,
        pins: pins.map((row) => ({ ...EMPTY_TEXTS, ...row })),
      }),
    );
  const signalsOf = async (connectorId: string) =>
    (await findPinsOf(database(), connectorId)).map(({ pin, signal }) => `${pin} ${signal}`);
  const view = () => loadWiring(scope);
  return { project, scope, write, bp, con, tim, slots, add, save, signalsOf, view };
}

describe("a connector", () => {
  test("joins the slot it makes to the card that is meant for it", async () => {
    const { bp, con, slots, add, view } = await machine();
    await must(add(bp, { reference: "X1", slotId: slots[0] }));
    await must(add(con, { reference: "J1" }));
    const { machine: assembled, connectors } = await view();
    expect(connectors.map(({ code, reference }) => `${code} ${reference}`)).toEqual(["BP X1", "CON J1"]);
    expect(assembled.matings).toHaveLength(1);
  });

  test("cannot claim a slot that another one makes for the same plug, and both are named", async () => {
    const { bp, slots, add } = await machine();
    await must(add(bp, { reference: "X1", slotId: slots[0] }));
    const refused = await refusal(add(bp, { reference: "X2", slotId: slots[0] }));
    expect(refused).toMatchObject({
      code: "conflict",
      message: "BP X1 and BP X2 both claim slot 1 for the card's J1. One of them must take another.",
    });
    await must(add(bp, { reference: "X2", slotId: slots[0], takes: "J2" }));
  });

  test("of a card makes no slot", async () => {
    const { con, slots, add } = await machine();
    expect(await refusal(add(con, { reference: "J1", slotId: slots[0] }))).toMatchObject({
      fields: { slotId: expect.stringContaining("CON is a card") },
    });
  });

  test("has its reference to itself on its board, in small letters, too", async () => {
    const { con, add } = await machine();
    await must(add(con, { reference: "J1" }));
    expect(await refusal(add(con, { reference: "j1" }))).toMatchObject({ code: "conflict" });
  });

  test("is cabled from one end, to another connector", async () => {
    const { scope, write, con, tim, add } = await machine();
    const { id: far } = await must(add(tim, { reference: "J2" }));
    const { id: near } = await must(add(con, { reference: "J2", cabledTo: far }));
    const cable = { ...write(), ...form, connectorId: far, version: 1, position: 1, reference: "J2" };
    expect(await refusal(editConnector(scope, { ...cable, cabledTo: near }))).toMatchObject({
      message: "The cable is said at its other end already, CON J2. Once is enough.",
    });
    expect(await refusal(editConnector(scope, { ...cable, writeId: randomUUID(), cabledTo: far }))).toMatchObject({
      fields: { cabledTo: expect.stringContaining("another connector") },
    });
  });

  test("moves in its board's order, and the others close up", async () => {
    const { scope, write, con, add, view } = await machine();
    await must(add(con, { reference: "J1" }));
    await must(add(con, { reference: "J2" }));
    const { id } = await must(add(con, { reference: "J3" }));
    await must(
      editConnector(scope, { ...write(), ...form, connectorId: id, version: 1, position: 1, reference: "J3" }),
    );
    expect((await view()).connectors.map(({ reference, position }) => `${position} ${reference}`)).toEqual([
      "1 J3",
      "2 J1",
      "3 J2",
    ]);
  });

  test("may have a face of one's own, which must be one that can be drawn", async () => {
    const { con, add, view } = await machine();
    const grid = { rows: ["a", "b"], positions: 4, pitchMm: 2 };
    await must(add(con, { reference: "J9", type: "grid", grid }));
    expect((await view()).machine.boards.flatMap(({ connectors }) => connectors)[0]?.face.pins).toHaveLength(8);
    const bad = addConnectorInput.safeParse({
      ...form,
      ...{ project: "p", writeId: randomUUID(), boardId: con, reference: "J1", type: "grid" },
      grid: { rows: ["a", "a"], positions: 0, pitchMm: 2 },
    });
    expect(bad.error?.issues.map(({ message }) => message)).toEqual([
      "Rows 1 and 2 are both called a.",
      "Give each row 1 to 200 positions.",
    ]);
  });

  test("goes with its pins and says how many; a stale removal is refused", async () => {
    const { scope, write, con, add, save } = await machine();
    const { id: connectorId } = await must(add(con, { reference: "J1" }));
    await must(
      save(connectorId, 1, [
        { pin: "a1", signal: "GND" },
        { pin: "a2", signal: "+5V" },
      ]),
    );
    expect(await refusal(removeConnector(scope, { ...write(), connectorId, version: 1 }))).toMatchObject({
      code: "conflict",
    });
    expect(await must(removeConnector(scope, { ...write(), connectorId, version: 2 }))).toEqual({ pins: 2 });
  });
});

describe("saving a pin map", () => {
  test("keeps what was typed as it was meant, and runs the check", async () => {
    const { bp, con, tim, slots, add, save, view } = await machine();
    const { id: x1 } = await must(add(bp, { reference: "X1", slotId: slots[0] }));
    const { id: x2 } = await must(add(bp, { reference: "X2", slotId: slots[1] }));
    const { id: j } = await must(add(con, { reference: "J1" }));
    const { id: t } = await must(add(tim, { reference: "J1" }));
    await must(
      save(x1, 1, [
        { pin: "A10", signal: "PH6" },
        { pin: "a1", signal: "GND" },
      ]),
    );
    await must(save(x2, 1, [{ pin: "a10", signal: "PH6" }]));
    await must(save(j, 1, [{ pin: "a10", signal: "PH6", role: "pp", family: "hc", pullUpOhm: "4k7", loads: "2" }]));
    await must(save(t, 1, [{ pin: "a10", signal: "PH6", role: "push-pull", family: "HC" }]));
    const { machine: assembled, findings } = await view();
    const pins = assembled.boards.flatMap(({ connectors }) => connectors).flatMap((connector) => connector.pins);
    expect(pins).toContainEqual({
      ...{ pin: "a10", signal: "PH6", role: "push-pull output", family: "HC" },
      ...{ loads: 2, enableGroup: "", pullUpOhm: 4700 },
    });
    expect(pins).toContainEqual(expect.objectContaining({ pin: "a1", role: "ground" }));
    expect(findings.filter(({ weight }) => weight === "must").map(({ title }) => title)).toContain(
      "Two push-pull outputs drive PH6",
    );
  });

  test("takes nothing when one row is wrong, and names pin and column of each", async () => {
    const { con, add, save, signalsOf } = await machine();
    const { id } = await must(add(con, { reference: "J1" }));
    const refused = await refusal(
      save(id, 1, [
        { pin: "a1", signal: "GND" },
        { pin: "b1", signal: "GND" },
        { pin: "a2", signal: "+5V", role: "outputt", family: "XYZ" },
        { pin: "a3", signal: "A", loads: "many" },
        { pin: "A3", signal: "B" },
      ]),
    );
    expect(refused).toMatchObject({ code: "invalid", message: expect.stringContaining("Nothing was saved.") });
    expect(refused.fields).toMatchObject({
      "b1.pin": expect.stringContaining("CON J1 has no pin b1."),
      "a2.role": expect.stringContaining("a2, Role: “outputt” is no role."),
      "a2.family": expect.stringContaining("Known: "),
      "a3.loads": expect.stringContaining("a3, Loads:"),
      "a3.pin": "a3 stands in two rows. Keep one of them.",
    });
    expect(await signalsOf(id)).toEqual([]);
  });

  test("takes only changed rows; a row without a word takes its pin away", async () => {
    const { con, add, save, signalsOf } = await machine();
    const { id } = await must(add(con, { reference: "J1" }));
    await must(
      save(id, 1, [
        { pin: "a1", signal: "GND" },
        { pin: "a2", signal: "+5V" },
        { pin: "a3", signal: "X" },
      ]),
    );
    await must(save(id, 2, [{ pin: "a3" }, { pin: "a2", signal: "+12V" }, { pin: "a9" }]));
    expect(await signalsOf(id)).toEqual(["a1 GND", "a2 +12V"]);
  });

  test("is refused onto another version, with who saved and what stands there now", async () => {
    const { con, add, save, signalsOf } = await machine();
    const { id } = await must(add(con, { reference: "J1" }));
    await must(save(id, 1, [{ pin: "a1", signal: "GND" }]));
    const refused = await refusal(save(id, 1, [{ pin: "a2", signal: "+5V" }]));
    expect(refused).toMatchObject({
      code: "conflict",
      message: "Mira changed CON J1 meanwhile. Look at both and decide; nothing was saved.",
      details: { current: { version: 2, by: "Mira", pins: [{ pin: "a1", signal: "GND", role: "ground", note: "" }] } },
    });
    expect(await signalsOf(id)).toEqual(["a1 GND"]);
  });

  test("by two people at once lets one through and tells the other", async () => {
    const { con, add, save } = await machine();
    const { id } = await must(add(con, { reference: "J1" }));
    const both = await Promise.all([
      save(id, 1, [{ pin: "a1", signal: "GND" }]),
      save(id, 1, [{ pin: "a1", signal: "+5V" }]),
    ]);
    expect(both.map((answer) => (answer.ok ? "saved" : answer.error.code)).sort()).toEqual(["conflict", "saved"]);
  });

  test("twice under one write id saves once", async () => {
    const { scope, write, con, add, signalsOf } = await machine();
    const { id: connectorId } = await must(add(con, { reference: "J1" }));
    const pins = [{ ...EMPTY_TEXTS, pin: "a1", signal: "GND" }];
    const input = savePinMapInput.parse({ ...write(), connectorId, version: 1, pins });
    const first = await must(savePinMap(scope, input));
    expect(await must(savePinMap(scope, input))).toEqual(first);
    expect(await signalsOf(connectorId)).toEqual(["a1 GND"]);
  });

  test("of another project's connector finds none", async () => {
    const { save } = await machine();
    const other = await machine();
    const { id } = await must(other.add(other.con, { reference: "J1" }));
    expect(await refusal(save(id, 1, [{ pin: "a1", signal: "GND" }]))).toMatchObject({ code: "not-found" });
  });

  test("takes every pin of the largest face at once", async () => {
    const { con, add, save } = await machine();
    const grid = { rows: [..."abcdefghijklmnopqrstuvwxyz"], positions: 200, pitchMm: 1 };
    const { id } = await must(add(con, { reference: "J1", type: "grid", grid }));
    const rows = grid.rows.flatMap((row) =>
      Array.from({ length: 200 }, (_, at) => ({ pin: `${row}${at + 1}`, note: "x" })),
    );
    expect(await must(save(id, 1, rows))).toEqual({ version: 2, pins: 5200 });
  });
});

describe("copying a slot's pin map", () => {
  test("makes a connector where the slot has none, and replaces what another one's pins carried", async () => {
    const { scope, write, bp, slots, add, save, signalsOf, view } = await machine();
    const { id: source } = await must(add(bp, { reference: "X1", slotId: slots[0] }));
    await must(
      save(source, 1, [
        { pin: "a1", signal: "GND" },
        { pin: "a4", signal: "CLK" },
      ]),
    );
    const copy = (version: number | null) =>
      copyPinMap(scope, { ...write(), connectorId: source, version: 2, slots: [{ slotId: slots[1], version }] });
    expect(await must(copy(null))).toEqual({ slots: 1, pins: 2 });
    const made = (await view()).connectors.find(({ slotId }) => slotId === slots[1]);
    expect(made).toMatchObject({ reference: "X2", takes: "J1", type: "din41612-c64", version: 2 });
    await must(save(made?.id ?? "", 2, [{ pin: "a9", signal: "STRAY" }]));
    expect(await refusal(copy(2))).toMatchObject({ code: "conflict" });
    await must(copy(3));
    expect(await signalsOf(made?.id ?? "")).toEqual(["a1 GND", "a4 CLK"]);
  });

  test("is for slots: a card has none", async () => {
    const { scope, write, con, slots, add } = await machine();
    const { id: connectorId } = await must(add(con, { reference: "J1" }));
    const wanted = { ...write(), connectorId, version: 1, slots: [{ slotId: slots[0], version: null }] };
    expect(await refusal(copyPinMap(scope, wanted))).toMatchObject({ code: "invalid" });
  });
});
