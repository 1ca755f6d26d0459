import { describe, expect, it } from "vitest";
import { acceptFinding as acceptAction } from "@/app/(workshop)/projects/[project]/wiring/findings/actions";
import { loadProjectWeek } from "@/lib/digest/project-week";
import { wiringLines } from "@/lib/digest/wiring-lines";
import { acceptFinding } from "@/lib/finding/accept-finding";
import { loadFindings } from "@/lib/finding/load-findings";
import { withdrawAcceptance } from "@/lib/finding/withdraw-acceptance";
import { loadPlaceCounts } from "@/lib/rack/load-place-counts";
import { loadRack } from "@/lib/rack/load-rack";
import { rackSentence } from "@/lib/rack/rack-sentence";
import { must, refusal } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { withTwoDrivers, type WiredProject } from "../support/wired-project";

useDatabase();

const RULE = "two-push-pull";
const found = async (project: WiredProject) => {
  const { findings } = await loadFindings(project.scopes.collaborator);
  return one(findings.filter(({ rule }) => rule === RULE));
};

async function accepted(reason = "One of them is a jumper that stays open.") {
  const project = await withTwoDrivers();
  const { key, facts } = await found(project);
  await must(acceptFinding(project.scopes.maintainer, { ...project.write(), key, facts, reason }));
  return { project, key, facts };
}

describe("a finding of the rule check", () => {
  it("names its pins where they stand in the machine, why it matters and how to mend it", async () => {
    const finding = await found(await withTwoDrivers());
    expect(finding).toMatchObject({ weight: "must", accepted: null });
    expect(finding.title).toContain("PH6");
    expect(finding.pins.map(({ board, connector, pin }) => `${board}.${connector} ${pin}`)).toEqual(
      expect.arrayContaining(["TIM.J1 a10", "CON.J1 a10"]),
    );
    expect(finding.why.length * finding.mend.length).toBeGreaterThan(0);
  });

  it("counts on the rack: on each card it names, once in all", async () => {
    const project = await withTwoDrivers();
    const { builder } = project.scopes;
    const open = (await loadFindings(builder)).findings.filter(({ weight }) => weight === "must");
    const rack = await loadRack(builder);
    expect(rack.toMend).toBe(open.length);
    expect((await loadPlaceCounts(builder)).toMend).toBe(open.length);
    for (const board of rack.boards) {
      expect([board.code, board.toMend]).toEqual([
        board.code,
        open.filter(({ boards }) => boards.includes(board.code)).length,
      ]);
    }
    expect(rackSentence(rack)).toContain("in the wiring must be mended.");
  });

  it("is counted in the weekly mail, and named in the one after it was found", async () => {
    const project = await withTwoDrivers();
    const { title } = await found(project);
    const now = Date.now();
    const [lastWeek, thisWeek] = [
      { since: new Date(now - 1_209_600_000), until: new Date(now - 604_800_000) },
      { since: new Date(now - 604_800_000), until: new Date(now + 60_000) },
    ];
    const week = await loadProjectWeek(project.id, thisWeek);
    if (!week) throw new Error("no week");
    expect(wiringLines(week, thisWeek)?.fresh).toContain(title);
    expect(wiringLines(week, thisWeek)?.sentence).toMatch(/open in the wiring: \d+ must be mended/);
    expect(wiringLines(week, lastWeek)).toMatchObject({
      fresh: [],
      sentence: expect.stringContaining("None of them is new."),
    });
  });

  it("goes by itself when the pins are mended", async () => {
    const project = await withTwoDrivers();
    await project.wire("CON.J1", [{ pin: "a10", signal: "PH6", role: "input", family: "HC" }]);
    expect(await project.findings(RULE)).toEqual([]);
  });
});

