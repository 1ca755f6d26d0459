import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { benchSessions } from "@/db/schema/order";
import type { ProjectScope } from "@/lib/access/scope";
import { isAtBench } from "@/lib/bench-session/is-at-bench";
import { loadBenchSessions } from "@/lib/bench-session/load-bench-sessions";
import { startBenchSession } from "@/lib/bench-session/start-bench-session";
import { stopBenchSession } from "@/lib/bench-session/stop-bench-session";
import { checkOf, conforms, must, refusal, send } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

const MINUTE = 60_000;
const fresh = (scope: ProjectScope) => ({ project: scope.slug, writeId: randomUUID() });
const START = Date.now();
const ago = (minutes: number) => new Date(START - minutes * MINUTE);

async function bench() {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const titles = ["One", "Two", "Three", "Four", "Five"];
  const board = await makeBoard(
    project,
    "SUM",
    titles.map((title) => ({ title, stage: "function" as const })),
  );
  const unit = await makeUnit(maintainer, board, "SUM-01");
  const record = async (title: string, minutesAgo: number, scope: ProjectScope = builder) => {
    const { id } = await checkOf(unit, title);
    await must(send(scope, id, { performedAt: ago(minutesAgo).toISOString(), record: conforms }));
  };
  const sitDown = (minutesAgo: number, endedAgo?: number) =>
    db.insert(benchSessions).values({
      ...{ projectId: project.id, userId: builder.viewer.userId, startedAt: ago(minutesAgo) },
      ...(endedAgo === undefined ? {} : { endedAt: ago(endedAgo) }),
    });
  const kept = () => db.select().from(benchSessions).where(eq(benchSessions.projectId, project.id));
  return { builder, maintainer, record, sitDown, kept };
}

describe("a session at the bench", () => {
  it("begins and ends by hand, once", async () => {
    const { builder, maintainer, kept } = await bench();
    await must(startBenchSession(builder, fresh(builder)));
    expect(await refusal(startBenchSession(builder, fresh(builder)))).toMatchObject({ code: "conflict" });
    expect((await loadBenchSessions(builder)).running).not.toBeNull();
    expect([await isAtBench(builder), await isAtBench(maintainer)]).toEqual([true, false]);
    expect(await must(stopBenchSession(builder, fresh(builder)))).toMatchObject({ endedBefore: false });
    expect(await refusal(stopBenchSession(builder, fresh(builder)))).toMatchObject({ code: "conflict" });
    expect(await kept()).toHaveLength(1);
    expect((await loadBenchSessions(builder)).running).toBeNull();
  });

  it("begins once though two devices start it at the same time", async () => {
    const { builder, kept } = await bench();
    const answers = await Promise.all([1, 2].map(() => startBenchSession(builder, fresh(builder))));
    expect(answers.filter(({ ok }) => ok)).toHaveLength(1);
    expect(await kept()).toHaveLength(1);
  });

  it("of one builder is not the other's to stop", async () => {
    const { builder, maintainer } = await bench();
    await must(startBenchSession(builder, fresh(builder)));
    expect(await refusal(stopBenchSession(maintainer, fresh(maintainer)))).toMatchObject({ code: "conflict" });
    expect((await loadBenchSessions(maintainer)).running).toBeNull();
  });

  it("that was forgotten ended with the last thing that was recorded, and does not stand in the way of the next", async () => {
    const { builder, record, sitDown, kept } = await bench();
    await sitDown(300);
    await record("One", 270);
    await record("Two", 240);
    expect((await loadBenchSessions(builder)).running).toBeNull();
    expect(await isAtBench(builder)).toBe(false);
    await must(startBenchSession(builder, fresh(builder)));
    const [old] = (await kept()).filter(({ endedAt }) => endedAt !== null);
    expect(((old?.endedAt?.getTime() ?? 0) - (old?.startedAt.getTime() ?? 0)) / MINUTE).toBeCloseTo(60, 0);
  });

  it("that ended by itself says so when it is stopped", async () => {
    const { builder, record, sitDown } = await bench();
    await sitDown(300);
    await record("One", 270);
    const stopped = await must(stopBenchSession(builder, fresh(builder)));
    expect(stopped.endedBefore).toBe(true);
    expect(stopped.seconds / 60).toBeCloseTo(30, 0);
  });

  it("is read from attempts where nobody started one: what was done, on which unit, for how long", async () => {
    const { builder, record } = await bench();
    await record("One", 3000);
    await record("Two", 2990);
    await record("Three", 60);
    const { sessions } = await loadBenchSessions(builder);
    expect(sessions.map(({ seconds, stages, units, typed }) => [Math.round(seconds), stages, units, typed])).toEqual([
      [0, "1 function", ["SUM-01"], false],
      [600, "2 function", ["SUM-01"], false],
    ]);
  });
});

describe("the pace", () => {
  it("is the median from attempt to attempt, one's own before everybody's, and none from too few", async () => {
    const { builder, maintainer, record } = await bench();
    for (const [title, minutes] of [
      ["One", 100],
      ["Two", 96],
      ["Three", 90],
      ["Four", 70],
    ] as const) {
      await record(title, minutes);
    }
    const own = await loadBenchSessions(builder);
    expect(own.paceLines.find(({ stage }) => stage === "function")).toMatchObject({ ownS: 360, everybodyS: 360 });
    expect(own.paces.inspection).toBeNull();
    const others = await loadBenchSessions(maintainer);
    expect(others.paceLines.find(({ stage }) => stage === "function")).toMatchObject({ ownS: null });
    expect(others.paces.function).toBe(360);
  });
});
