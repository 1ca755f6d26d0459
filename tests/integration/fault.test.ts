import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { faults } from "@/db/schema/faults";
import { editFault } from "@/lib/fault/edit-fault";
import { findSimilar } from "@/lib/fault/find-similar";
import { loadFault } from "@/lib/fault/load-fault";
import { faultQuery, loadFaults } from "@/lib/fault/load-faults";
import { loadNewFault } from "@/lib/fault/load-new-fault";
import { editFaultInput, openFaultInput, similarInput } from "@/lib/fault/schema";
import { loadPlaceCounts } from "@/lib/rack/load-place-counts";
import { searchProject } from "@/lib/search/search-project";
import { fails, must, refusal, send } from "../support/bench";
import { useDatabase } from "../support/database";
import { fault, FAULT_FORM } from "../support/faults";
import { rework } from "../support/reworks";
import { openWorkshop, type Workshop } from "../support/workshop";

const db = useDatabase();
let shop: Workshop;
beforeAll(async () => {
  shop = await openWorkshop();
});

describe("a fault", () => {
  it("begins filled in from the failing check that showed it", async () => {
    const { builder } = shop.scopes;
    const failing = randomUUID();
    await must(send(builder, shop.check.id, { id: failing, record: fails, note: "Rings at 14 ns." }));
    const begun = await loadNewFault(builder, { unit: "CON-01", check: shop.check.id });
    expect(begun).toMatchObject({
      unit: "CON-01",
      check: { title: "Rise time of CLK" },
      attemptId: failing,
      title: "Rise time of CLK: does not conform",
    });
    expect(begun.symptom).toContain("Rings at 14 ns.");
  });

  it("is numbered within its project, tied to unit, check and attempt, and counted beside its place", async () => {
    const { builder } = shop.scopes;
    const { number } = await must(fault(builder, { checkId: shop.check.id, title: "Clock edge rings" }));
    const found = await loadFault(builder, number);
    expect(found).toMatchObject({
      title: "Clock edge rings",
      state: "open",
      unit: { serial: "CON-01" },
      check: { title: "Rise time of CLK", state: "failed" },
    });
    expect(found?.attempts.map(({ verdict }) => verdict)).toEqual(["does-not-conform"]);
    expect(found?.history[0]?.sentence).toBe("Bram opened it on CON-01.");
    expect((await loadPlaceCounts(builder)).faults).toBe(1);
  });

  it("gets one number each when several are opened at once", async () => {
    const { builder } = (await openWorkshop()).scopes;
    const numbers = await Promise.all([1, 2, 3, 4].map((n) => must(fault(builder, { title: `Fault ${n}` }))));
    expect(numbers.map(({ number }) => number).sort()).toEqual([1, 2, 3, 4]);
  });

  it("is not opened twice by a double click", async () => {
    const { builder } = (await openWorkshop()).scopes;
    const writeId = randomUUID();
    const [one, two] = await Promise.all([must(fault(builder, { writeId })), must(fault(builder, { writeId }))]);
    expect(one).toEqual(two);
    expect((await loadFaults(builder, faultQuery({}))).lines).toHaveLength(1);
  });

  it("cannot be tied to a check of another unit", async () => {
    const other = await openWorkshop();
    const refused = await refusal(fault(other.scopes.builder, { checkId: shop.check.id }));
    expect(refused.code).toBe("not-found");
  });
});

describe("a fault that is worked on", () => {
  it("is traced with its cause, mended with its mend, and tells its history", async () => {
    const { scopes } = await openWorkshop();
    const { number } = await must(fault(scopes.builder, {}));
    const edit = async (given: object) => {
      const { id, version } = (await loadFault(scopes.builder, number)) ?? { id: "", version: 0 };
      const form = {
        ...FAULT_FORM,
        project: scopes.builder.slug,
        writeId: randomUUID(),
        faultId: id,
        version,
        ...given,
      };
      return editFault(scopes.builder, editFaultInput.parse(form));
    };
    await must(edit({ state: "traced", cause: "W3 ends on pin 11." }));
    await must(edit({ state: "mended", cause: "W3 ends on pin 11.", mend: "Moved to pin 12.", hours: "1:30" }));
    const found = await loadFault(scopes.builder, number);
    expect(found).toMatchObject({ state: "mended", hours: 1.5, version: 3 });
    expect(found?.closedAt).not.toBeNull();
    expect(found?.history.map(({ sentence }) => sentence)).toEqual([
      "Bram called it mended, before traced.",
      "Bram wrote down: mend, hours.",
      "Bram called it traced, before open.",
      "Bram wrote down: cause.",
      "Bram opened it on CON-01.",
    ]);
  });

  it("does not overwrite what somebody else wrote meanwhile", async () => {
    const { scopes } = await openWorkshop();
    const { number } = await must(fault(scopes.builder, {}));
    const { id = "" } = (await loadFault(scopes.builder, number)) ?? {};
    const form = { ...FAULT_FORM, project: scopes.builder.slug, faultId: id, version: 1 };
    const send1 = (cause: string) =>
      editFault(scopes.builder, editFaultInput.parse({ ...form, writeId: randomUUID(), cause }));
    await must(send1("A dry joint"));
    const refused = await refusal(send1("A bridge"));
    expect(refused).toMatchObject({ code: "conflict", details: { current: { cause: "A dry joint", version: 2 } } });
  });

  it.each([
    [{ state: "traced" }, "cause"],
    [{ state: "mended", cause: "Found" }, "mend"],
    [{ state: "no-fault" }, "cause"],
    [{ hours: "an hour or so" }, "hours"],
    [{ title: " " }, "title"],
  ])("asks for what %j leaves out", (given, field) => {
    const form = { ...FAULT_FORM, project: "p", writeId: randomUUID(), unit: "CON-01", ...given };
    const asked = { checkId: null, attemptId: null, probePlanId: null };
    const parsed = openFaultInput.safeParse({ ...form, ...asked });
    expect(parsed.error?.issues.map(({ path }) => path[0])).toEqual([field]);
  });

  it.each([
    ["2", 2],
    ["1,5", 1.5],
    ["0:45", 0.75],
    ["45 min", 0.75],
    ["", null],
  ])("reads %j as hours", (hours, value) => {
    expect(openFaultInput.shape.hours.parse(hours)).toBe(value);
  });

  it("shows the reworks that were made for it", async () => {
    const { scopes, unit } = await openWorkshop();
    const { number } = await must(fault(scopes.builder, {}));
    const { id = "" } = (await loadFault(scopes.builder, number)) ?? {};
    await must(rework(scopes.builder, unit, { signals: ["PH8"], faultId: id, what: "Track to pin 3 cut" }));
    expect((await loadFault(scopes.builder, number))?.reworks).toMatchObject([
      { number: 1, serial: "CON-01", title: "Cut track, R1", says: "Track to pin 3 cut" },
    ]);
  });
});

