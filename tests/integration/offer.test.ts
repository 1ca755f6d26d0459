import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { loadOfferPlaces } from "@/lib/offer/load-offer-places";
import { offerToCheck } from "@/lib/offer/offer-to-check";
import { offerToCheckInput } from "@/lib/offer/schema";
import { discardDraft } from "@/lib/procedure/discard-draft";
import { loadProcedure } from "@/lib/procedure/load-procedure";
import { must } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject } from "../support/project";

useDatabase();

const CAUTION = { begins: "Set the bench supply's limit to", text: "Set the bench supply's limit to 0.35 A." };

/** A board whose procedure has a current check among others, and offers against what is there now. */
async function powerOn() {
  const project = await makeProject();
  const scope = project.scopes.maintainer;
  const board = await makeBoard(project, "TIM", [
    { title: "Joints", stage: "inspection" },
    { title: "Current at first power", limits: "10 … 190 mA" },
    { title: "+5 V at U1", limits: "4.75 … 5.25 V" },
  ]);
  const place = async () => {
    const [found] = await loadOfferPlaces(scope, { stage: "power-on", kind: "reading", typed: { unit: "A" } });
    if (!found) throw new Error("no place");
    return found;
  };
  const offer = async (given: object = {}) => {
    const { draftVersion, issuedNumber, checks } = await place();
    const input = offerToCheckInput.parse({
      ...{ project: project.slug, writeId: randomUUID(), board: "TIM", draftVersion, issuedNumber, caution: CAUTION },
      target: { is: "existing", key: checks[0]?.key, typed: { limits: "120 … 340 mA", expected: "0.23 A" } },
      ...given,
    });
    return offerToCheck(scope, input);
  };
  const view = async () => {
    const found = await loadProcedure(scope, "TIM");
    if (!found) throw new Error("no board");
    return found;
  };
  return { project, scope, board, place, offer, view };
}

describe("what a calculation offers to a check", () => {
  test("only checks of the wanted stage, kind and unit can take it", async () => {
    const { place } = await powerOn();
    const { checks, draftVersion, issuedNumber } = await place();
    expect(checks.map((check) => check.title)).toEqual(["Current at first power"]);
    expect(checks[0]?.typed).toMatchObject({ limits: "10 … 190 mA", unit: "A" });
    expect([draftVersion, issuedNumber]).toEqual([null, 1]);
  });

  test("begins the draft where there is none, and leaves the issued version as it is", async () => {
    const { offer, view } = await powerOn();
    expect(await must(offer())).toMatchObject({ begun: true });
    const { draft, newest } = await view();
    const changed = draft?.checks.find((check) => check.title === "Current at first power");
    expect(changed?.spec).toMatchObject({ limits: { typed: "120 … 340 mA" }, expected: { value: 0.23 } });
    expect(changed?.caution).toBe("Set the bench supply's limit to 0.35 A.");
    expect(newest.find((check) => check.key === changed?.key)?.spec).toMatchObject({
      limits: { typed: "10 … 190 mA" },
    });
  });

  test("changes that check only", async () => {
    const { offer, view } = await powerOn();
    await must(offer());
    const { draft, newest } = await view();
    const others = (rows: typeof newest) => rows.filter((check) => check.title !== "Current at first power");
    expect(others(draft?.checks ?? [])).toEqual(others(newest));
  });

  test("goes into the draft that is there, and takes the place of its own earlier caution", async () => {
    const { offer, view } = await powerOn();
    await must(offer());
    const again = await must(
      offer({ caution: { begins: CAUTION.begins, text: "Set the bench supply's limit to 0.4 A." } }),
    );
    expect(again.begun).toBe(false);
    const changed = (await view()).draft?.checks.find((check) => check.key === again.key);
    expect(changed?.caution).toBe("Set the bench supply's limit to 0.4 A.");
  });

  test("a new check goes to the end of its stage", async () => {
    const { offer, view } = await powerOn();
    const check = {
      ...{
        stage: "inspection",
        title: "Spare inputs are tied",
        instruction: "U3 pins 4 and 5 to ground.",
        caution: "",
      },
      ...{ reference: "", holdPoint: false, kind: "statement", typed: { expects: "no spare input floats" } },
      ...{ covers: { signals: [], pins: [], rails: [], blocks: [] }, needs: [] },
    };
    await must(offer({ target: { is: "new", check }, caution: null }));
    expect((await view()).draft?.checks.map(({ title }) => title)).toEqual([
      "Joints",
      "Spare inputs are tied",
      "Current at first power",
      "+5 V at U1",
    ]);
  });
});

describe("an offer is refused", () => {
  test("when somebody changed the draft meanwhile", async () => {
    const { offer, place } = await powerOn();
    await must(offer());
    const { draftVersion } = await place();
    expect(await offer({ draftVersion: (draftVersion ?? 0) - 1 })).toMatchObject({ error: { code: "conflict" } });
  });

  test("when somebody began a draft or issued a version meanwhile", async () => {
    const { offer, board } = await powerOn();
    await board.issue(2, [{ title: "Current at first power", limits: "10 … 200 mA" }]);
    expect(await offer({ issuedNumber: 1 })).toMatchObject({ error: { code: "conflict" } });
    await must(offer());
    expect(await offer({ draftVersion: null, issuedNumber: 2 })).toMatchObject({ error: { code: "conflict" } });
  });

  test("when the limits cannot be read, and then no draft is begun", async () => {
    const { offer, place, view } = await powerOn();
    const key = (await place()).checks[0]?.key;
    const answer = await offer({ target: { is: "existing", key, typed: { limits: "5 … 2 A" } } });
    expect(answer).toMatchObject({ ok: false, error: { code: "invalid" } });
    expect((await view()).draft).toBeNull();
  });

  test("when it names a field that the kind does not have", async () => {
    const { offer, place } = await powerOn();
    const key = (await place()).checks[0]?.key;
    const answer = await offer({ target: { is: "existing", key, typed: { limit: "5 A" } } });
    expect(answer).toMatchObject({ ok: false, error: { message: expect.stringContaining("no field limit") } });
  });

  test("for a check that is not in the draft", async () => {
    const { offer, view } = await powerOn();
    const answer = await offer({ target: { is: "existing", key: randomUUID(), typed: {} } });
    expect(answer).toMatchObject({ ok: false, error: { code: "not-found" } });
    expect((await view()).draft).toBeNull();
  });
});

test("the same offer sent twice is put in once", async () => {
  const { offer, view } = await powerOn();
  const writeId = randomUUID();
  const first = await offer({ writeId });
  expect(await offer({ writeId })).toEqual(first);
  expect((await view()).draft?.version).toBe(2);
});

test("a draft that was thrown away can be begun by an offer again", async () => {
  const { offer, scope, project, place, view } = await powerOn();
  const { version } = await must(offer());
  await must(discardDraft(scope, { project: project.slug, writeId: randomUUID(), board: "TIM", version }));
  expect((await place()).draftVersion).toBeNull();
  expect(await must(offer())).toMatchObject({ begun: true });
  expect((await view()).draft?.checks).toHaveLength(3);
});
