import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { memberships } from "@/db/schema/projects";
import { attempts } from "@/db/schema/travelers";
import { checkOf, conforms, must, refusal, send, state, stateOf, statesOf } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeViewer, scopeFor } from "../support/people";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { pastTheHold, supplyBench } from "../support/supply-bench";

const db = useDatabase();

describe("the same attempt sent again", () => {
  it("gives the first answer and makes no second row, also when it arrives many times at once", async () => {
    const given = await supplyBench();
    const check = await pastTheHold(given);
    const id = randomUUID();
    const answers = await Promise.all(
      Array.from({ length: 8 }, () => must(send(given.builder, check.id, { id, record: { typed: "5.02" } }))),
    );
    const later = await must(send(given.builder, check.id, { id, record: { typed: "5.02" } }));
    for (const answer of answers) expect(answer).toEqual(later);
    expect(await db.select().from(attempts).where(eq(attempts.checkId, check.id))).toHaveLength(1);
    const told = await db.select().from(events).where(eq(events.subjectId, id));
    expect(told).toHaveLength(1);
  });

  it("is refused when somebody else used the id", async () => {
    const given = await supplyBench();
    const check = await checkOf(given.unit, "No bridges under the lens");
    const id = randomUUID();
    await must(send(given.builder, check.id, { id, record: conforms }));
    expect(await refusal(send(given.maintainer, check.id, { id, record: conforms }))).toMatchObject({
      code: "conflict",
    });
  });

  it("may succeed after it was refused", async () => {
    const given = await supplyBench();
    const check = await checkOf(given.unit, "5 V rail, no load");
    const id = randomUUID();
    await refusal(send(given.builder, check.id, { id, record: { typed: "5.0" } }));
    await pastTheHold(given);
    expect(await must(send(given.builder, check.id, { id, record: { typed: "5.0" } }))).toMatchObject({
      state: "passed",
    });
  });

  it("stays held when another person is signed in on the device", async () => {
    const given = await supplyBench();
    const check = await checkOf(given.unit, "No bridges under the lens");
    const madeBy = given.builder.viewer.userId;
    expect(await refusal(send(given.maintainer, check.id, { record: conforms, madeBy }))).toMatchObject({
      code: "signed-out",
    });
  });
});

describe("two builders at once", () => {
  it("are both kept in order of arrival, the later one counts and is told of the other", async () => {
    const given = await supplyBench();
    const { project, builder } = given;
    const other = await makeViewer({ name: "Nils" });
    await db.insert(memberships).values({ projectId: project.id, userId: other.userId, role: "builder" });
    const nils = await scopeFor(other, project);
    const check = await pastTheHold(given);
    const [a, b] = await Promise.all([
      must(send(builder, check.id, { record: { typed: "5.01" } })),
      must(send(nils, check.id, { record: { typed: "5.61" } })),
    ]);
    const [first, second] = a.arrival < b.arrival ? [a, b] : [b, a];
    expect(first.overtook).toBeNull();
    expect(second.overtook).toMatchObject({ by: second === b ? "Bram" : "Nils" });
    expect(second.overtook?.summary.replace("\u202f", " ")).toBe(first === a ? "5.01 V" : "5.61 V");
    const kept = await db.select().from(attempts).where(eq(attempts.checkId, check.id)).orderBy(attempts.arrival);
    expect(kept.map((row) => row.id)).toEqual([first.attemptId, second.attemptId]);
    expect(await stateOf(given.unit, "5 V rail, no load")).toBe(second.state);
  });

  it("are told of an attempt that arrived since the client last looked", async () => {
    const given = await supplyBench();
    const check = await checkOf(given.unit, "No bridges under the lens");
    const seen = await must(send(given.maintainer, check.id, { record: conforms }));
    const again = await must(send(given.builder, check.id, { record: conforms, seenArrival: seen.arrival - 1 }));
    expect(again.overtook).toMatchObject({ by: "Mira", summary: "conforms" });
  });

  it("leave every check of a unit in a true state when twenty record at the same time", async () => {
    const project = await makeProject();
    const checks = Array.from({ length: 10 }, (_, n) => ({ title: `Check ${n}`, holdPoint: n === 0 }));
    const board = await makeBoard(project, "TIM", checks);
    const unit = await makeUnit(project.scopes.maintainer, board, "TIM-01");
    await state(project.scopes.builder, unit, "Check 0", conforms);
    await Promise.all(
      Array.from({ length: 20 }, (_, n) => state(project.scopes.builder, unit, `Check ${n % 10}`, conforms)),
    );
    expect(await statesOf(unit)).toBe(Array.from({ length: 10 }, () => "passed").join(" "));
  });
});
