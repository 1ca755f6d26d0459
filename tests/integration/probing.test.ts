import { randomUUID } from "node:crypto";
import { describe, expect, it } from "vitest";
import { database } from "@/db/client";
import { eq } from "drizzle-orm";
import { probeResults } from "@/db/schema/netlists";
import { attempts } from "@/db/schema/travelers";
import { askAgain } from "@/lib/probing/ask-again";
import { closeRound } from "@/lib/probing/close-round";
import { loadRound } from "@/lib/probing/load-round";
import { loadRoundPage } from "@/lib/probing/load-round-page";
import { startRound } from "@/lib/probing/start-round";
import { checkOf, must, refusal, stateOf } from "../support/bench";
import { keep, roundInput, said, say, startedRound } from "../support/probing";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const CHECK = "No opens, no shorts";

async function bench() {
  const project = await makeProject<"maintainer" | "builder">({ roles: ["maintainer", "builder"] });
  const board = await makeBoard(project, "CON", [{ title: CHECK, stage: "continuity" }]);
  const unit = await makeUnit(project.scopes.maintainer, board, "CON-01");
  const { maintainer, builder } = project.scopes;
  const { id: plan } = await startedRound(builder, unit.serial, board.revisionId);
  const round = async () => {
    const view = await loadRound(builder, plan);
    if (!view) throw new Error("no round");
    return view;
  };
  return { board, unit, builder, maintainer, plan, round };
}

/** Every probe is answered as a board says whose pins are joined as given. */
async function probeAll(at: Awaited<ReturnType<typeof bench>>, isJoined: (a: string, b: string) => boolean) {
  const { probes, points, results } = await at.round();
  const done = new Set(results.map(({ probe }) => probe));
  const name = (point: number) => points[point]?.name ?? "";
  const answers = probes.flatMap(({ a, b }, number) =>
    done.has(number) ? [] : [said(number, isJoined(name(a), name(b)))],
  );
  await must(say(at.builder, at.plan, answers));
}

const pinOf = (name: string) => name.slice(name.indexOf("-") + 1);
const sound = (a: string, b: string) => pinOf(a) === pinOf(b);

const closing = (at: Awaited<ReturnType<typeof bench>>, checkId: string | null) => ({
  ...{ project: at.builder.slug, writeId: randomUUID(), attemptId: randomUUID(), plan: at.plan, checkId, note: "" },
});

