import { randomUUID } from "node:crypto";
import { and, eq, isNull } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { attempts, checkPrerequisites, checks, concessions } from "@/db/schema/travelers";
import type { Answer } from "@/lib/actions/answer";
import { recomputeAll } from "@/lib/check/recompute-all";
import { moveTraveler } from "@/lib/traveler/move-traveler";
import { conforms, fails, send } from "../support/bench";
import { useDatabase } from "../support/database";
import { concede, lift, reopen, tie, untie, voiding, withdraw } from "../support/decisions";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { rework } from "../support/reworks";

const db = useDatabase();

/** Small and the same on every machine: mulberry32. */
function dice(seed: number) {
  let a = seed;
  const next = () => {
    a = (a + 0x6d2b79f5) | 0;
    let t = Math.imul(a ^ (a >>> 15), 1 | a);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  const pick = <Item>(items: readonly Item[]): Item | undefined => items[Math.floor(next() * items.length)];
  return { next, pick };
}

const title = (n: number) => `Check ${n}`;
const version = (from: number) =>
  Array.from({ length: 6 }, (_, n) => ({
    title: title(n + from),
    holdPoint: n % 3 === 1,
    covers: { signals: [`D${(n + from) % 4}`] },
    needs: n > 3 ? [title(n + from - 2)] : [],
  }));

async function machine() {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const made = [];
  for (const code of ["PSU", "TIM", "SUM"]) {
    const board = await makeBoard(project, code, version(0));
    made.push({ board, unit: await makeUnit(maintainer, board, `${code}-01`), number: 1, newest: 1 });
  }
  return { project, maintainer, builder, made };
}

describe("whatever people do, in whatever order", () => {
  it.each([1, 2, 3])("the recorded states are those that history gives (walk %i)", async (seed) => {
    const { project, maintainer, builder, made } = await machine();
    const { next, pick } = dice(seed);
    const live = () =>
      db
        .select({ id: checks.id, state: checks.state })
        .from(checks)
        .where(and(eq(checks.projectId, project.id), isNull(checks.retiredAt)));
    const done = new Map<string, number>();

    const acts: Record<string, () => Promise<Answer<unknown> | undefined>> = {
      record: async () => {
        const check = pick(await live());
        return check && send(builder, check.id, { record: next() < 0.7 ? conforms : fails, note: "Seen." });
      },
      void: async () => {
        const attempt = pick(
          await db.select({ id: attempts.id }).from(attempts).where(eq(attempts.projectId, project.id)),
        );
        return attempt && voiding(maintainer, attempt.id);
      },
      reopen: async () => {
        const check = pick((await live()).filter(({ state }) => state === "passed" || state === "failed"));
        return check && reopen(maintainer, check.id);
      },
      concede: async () => {
        const check = pick((await live()).filter(({ state }) => state === "failed"));
        return check && concede(maintainer, check.id);
      },
      withdraw: async () => {
        const standing = await db
          .select({ id: concessions.id })
          .from(concessions)
          .innerJoin(checks, eq(checks.id, concessions.checkId))
          .where(and(eq(checks.projectId, project.id), isNull(concessions.withdrawnAt)));
        const concession = pick(standing);
        return concession && withdraw(maintainer, concession.id);
      },
      lift: async () => {
        const check = pick(await live());
        return check && next() < 0.3 ? lift(maintainer, check.id) : undefined;
      },
      tie: async () => {
        const [check, needs] = [pick(await live()), pick(await live())];
        return check && needs && tie(maintainer, check.id, needs.id);
      },
      untie: async () => {
        const edges = await db
          .select({ edge: checkPrerequisites })
          .from(checkPrerequisites)
          .innerJoin(checks, eq(checks.id, checkPrerequisites.checkId))
          .where(eq(checks.projectId, project.id));
        const edge = pick(edges)?.edge;
        return edge && untie(maintainer, edge.checkId, edge.needsCheckId);
      },
      rework: async () => {
        const [one, line, check] = [pick(made), pick([0, 1, 2, 3]), pick(await live())];
        if (!one || line === undefined || !check) return undefined;
        const spared = next() < 0.3 ? [{ checkId: check.id, reason: "Measured just now." }] : [];
        const added = next() < 0.2 ? [{ checkId: check.id, reason: "The iron was there." }] : [];
        return rework(builder, one.unit, { signals: [`D${line}`], spared, added });
      },
      move: async () => {
        const one = pick(made);
        if (!one || next() > 0.3) return undefined;
        one.newest += 1;
        await one.board.issue(one.newest, version(one.newest % 2));
        const input = {
          project: project.slug,
          writeId: randomUUID(),
          unit: one.unit.serial,
          from: one.number,
          to: one.newest,
        };
        const moved = await moveTraveler(maintainer, input);
        if (moved.ok) one.number = one.newest;
        return moved;
      },
    };
    const order = [
      "record",
      "record",
      "record",
      "record",
      "record",
      "void",
      "reopen",
      "concede",
      "withdraw",
      "lift",
      "tie",
      "untie",
      "rework",
      "move",
    ];

    for (let step = 0; step < 200; step += 1) {
      const name = pick(order) ?? "record";
      const answer = await acts[name]?.();
      if (answer?.ok) done.set(name, (done.get(name) ?? 0) + 1);
      expect(await recomputeAll(db, project.id), `after step ${step}, ${name}`).toEqual([]);
    }
    expect(done.get("record")).toBeGreaterThan(5);
    expect(done.get("rework")).toBeGreaterThan(0);
    expect([...done.keys()].length).toBeGreaterThan(5);
  });
});
