import { describe, expect, it } from "vitest";
import { recomputeAll } from "@/lib/check/recompute-all";
import { loadNextChecks } from "@/lib/check/load-next-checks";
import { checkOf, conforms, fails, must, refusal, send, state, stateOf } from "../support/bench";
import { useDatabase } from "../support/database";
import { tie, untie } from "../support/decisions";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

async function machine() {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const psu = await makeUnit(
    maintainer,
    await makeBoard(project, "PSU", [{ title: "Rails" }, { title: "Load" }]),
    "PSU-01",
  );
  const tim = await makeUnit(
    maintainer,
    await makeBoard(project, "TIM", [{ title: "Clock", holdPoint: true }, { title: "Reset" }]),
    "TIM-01",
  );
  const sum = await makeUnit(maintainer, await makeBoard(project, "SUM", [{ title: "Add" }]), "SUM-01");
  const ids = {
    rails: (await checkOf(psu, "Rails")).id,
    load: (await checkOf(psu, "Load")).id,
    clock: (await checkOf(tim, "Clock")).id,
    reset: (await checkOf(tim, "Reset")).id,
    add: (await checkOf(sum, "Add")).id,
  };
  return { project, maintainer, builder, psu, tim, sum, ids };
}

describe("a prerequisite on another unit", () => {
  it("makes a check wait by name, and lets it go when it passes there", async () => {
    const { maintainer, builder, psu, tim, ids } = await machine();
    expect(await must(tie(maintainer, ids.clock, ids.rails))).toEqual({ state: "waiting" });
    expect(await checkOf(tim, "Clock")).toMatchObject({ stateReason: "Waits for “Rails” of PSU-01." });
    expect(await refusal(send(builder, ids.clock, { record: conforms }))).toMatchObject({ code: "blocked" });
    await state(builder, psu, "Rails", conforms);
    expect(await checkOf(tim, "Clock")).toMatchObject({ state: "untested", stateReason: "" });
  });

  it("that fails on repeat puts everything that relied on it in doubt, through units between", async () => {
    const { project, maintainer, builder, psu, tim, sum, ids } = await machine();
    await must(tie(maintainer, ids.clock, ids.rails));
    await must(tie(maintainer, ids.add, ids.reset));
    await state(builder, psu, "Rails", conforms);
    for (const title of ["Clock", "Reset"]) await state(builder, tim, title, conforms);
    await state(builder, sum, "Add", conforms);
    await state(builder, psu, "Rails", fails);
    expect([await stateOf(tim, "Clock"), await stateOf(tim, "Reset"), await stateOf(sum, "Add")]).toEqual([
      "doubtful",
      "doubtful",
      "doubtful",
    ]);
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("can be taken away again, once", async () => {
    const { maintainer, tim, ids } = await machine();
    await must(tie(maintainer, ids.clock, ids.rails));
    expect(await refusal(tie(maintainer, ids.clock, ids.rails))).toMatchObject({ code: "conflict" });
    expect(await must(untie(maintainer, ids.clock, ids.rails))).toEqual({ state: "untested" });
    expect(await stateOf(tim, "Reset")).toBe("waiting");
    expect(await refusal(untie(maintainer, ids.clock, ids.rails))).toMatchObject({ code: "conflict" });
  });

  it("never goes round in a circle: the refusal names the members in order", async () => {
    const { project, maintainer, ids } = await machine();
    await must(tie(maintainer, ids.clock, ids.rails));
    await must(tie(maintainer, ids.add, ids.reset));
    // Reset waits for Clock too: Clock is a hold point before it on its unit.
    const error = await refusal(tie(maintainer, ids.rails, ids.add));
    expect(error.code).toBe("conflict");
    expect(error.message).toBe(
      "That goes round in a circle: “Rails” would wait for “Add” of SUM-01, which waits for “Reset” of TIM-01, which waits for “Clock” of TIM-01, which waits for “Rails”. Nothing was changed.",
    );
    expect(await refusal(tie(maintainer, ids.clock, ids.clock))).toMatchObject({
      message: expect.stringContaining("wait for itself"),
    });
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("cannot be closed to a circle by two people at once", async () => {
    const { project, maintainer, ids } = await machine();
    const answers = await Promise.all([tie(maintainer, ids.rails, ids.add), tie(maintainer, ids.add, ids.rails)]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("belongs to one project", async () => {
    const { maintainer, ids } = await machine();
    const other = await machine();
    for (const attempt of [
      tie(maintainer, ids.clock, other.ids.rails),
      tie(maintainer, other.ids.clock, ids.rails),
      untie(maintainer, other.ids.clock, other.ids.rails),
    ]) {
      expect(await refusal(attempt)).toMatchObject({ code: "not-found" });
    }
  });

  it("says what to do next: the check that most wait for comes first", async () => {
    const { project, maintainer, ids } = await machine();
    await must(tie(maintainer, ids.clock, ids.rails));
    await must(tie(maintainer, ids.add, ids.reset));
    const [first, ...rest] = await loadNextChecks(db, { projectId: project.id });
    expect(first).toMatchObject({ checkId: ids.rails, serial: "PSU-01", reason: "Holds back 3 checks." });
    expect(rest.map((next) => next.checkId)).toEqual([ids.load]);
  });
});

describe("units that depend on each other", () => {
  it("record at the same time without waiting for each other in a circle, and end in true states", async () => {
    const { project, maintainer, builder, psu, tim, sum, ids } = await machine();
    await must(tie(maintainer, ids.clock, ids.rails));
    await must(tie(maintainer, ids.add, ids.load));
    await must(tie(maintainer, ids.load, ids.clock));
    await state(builder, psu, "Rails", conforms);
    await state(builder, tim, "Clock", conforms);
    await state(builder, psu, "Load", conforms);
    const work = Array.from({ length: 24 }, (_, n) => {
      const record = n % 5 === 0 ? fails : conforms;
      const note = "At the same time.";
      return send(builder, [ids.rails, ids.clock, ids.load, ids.add, ids.reset][n % 5] ?? ids.rails, { record, note });
    });
    const answers = await Promise.all(work);
    // Some may be refused because what they wait for fails just then; none may break.
    expect(answers.filter((answer) => !answer.ok && answer.error.code !== "blocked")).toEqual([]);
    expect(answers.some((answer) => answer.ok)).toBe(true);
    expect(await recomputeAll(db, project.id)).toEqual([]);
    expect(await stateOf(sum, "Add")).toMatch(/passed|doubtful|untested|waiting/);
  });
});
