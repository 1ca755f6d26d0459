import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { boards } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import type { ProjectScope } from "@/lib/access/scope";
import { loadBoardOrder } from "@/lib/order/load-board-order";
import { loadTonight } from "@/lib/order/load-tonight";
import { loadWaits } from "@/lib/order/load-waits";
import { sayBoardOrder } from "@/lib/order/say-board-order";
import { withdrawBoardOrder } from "@/lib/order/withdraw-board-order";
import { checkOf, must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { tie } from "../support/decisions";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { makeWiredProject } from "../support/wired-project";

const db = useDatabase();

const fresh = (scope: ProjectScope) => ({ project: scope.slug, writeId: randomUUID() });

/** TIM drives CLK into CON over the backplane. */
async function wired() {
  const { wire, ...project } = await makeWiredProject();
  await wire("TIM.J1", [{ pin: "a5", signal: "CLK", role: "push-pull output", family: "HC" }]);
  await wire("CON.J1", [{ pin: "a5", signal: "CLK", role: "input", family: "HC" }]);
  for (const place of ["BP.X1", "BP.X2"] as const) await wire(place, [{ pin: "a5", signal: "CLK", role: "passive" }]);
  const rows = await db.select().from(boards).where(eq(boards.projectId, project.id));
  const id = (code: string) => rows.find((row) => row.code === code)?.id ?? "";
  const { maintainer } = project.scopes;
  const say = (board: string, rule: "needs" | "despite", other: string, reason = "") =>
    sayBoardOrder(maintainer, { ...fresh(maintainer), boardId: id(board), otherId: id(other), rule, reason });
  const codes = async () => (await loadBoardOrder(maintainer)).steps.map(({ board }) => board);
  const told = (kind: string) =>
    db
      .select()
      .from(events)
      .where(and(eq(events.projectId, project.id), eq(events.kind, kind)));
  return { maintainer, say, codes, told };
}

describe("the order of the boards", () => {
  it("puts what drives before what is driven, with the reason, and draws it", async () => {
    const { maintainer, codes } = await wired();
    expect(await codes()).toEqual(["BP", "TIM", "CON"]);
    const { steps, drawing } = await loadBoardOrder(maintainer);
    expect(steps[2]?.reason).toContain("TIM drives CLK into CON");
    expect(drawing.boxes.find(({ isNext }) => isNext)?.id).toBe("BP");
    expect(drawing.arrows.map(({ from, to }) => `${from} ${to}`)).toContain("TIM CON");
  });

  it("gives way to a reason, says what it goes against, and comes back when that is withdrawn", async () => {
    const { maintainer, say, codes, told } = await wired();
    const { id } = await must(say("CON", "despite", "TIM", "The bench gives its clock."));
    expect((await codes()).indexOf("CON")).toBeLessThan((await codes()).indexOf("TIM"));
    const view = await loadBoardOrder(maintainer);
    expect(view.remarks.join(" ")).toContain("TIM drives CLK into CON");
    expect(view.said).toMatchObject([{ words: "CON may come before TIM", reason: "The bench gives its clock." }]);
    await must(withdrawBoardOrder(maintainer, { ...fresh(maintainer), id }));
    expect(await codes()).toEqual(["BP", "TIM", "CON"]);
    expect(await told("order.said")).toHaveLength(1);
    expect(await told("order.withdrawn")).toHaveLength(1);
    expect(await refusal(withdrawBoardOrder(maintainer, { ...fresh(maintainer), id }))).toMatchObject({
      code: "not-found",
    });
  });

  it("sets nothing aside that the machine does not say", async () => {
    const { say } = await wired();
    expect(await refusal(say("TIM", "despite", "CON", "Because."))).toMatchObject({
      code: "invalid",
      fields: { otherId: expect.stringContaining("nothing to set aside") },
    });
  });

  it("never goes round in a circle: the refusal names the members and keeps nothing", async () => {
    const { maintainer, say, told } = await wired();
    await must(say("TIM", "needs", "BP"));
    await must(say("CON", "needs", "TIM"));
    const refused = await refusal(say("BP", "needs", "CON"));
    expect(refused.code).toBe("conflict");
    for (const code of ["BP", "TIM", "CON"]) expect(refused.message).toContain(code);
    expect((await loadBoardOrder(maintainer)).said).toHaveLength(2);
    expect(await told("order.said")).toHaveLength(2);
    expect(await refusal(say("CON", "needs", "TIM"))).toMatchObject({ code: "conflict" });
  });

  it("takes no board of another project", async () => {
    const [mine, theirs] = [await wired(), await wired()];
    const other = (await loadBoardOrder(theirs.maintainer)).boards[0]?.id ?? "";
    const own = (await loadBoardOrder(mine.maintainer)).boards[0]?.id ?? "";
    const input = { ...fresh(mine.maintainer), boardId: own, otherId: other, rule: "needs" as const, reason: "" };
    expect(await refusal(sayBoardOrder(mine.maintainer, input))).toMatchObject({ code: "not-found" });
  });
});

async function machine() {
  const project = await makeProject();
  const { maintainer } = project.scopes;
  const sup = await makeUnit(maintainer, await makeBoard(project, "SUP", [{ title: "Rails" }]), "SUP-01");
  const board = await makeBoard(project, "TIM", [
    { title: "Joints", stage: "inspection", holdPoint: true },
    { title: "Clock", stage: "function" },
    { title: "Reset", stage: "function" },
  ]);
  const tim = await makeUnit(maintainer, board, "TIM-01");
  const [rails, clock] = [await checkOf(sup, "Rails"), await checkOf(tim, "Clock")];
  await must(tie(maintainer, clock.id, rails.id));
  return { maintainer, rails, clock };
}

describe("an evening at the bench", () => {
  const titles = (list: readonly { title: string }[] | undefined) => list?.map(({ title }) => title);

  it("begins with what lets most go, and says why", async () => {
    const { maintainer } = await machine();
    const { view } = await loadTonight(maintainer, { time: "45 minutes", builders: 1 });
    expect(titles(view.now)).toEqual(["Joints", "Rails"]);
    expect(view.now[0]?.reason).toContain("2 checks of TIM-01");
  });

  it("holds as much as the time holds, and never a check before what it waits for", async () => {
    const { maintainer } = await machine();
    const { view: short } = await loadTonight(maintainer, { time: "10 min", builders: 1 });
    expect(titles(short.plan?.lists[0])).toEqual(["Joints", "Rails"]);
    const { view: long } = await loadTonight(maintainer, { time: "1 h", builders: 1 });
    const all = titles(long.plan?.lists[0]) ?? [];
    expect(all).toHaveLength(4);
    expect(all.indexOf("Clock")).toBeGreaterThan(all.indexOf("Rails"));
  });

  it("gives two builders a list each", async () => {
    const { maintainer } = await machine();
    const { view } = await loadTonight(maintainer, { time: "10 min", builders: 2 });
    expect(view.plan?.lists.map((list) => list[0]?.title)).toEqual(["Joints", "Rails"]);
  });

  it("is not planned for a time that nobody can read, and says how to write it", async () => {
    const { maintainer } = await machine();
    const { view } = await loadTonight(maintainer, { time: "a while", builders: 1 });
    expect(view.plan).toBeNull();
    expect(view.timeError).toContain("45 minutes");
    expect(view.now).toHaveLength(2);
  });
});

describe("the prerequisites of a project", () => {
  it("are listed and drawn, each with both ends", async () => {
    const { maintainer, rails, clock } = await machine();
    const { waits, drawing, holdPoints } = await loadWaits(maintainer);
    expect(waits.map(({ check, needs }) => [check.checkId, needs.checkId])).toEqual([[clock.id, rails.id]]);
    expect(holdPoints).toBe(1);
    const [from, to] = [rails.id, clock.id].map((id) => drawing.boxes.find((box) => box.id === id));
    expect((from?.x ?? 0) + (from?.width ?? 0)).toBeLessThan(to?.x ?? 0);
    expect(drawing.lines).toMatchObject([{ from: rails.id, to: clock.id, path: expect.stringMatching(/^M/) }]);
  });
});
