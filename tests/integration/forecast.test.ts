import { randomUUID } from "node:crypto";
import { describe, expect, it } from "vitest";
import { findWorkHistory, SESSION_GAP_S } from "@/db/queries/work-history";
import { loadProjectWeek } from "@/lib/digest/project-week";
import { writePreview } from "@/lib/digest/load-preview";
import { forecastWork } from "@/lib/forecast/forecast-work";
import { loadRack } from "@/lib/rack/load-rack";
import { checkOf, conforms, must, send } from "../support/bench";
import { useDatabase } from "../support/database";
import { reopen, voiding } from "../support/decisions";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

const DAY = 86_400_000;
const TITLES = Array.from({ length: 40 }, (_, index) => `Check ${index + 1}`);

/** One card of forty checks; each attempt passes, so many days ago. */
async function machine(daysAgo: readonly number[]) {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const unit = await makeUnit(
    maintainer,
    await makeBoard(
      project,
      "SUM",
      TITLES.map((title) => ({ title, stage: "function" as const })),
    ),
    "SUM-01",
  );
  const record = async (title: string, ago: number) => {
    const { id: checkId } = await checkOf(unit, title);
    const id = randomUUID();
    const performedAt = new Date(Date.now() - ago * DAY).toISOString();
    await must(send(builder, checkId, { id, performedAt, record: conforms }));
    return { id, checkId };
  };
  const recorded = [];
  for (const [index, ago] of daysAgo.entries()) recorded.push(await record(TITLES[index] ?? "", ago));
  return { project, maintainer, builder, recorded };
}

describe("the forecast on the rack", () => {
  it("is not made from less than three weeks, and says how many there are", async () => {
    const { builder } = await machine([15.5, 8, 1]);
    expect((await loadRack(builder)).outlook).toMatchObject({
      kind: "not enough history",
      line: "Not enough history: 2 of 3 weeks.",
    });
  });

  it("names two dates and the evenings from what the weeks brought, the same at every look", async () => {
    const { builder } = await machine([34, 33, 27, 26, 20, 19, 13, 12, 6, 5]);
    const outlook = (await loadRack(builder)).outlook;
    expect(outlook?.line).toMatch(
      /^About \d+ evenings left: 50 % by \w{3} \d+ \w{3} \d{4}, 85 % by \w{3} \d+ \w{3} \d{4}\.$/,
    );
    expect((await loadRack(builder)).outlook).toEqual(outlook);
  });

  it("stands in the weekly e-mail, too", async () => {
    const { maintainer } = await machine([34, 27, 20, 13, 6]);
    expect((await writePreview(maintainer))?.text).toMatch(/When will it run\? About \d+ evenings? left: 50 % by/);
  });
});

describe("the history of the work", () => {
  it("leaves voided attempts out, and has what was taken back beside what was gained", async () => {
    const { project, maintainer, builder, recorded } = await machine([10, 9, 8]);
    const [first, second] = recorded;
    await must(voiding(maintainer, first?.id ?? ""));
    await must(reopen(maintainer, second?.checkId ?? ""));
    const { turns } = await findWorkHistory(db, builder);
    expect(turns.map(([, , what]) => what)).toEqual(["conforms", "conforms", "reopened"]);
    expect((await loadProjectWeek(project.id, { since: new Date(0), until: new Date() }))?.history.turns).toEqual(
      turns,
    );
  });

  it("makes one visit of attempts that lie close together, and two where the gap is longer", async () => {
    const gap = SESSION_GAP_S / 86_400;
    const { builder } = await machine([3 + gap * 1.5, 3 + gap * 0.4, 3]);
    const { visits } = await findWorkHistory(db, builder);
    expect(visits.map(([who, start, end]) => [who, Math.round((end - start) / 60_000)])).toEqual([
      [builder.viewer.userId, 0],
      [builder.viewer.userId, 36],
    ]);
  });

  it("is told in one answer that forecasts the same as every attempt taken alone", async () => {
    const { project, builder } = await machine([34, 27, 20, 13, 6]);
    const history = await findWorkHistory(db, builder);
    expect(history.turns).toHaveLength(5);
    const found = forecastWork({ projectId: project.id, history, remaining: 35, now: new Date() });
    expect(found).toMatchObject({ kind: "forecast", perWeek: 1 });
  });
});