describe("earlier faults", () => {
  it("that share a signal, by whatever name for the same line, come before those that share words", async () => {
    const { scopes } = await openWorkshop();
    const { builder } = scopes;
    await must(
      fault(builder, { title: "Lamps dim when the motor runs", symptom: "The supply sags.", signals: [], pins: [] }),
    );
    await must(fault(builder, { title: "Carry stays high", symptom: "Bit 8 never comes on.", signals: [], pins: [] }));
    await must(
      fault(builder, {
        title: "Wrong pin",
        symptom: "",
        signals: ["PH[7:0]"],
        pins: [],
        lesson: "Count from the solder side.",
      }),
    );
    const similar = (given: object) =>
      must(
        findSimilar(
          builder,
          similarInput.parse({ project: builder.slug, except: null, words: "", signals: [], pins: [], ...given }),
        ),
      );
    expect(await similar({ words: "bits never coming on", signals: ["PH7"] })).toMatchObject([
      { title: "Wrong pin", shared: ["PH[7:0]"], says: "Count from the solder side." },
      { title: "Carry stays high", shared: [] },
    ]);
    expect(await similar({ words: "cheese & (" })).toEqual([]);
    expect(await similar({})).toEqual([]);
  });

  it("of other projects are none of ours", async () => {
    const [one, two] = [await openWorkshop(), await openWorkshop()];
    await must(fault(one.scopes.builder, { signals: ["PH7"] }));
    const { builder } = two.scopes;
    const input = { project: builder.slug, except: null, words: "bit never comes on", signals: ["PH7"], pins: [] };
    expect(await must(findSimilar(builder, similarInput.parse(input)))).toEqual([]);
  });
});

describe("the list of faults", () => {
  it("shows what stands, and finds by state, unit, words in any form, signal and number", async () => {
    const { builder } = (await openWorkshop()).scopes;
    await must(fault(builder, { title: "Whiskers between pins", signals: ["CARRY_N"], state: "mended", mend: "Cut." }));
    await must(fault(builder, { title: "Bit 8 never comes on", signals: ["PH8"] }));
    const titles = async (search: Record<string, string>) =>
      (await loadFaults(builder, faultQuery(search))).lines.map(({ title }) => title);
    expect(await titles({})).toEqual(["Bit 8 never comes on"]);
    expect(await titles({ show: "all" })).toEqual(["Bit 8 never comes on", "Whiskers between pins"]);
    expect(await titles({ show: "mended" })).toEqual(["Whiskers between pins"]);
    expect(await titles({ show: "all", q: "whisker" })).toEqual(["Whiskers between pins"]);
    expect(await titles({ show: "all", q: "carry_n" })).toEqual(["Whiskers between pins"]);
    expect(await titles({ show: "all", q: "f2" })).toEqual(["Bit 8 never comes on"]);
    expect(await titles({ show: "all", unit: "CON-02" })).toEqual([]);
    expect(await titles({ show: "nonsense", q: "(((" })).toEqual([]);
    const { hits } = await must(searchProject(builder, { project: builder.slug, q: "whiskers" }));
    expect(hits.filter(({ kind }) => kind === "fault").map(({ title }) => title)).toEqual(["F1 Whiskers between pins"]);
  });

  it("is empty for another project, and its faults cannot be changed from there", async () => {
    const [one, two] = [await openWorkshop(), await openWorkshop()];
    const { number } = await must(fault(one.scopes.builder, {}));
    const { id = "" } = (await loadFault(one.scopes.builder, number)) ?? {};
    expect(await loadFault(two.scopes.builder, number)).toBeUndefined();
    const form = { ...FAULT_FORM, project: two.slug, writeId: randomUUID(), faultId: id, version: 1 };
    expect((await refusal(editFault(two.scopes.builder, editFaultInput.parse(form)))).code).toBe("not-found");
    expect((await db.select().from(faults).where(eq(faults.id, id)))[0]?.version).toBe(1);
  });
});
