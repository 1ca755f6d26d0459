import type { CheckState } from "@/db/schema/travelers";
import { evidenceView } from "@/lib/attachment/evidence-view";
import { checkKind } from "@/lib/check-kinds/list";
import { findBlockers } from "@/lib/check/find-blockers";
import { attemptView } from "./attempt-view";
import { concessionView, decisionView, doubtView } from "./decision-view";
import { groupBy } from "./group-by";
import type { History } from "./load-history";
import type { BlockerView, CheckView } from "./traveler-view";

type CheckRow = History["checks"][number];

/** The checks of a traveler as they show, in its order; retired ones apart. */
export function buildCheckViews(serial: string, history: History): { live: CheckView[]; retired: CheckView[] } {
  const live = history.checks.filter(({ check }) => check.retiredAt === null);
  const retired = history.checks.filter(({ check }) => check.retiredAt !== null);
  const blockers = blockersOf(serial, live, history);
  const view = checkViewer(serial, history, blockers);
  return { live: live.map(view), retired: retired.map(view) };
}

function checkViewer(serial: string, history: History, blockers: ReadonlyMap<string, BlockerView[]>) {
  const readings = groupBy(history.readings, ({ reading }) => reading.attemptId);
  const evidence = groupBy(history.evidence, (row) => row.attemptId ?? row.checkId);
  const attempts = groupBy(history.attempts, ({ attempt }) => attempt.checkId);
  const needs = groupBy(history.prerequisites, (row) => row.waitingId);
  const wordings = new Map(history.checks.map(({ wording }) => [wording.id, wording]));
  return ({ check, wording }: CheckRow, index: number): CheckView => ({
    id: check.id,
    key: check.key,
    number: index + 1,
    stage: check.stage,
    title: wording.title,
    instruction: wording.instruction,
    caution: wording.caution,
    reference: wording.reference,
    holdPoint: check.holdPoint,
    kind: wording.kind,
    spec: wording.spec,
    expectation: checkKind(wording.kind).expectation(wording.spec),
    covers: wording.covers,
    state: check.state,
    stateReason: check.stateReason,
    stateSince: check.stateSince.toISOString(),
    insideGuardBand: check.insideGuardBand,
    blockers: blockers.get(check.id) ?? [],
    prerequisites: (needs.get(check.id) ?? []).map(({ id, serial, title, state }) => {
      return { checkId: id, serial, title, state, why: "prerequisite" };
    }),
    attempts: (attempts.get(check.id) ?? []).map((row) =>
      attemptView(row, {
        // An attempt is shown by the wording and limits it was judged against.
        wording: wordings.get(row.attempt.procedureCheckId) ?? wording,
        readings: (readings.get(row.attempt.id) ?? []).map(({ reading }) => reading),
        evidence: (evidence.get(row.attempt.id) ?? []).map(evidenceView),
      }),
    ),
    reopenings: history.reopenings.filter(({ row }) => row.checkId === check.id).map(decisionView),
    concessions: history.concessions.filter(({ row }) => row.checkId === check.id).map(concessionView),
    holdLifts: history.holdLifts.filter(({ row }) => row.checkId === check.id).map(decisionView),
    doubts: history.doubts.filter((row) => row.checkId === check.id).map((row) => doubtView(row, serial)),
    faults: history.faults
      .filter((row) => row.checkId === check.id)
      .map(({ number, title, state }) => ({ number, title, state })),
    evidence: (evidence.get(check.id) ?? []).map(evidenceView),
  });
}

/** From the cached states; those of needed checks on other units came with the prerequisites. */
function blockersOf(serial: string, live: readonly CheckRow[], history: History): Map<string, BlockerView[]> {
  const lifted = new Set(history.holdLifts.map(({ row }) => row.checkId));
  const own = live.map(({ check, wording }) => ({
    id: check.id,
    unitId: check.unitId,
    serial,
    stage: check.stage,
    title: wording.title,
    position: check.position,
    holdPoint: check.holdPoint,
    lifted: lifted.has(check.id),
    needs: history.prerequisites.filter((row) => row.waitingId === check.id).map((row) => row.id),
  }));
  const others = history.prerequisites
    .filter((row) => !own.some((check) => check.id === row.id))
    .map(({ id, unitId, serial: other, title }) => {
      return {
        id,
        unitId,
        serial: other,
        title,
        stage: "integration" as const,
        position: 0,
        holdPoint: false,
        lifted: false,
        needs: [],
      };
    });
  const states = new Map<string, CheckState>([
    ...history.prerequisites.map((row) => [row.id, row.state] as const),
    ...live.map(({ check }) => [check.id, check.state] as const),
  ]);
  return findBlockers([...own, ...others], (id) => states.get(id) ?? "untested");
}
