import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { revisions, units } from "@/db/schema/boards";
import { createRevision } from "@/lib/board/create-revision";
import { dealPunch, reopenPunch } from "@/lib/punch/deal-punch";
import { loadPunch } from "@/lib/punch/load-punch";
import { takePunch } from "@/lib/punch/take-punch";
import { purgeUnit } from "@/lib/unit/purge-unit";
import { checkOf, fails, must, refusal, state } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { concede } from "../support/decisions";
import { fault } from "../support/faults";
import { rework } from "../support/reworks";
import { openWorkshop } from "../support/workshop";

const db = useDatabase();

/** CON-01 of revision A has taught something in each of the three ways; revision B is begun. */
async function taught() {
  const shop = await openWorkshop();
  const { maintainer, builder } = shop.scopes;
  await must(fault(builder, { title: "W3 on pin 11", nextRevision: "Route PH7 to U9-3.", state: "open" }));
  await must(fault(builder, { title: "Says nothing for the next one" }));
  await must(
    fault(builder, { title: "Probe on ×1", nextRevision: "Nothing.", state: "no-fault", cause: "The probe." }),
  );
  await state(builder, shop.unit, "Rise time of CLK", fails);
  await must(concede(maintainer, shop.check.id, "Slow enough for 1 MHz."));
  const wire = { number: "W3", from: "U6-12", to: "U9-3", colour: "white", out: false };
  await must(rework(builder, shop.unit, { kind: "bodge-wire", wire, what: "PH7 by wire", signals: ["PH7"] }));
  await must(createRevision(maintainer, { ...write(shop.slug), boardId: shop.board.id, notes: "" }));
  const next = one(
    await db
      .select()
      .from(revisions)
      .where(and(eq(revisions.boardId, shop.board.id), eq(revisions.letter, "B"))),
  );
  const take = () => takePunch(maintainer, { ...write(shop.slug), revisionId: next.id });
  const list = async () => (await loadPunch(maintainer, shop.board.id))[next.id] ?? [];
  return { ...shop, maintainer, builder, next, take, list };
}

const write = (project: string) => ({ project, writeId: randomUUID() });

describe("a new revision", () => {
  it("takes faults with something to change, standing concessions and reworks of the old one", async () => {
    const { take, list } = await taught();
    expect(await must(take())).toEqual({ items: 3 });
    expect((await list()).map(({ source, text, serial }) => [source, text, serial])).toEqual([
      ["concession", "Rise time of CLK: Slow enough for 1 MHz.", "CON-01"],
      ["fault", "Route PH7 to U9-3. (W3 on pin 11)", "CON-01"],
      ["rework", "Bodge wire W3, U6-12 to U9-3, white: PH7 by wire", "CON-01"],
    ]);
  });

  it("takes them once; what came meanwhile is added and what is ticked off stays so", async () => {
    const { take, list, maintainer, builder, unit, slug } = await taught();
    await must(take());
    const item = (await list()).find(({ source }) => source === "fault");
    await must(
      dealPunch(maintainer, { ...write(slug), itemId: item?.id ?? "", version: 1, how: "Routed on layer 2." }),
    );
    expect(await must(take())).toEqual({ items: 0 });
    await must(rework(builder, unit, { what: "U6 reflowed", kind: "reflow", parts: ["U6"] }));
    expect(await must(take())).toEqual({ items: 1 });
    expect((await list()).filter(({ dealtWith }) => dealtWith !== "")).toMatchObject([
      { dealtWith: "Routed on layer 2.", dealt: { by: "Mira" }, version: 2 },
    ]);
  });

  it("has nothing to take for the first revision", async () => {
    const { maintainer, board, slug } = await taught();
    expect(await must(takePunch(maintainer, { ...write(slug), revisionId: board.revisionId }))).toEqual({ items: 0 });
  });

  it("of another project is refused", async () => {
    const [one1, two] = [await taught(), await taught()];
    const refused = await refusal(takePunch(two.maintainer, { ...write(two.slug), revisionId: one1.next.id }));
    expect(refused.code).toBe("not-found");
  });
});

describe("an item", () => {
  it("is ticked off with how, taken back, and refuses a stale tick", async () => {
    const { take, list, maintainer, slug } = await taught();
    await must(take());
    const [{ id: itemId = "" } = {}] = await list();
    await must(dealPunch(maintainer, { ...write(slug), itemId, version: 1, how: "Faster buffer." }));
    const stale = await refusal(dealPunch(maintainer, { ...write(slug), itemId, version: 1, how: "Slower clock." }));
    expect(stale).toMatchObject({
      code: "conflict",
      details: { current: { dealtWith: "Faster buffer.", version: 2 } },
    });
    await must(reopenPunch(maintainer, { ...write(slug), itemId, version: 2 }));
    expect((await list())[0]).toMatchObject({ dealtWith: "", dealt: null, version: 3 });
  });

  it("stays on the list when the unit that taught it is purged", async () => {
    const { take, list, maintainer, unit, slug } = await taught();
    await must(take());
    await db.update(units).set({ archivedAt: new Date() }).where(eq(units.id, unit.id));
    await must(purgeUnit(maintainer, { ...write(slug), unitId: unit.id, confirmation: "CON-01" }));
    expect((await list()).map(({ serial, mark }) => [serial, mark])).toEqual([
      [null, ""],
      [null, ""],
      [null, ""],
    ]);
  });

  it("keeps the check that was conceded out of it once the concession no longer stands", async () => {
    const { take, list, builder, unit } = await taught();
    expect((await checkOf(unit, "Rise time of CLK")).state).toBe("conceded");
    await state(builder, unit, "Rise time of CLK", { conforms: true });
    await must(take());
    expect((await list()).map(({ source }) => source)).toEqual(["fault", "rework"]);
  });
});
