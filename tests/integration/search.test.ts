import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { logEntries } from "@/db/schema/evidence";
import { searchProject } from "@/lib/search/search-project";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

async function library() {
  const project = await makeProject();
  const scope = project.scopes.maintainer;
  const covers = { signals: ["PH7"], pins: ["J1 a4"], rails: ["+5 V"] };
  const board = await makeBoard(project, "CON", [
    { title: "Carry into bit 8", stage: "function", instruction: "Slow clock first.", covers },
    { title: "Reset", stage: "function", covers: { signals: ["PH7"] } },
  ]);
  await makeUnit(scope, board, "CON-01");
  await db.insert(logEntries).values({
    id: randomUUID(),
    projectId: project.id,
    title: "Evening with the carry",
    body: "It was 100% a cut track.",
  });
  const find = async (q: string) => {
    const answer = await searchProject(scope, { project: project.slug, q });
    if (!answer.ok) throw new Error(answer.error.message);
    return answer.value.hits;
  };
  return { project, find };
}

describe("a search across a project", () => {
  test("finds boards, units, checks, what checks cover, and the log", async () => {
    const { find } = await library();
    expect((await find("con")).map((hit) => hit.kind)).toContain("board");
    expect((await find("con-01")).map((hit) => hit.kind)).toContain("unit");
    expect((await find("carry")).map((hit) => hit.kind)).toEqual(["check", "log"]);
    expect((await find("j1 a4")).map(({ kind, title }) => [kind, title])).toEqual([["signal", "J1 a4"]]);
  });

  test("says of a signal how many checks prove it, and leads to the first", async () => {
    const { project, find } = await library();
    const [hit] = await find("PH7");
    expect(hit).toMatchObject({ kind: "signal", title: "PH7", detail: "Signal, 2 checks on CON-01" });
    expect(hit?.href).toMatch(new RegExp(`^/projects/${project.slug}/units/CON-01\\?check=`));
  });

  test("wants every word, in any order, whatever the case", async () => {
    const { find } = await library();
    expect((await find("SLOW carry")).map((hit) => hit.title)).toEqual(["Carry into bit 8"]);
    expect(await find("carry absent")).toEqual([]);
  });

  test.each(["%", "_", "\\", "100%x", "'; drop table boards; --", "\u0000", "🛠", "   "])(
    "takes “%s” as characters, not as a pattern",
    async (q) => {
      const { find } = await library();
      const hits = await find(q);
      expect(hits.every((hit) => hit.kind === "log")).toBe(true);
    },
  );

  test("finds a per cent sign where one stands", async () => {
    const { find } = await library();
    expect((await find("100%")).map((hit) => hit.kind)).toEqual(["log"]);
  });

  test("sees nothing of another project", async () => {
    const { find } = await library();
    const other = await makeProject();
    const board = await makeBoard(other, "SECRET", [{ title: "Hidden carry" }]);
    await makeUnit(other.scopes.maintainer, board, "SECRET-01");
    expect(await find("secret")).toEqual([]);
    expect((await find("hidden")).length).toBe(0);
  });
});