describe("A round of probing", () => {
  it("probes two pairs for a net of three points and keeps its netlist when a newer one is taken", async () => {
    const at = await bench();
    expect((await at.round()).figures.counts.continuity).toBe(12);
    await keep(at.builder, at.board.revisionId, "A,J1,1\nA,J2,1");
    expect(await at.round()).toMatchObject({ netlist: { number: 1 }, figures: { counts: { continuity: 12 } } });
  });

  it("only one connector, only some signals and only rails are less than the whole board", async () => {
    const { builder, board, unit, round } = await bench();
    const { id } = await keep(builder, board.revisionId);
    const { id: some } = await must(
      startRound(builder, roundInput(builder, unit.serial, id, { only: "signals", signals: ["B"] })),
    );
    expect((await loadRound(builder, some))?.figures.counts.continuity).toBe(2);
    expect((await round()).figures.counts.continuity).toBe(12);
    const none = await refusal(startRound(builder, roundInput(builder, unit.serial, id, { only: "rails" })));
    expect(none.message).toMatch(/^There is nothing to probe/);
  });

  it("an answer that is sent twice counts once, and one that is taken back is kept as void", async () => {
    const at = await bench();
    const slip = said(0, false);
    await must(say(at.builder, at.plan, [slip]));
    await must(say(at.builder, at.plan, [slip]));
    const now = await must(say(at.builder, at.plan, [said(0, true)], [slip.id]));
    expect(now.results.map(({ probe, beeps }) => [probe, beeps])).toEqual([[0, true]]);
    const rows = await database().select().from(probeResults).where(eq(probeResults.planId, at.plan));
    expect(rows).toHaveLength(2);
    expect(rows.find(({ id }) => id === slip.id)?.voidedBy).toBe(at.builder.viewer.userId);
  });

  it("two people on different halves see each other's answers", async () => {
    const at = await bench();
    await must(say(at.builder, at.plan, [said(0, true)]));
    const seen = await must(say(at.maintainer, at.plan, [said(11, true)]));
    expect(seen.results.map(({ probe }) => probe)).toEqual([0, 11]);
  });

  it("a typed resistance is read with its prefix, an overload of the meter is silence, and nonsense is refused", async () => {
    const at = await bench();
    const { results } = await must(say(at.builder, at.plan, [said(0, "0R3"), said(1, "4k7"), said(2, "OL")]));
    expect(results.map(({ ohm, beeps }) => ohm ?? beeps)).toEqual([0.3, 4700, false]);
    expect((await refusal(say(at.builder, at.plan, [said(3, "loud")]))).message).toMatch(/Nothing was kept\.$/);
    expect((await refusal(say(at.builder, at.plan, [said(10_000, true)]))).code).toBe("invalid");
  });

  it("that finds nothing becomes an attempt that conforms", async () => {
    const at = await bench();
    await probeAll(at, sound);
    const check = await checkOf(at.unit, CHECK);
    const closed = await must(closeRound(at.builder, closing(at, check.id)));
    expect(closed).toMatchObject({ conforms: true, said: "everything as the netlist says" });
    expect(await stateOf(at.unit, CHECK)).toBe("passed");
    expect((await refusal(say(at.builder, at.plan, [said(0, false)]))).code).toBe("gone");
  });

  it("that is not finished never becomes an attempt that conforms", async () => {
    const at = await bench();
    await must(say(at.builder, at.plan, [said(0, true)]));
    const check = await checkOf(at.unit, CHECK);
    const input = closing(at, check.id);
    expect(await must(closeRound(at.builder, input))).toMatchObject({ conforms: false });
    expect(await must(closeRound(at.builder, input))).toMatchObject({ conforms: false });
    expect(await stateOf(at.unit, CHECK)).toBe("failed");
  });

  it("that two people close at once leaves one attempt", async () => {
    const at = await bench();
    await probeAll(at, sound);
    const check = await checkOf(at.unit, CHECK);
    const closed = await Promise.all(
      [at.builder, at.maintainer].map((scope) => closeRound(scope, closing(at, check.id))),
    );
    expect(closed.map(({ ok }) => ok).sort()).toEqual([false, true]);
    expect(closed.flatMap((one) => (one.ok ? [] : [one.error.code]))).toEqual(["gone"]);
    expect(await database().select().from(attempts).where(eq(attempts.checkId, check.id))).toHaveLength(1);
  });

  it("names the open net and its lost pin", async () => {
    const at = await bench();
    await probeAll(at, (a, b) => sound(a, b) && ![a, b].includes("U1-3"));
    const page = await loadRoundPage(at.builder, at.plan);
    expect(page?.report.findings).toMatchObject([{ kind: "open", nets: ["C"] }]);
    expect(page?.report.findings[0]?.pins).toContain("U1-3");
    expect(page?.conforms).toBe(false);
  });

  it("tells a crossed pair from two opens once the probes it asks for are made", async () => {
    const at = await bench();
    const wired = (name: string) => ({ "J2-1": "2", "J2-2": "1" })[name] ?? pinOf(name);
    const crossed = (a: string, b: string) => wired(a) === wired(b);
    await probeAll(at, crossed);
    const before = await loadRoundPage(at.builder, at.plan);
    if ((before?.followUps ?? 0) > 0) {
      await must(askAgain(at.builder, { project: at.builder.slug, writeId: randomUUID(), plan: at.plan }));
      await probeAll(at, crossed);
    }
    const page = await loadRoundPage(at.builder, at.plan);
    expect(page?.report.findings.map(({ kind, nets }) => [kind, [...nets].sort().join(" ")])).toEqual([
      ["crossed", "A B"],
    ]);
    expect(page?.followUps).toBe(0);
  });

  it("of a unit of another board cannot be planned from this netlist", async () => {
    const { builder, maintainer, board } = await bench();
    const { id } = await keep(builder, board.revisionId);
    const other = await bench();
    const stranger = await refusal(startRound(other.builder, roundInput(other.builder, "CON-01", id)));
    expect(stranger.code).toBe("not-found");
    expect(await loadRound(maintainer, other.plan)).toBeUndefined();
  });
});