describe("an acceptance", () => {
  it("has a name, a time and a reason, and no longer counts as open", async () => {
    const { project } = await accepted();
    const finding = await found(project);
    expect(finding.accepted).toMatchObject({ by: "Mira", reason: "One of them is a jumper that stays open." });
    const open = (await loadFindings(project.scopes.builder)).findings.filter((one) => !one.accepted);
    const must = open.filter(({ weight }) => weight === "must");
    expect((await loadPlaceCounts(project.scopes.builder)).toMend).toBe(must.length);
  });

  it("is a maintainer's to give: a builder is refused, and the finding stays open", async () => {
    const project = await withTwoDrivers();
    const { key, facts } = await found(project);
    const input = { ...project.write(), key, facts, reason: "It is fine." };
    for (const viewer of [project.viewers.builder, project.viewers.collaborator]) {
      expect(await acceptAction.as(viewer, input)).toMatchObject({ ok: false, error: { code: "forbidden" } });
    }
    expect((await found(project)).accepted).toBeNull();
    expect(await acceptAction.as(project.viewers.maintainer, input)).toMatchObject({ ok: true });
  });

  it("wants a reason", async () => {
    const project = await withTwoDrivers();
    const { key, facts } = await found(project);
    const input = { ...project.write(), key, facts, reason: "  " };
    expect(await acceptAction.as(project.viewers.maintainer, input)).toMatchObject({
      ok: false,
      error: { fields: { reason: "Say why it may stay as it is." } },
    });
  });

  it("survives a change elsewhere and every run of the check after it", async () => {
    const { project } = await accepted();
    await project.wire("CON.J1", [{ pin: "a11", signal: "PH7", role: "input", family: "HC", loads: 3 }]);
    await project.wire("TIM.J1", [{ pin: "b20", signal: "SPARE", role: "passive" }]);
    expect((await found(project)).accepted).not.toBeNull();
  });

  it("ends when the facts of the finding change", async () => {
    const { project, facts } = await accepted();
    await project.wire("CON.J1", [{ pin: "a10", signal: "PH6", role: "push-pull output", family: "LS" }]);
    const finding = await found(project);
    expect(finding.facts).not.toBe(facts);
    expect(finding.accepted).toBeNull();
  });

  it("does not come back with the finding after it was mended and broken again", async () => {
    const { project } = await accepted();
    const drives = { pin: "a10", signal: "PH6", role: "push-pull output", family: "HC" };
    await project.wire("CON.J1", [{ ...drives, role: "input" }]);
    await project.wire("CON.J1", [drives]);
    expect((await found(project)).accepted).toBeNull();
  });

  it("is for the facts that were looked at, not for those that came meanwhile", async () => {
    const project = await withTwoDrivers();
    const { key, facts } = await found(project);
    await project.wire("CON.J1", [{ pin: "a10", signal: "PH6", role: "push-pull output", family: "LS" }]);
    const answer = acceptFinding(project.scopes.maintainer, { ...project.write(), key, facts, reason: "It is fine." });
    expect(await refusal(answer)).toMatchObject({ code: "conflict", message: expect.stringContaining("Look again") });
  });

  it("is given once: a second one is told, a repeated request gets the first answer", async () => {
    const project = await withTwoDrivers();
    const { key, facts, title } = await found(project);
    const input = { ...project.write(), key, facts, reason: "It is fine." };
    const { maintainer } = project.scopes;
    expect(await must(acceptFinding(maintainer, input))).toEqual({ title });
    expect(await must(acceptFinding(maintainer, input))).toEqual({ title });
    expect(await refusal(acceptFinding(maintainer, { ...input, ...project.write() }))).toMatchObject({
      code: "conflict",
    });
  });

  it("can be taken back, and the finding is open again", async () => {
    const { project, key } = await accepted();
    const take = { ...project.write(), key, reason: "The jumper is gone." };
    await must(withdrawAcceptance(project.scopes.maintainer, take));
    expect((await found(project)).accepted).toBeNull();
    const again = withdrawAcceptance(project.scopes.maintainer, { ...take, ...project.write() });
    expect(await refusal(again)).toMatchObject({ code: "conflict" });
  });

  it("of a finding in another project is not found", async () => {
    const [project, other] = [await withTwoDrivers(), await withTwoDrivers()];
    const { key, facts } = await found(project);
    await must(acceptFinding(other.scopes.maintainer, { ...other.write(), key, facts, reason: "Theirs." }));
    expect((await found(project)).accepted).toBeNull();
  });
});
