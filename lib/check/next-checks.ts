import type { Stage } from "@/db/schema/procedures";
import type { CheckState } from "@/db/schema/travelers";
import { holds, type PlacedCheck } from "./check-history";
import { findBlockers } from "./find-blockers";

export type StandingCheck = PlacedCheck & { state: CheckState };

export type NextCheck = {
  checkId: string;
  unitId: string;
  serial: string;
  stage: Stage;
  title: string;
  state: CheckState;
  /** Checks that do not hold and wait for it, directly or through others. */
  holdsBack: number;
  /** Why it comes here, in words. */
  reason: string;
};

/** What can be done now, the most urgent first among those that hold back as many. */
const URGENCY: readonly CheckState[] = ["failed", "reopened", "doubtful", "untested"];

const REASONS: Partial<Record<CheckState, string>> = {
  failed: "Fails. Nothing waits for it.",
  reopened: "Reopened. Nothing waits for it.",
  doubtful: "In doubt. Nothing waits for it.",
  untested: "Free to do. Nothing waits for it.",
};

/** Ranks what the bench should do next by how many open checks it lets go, as lib/calc/sequence does. */
export function nextChecks(checks: readonly StandingCheck[]): NextCheck[] {
  const states = new Map(checks.map((check) => [check.id, check.state]));
  const blockers = findBlockers(checks, (id) => states.get(id) ?? "untested");
  const dependants = new Map<string, string[]>();
  for (const [id, list] of blockers) {
    for (const { checkId } of list) dependants.set(checkId, [...(dependants.get(checkId) ?? []), id]);
  }
  return checks
    .filter((check) => URGENCY.includes(check.state) && blockers.get(check.id)?.length === 0)
    .map((check) => ({ check, holdsBack: countHeldBack(check.id, dependants, states) }))
    .sort((a, b) => b.holdsBack - a.holdsBack || compareChecks(a.check, b.check))
    .map(({ check, holdsBack }) => ({
      checkId: check.id,
      unitId: check.unitId,
      serial: check.serial,
      stage: check.stage,
      title: check.title,
      state: check.state,
      holdsBack,
      reason: reasonFor(check.state, holdsBack),
    }));
}

function compareChecks(a: StandingCheck, b: StandingCheck): number {
  return (
    URGENCY.indexOf(a.state) - URGENCY.indexOf(b.state) ||
    a.serial.localeCompare(b.serial, "en") ||
    a.position - b.position ||
    (a.id < b.id ? -1 : 1)
  );
}

function reasonFor(state: CheckState, holdsBack: number): string {
  if (holdsBack === 0) return REASONS[state] ?? "";
  return `Holds back ${holdsBack} ${holdsBack === 1 ? "check" : "checks"}.`;
}

function countHeldBack(
  id: string,
  dependants: ReadonlyMap<string, string[]>,
  states: ReadonlyMap<string, CheckState>,
): number {
  const seen = new Set([id]);
  const open = [id];
  let count = 0;
  for (let current = open.pop(); current !== undefined; current = open.pop()) {
    for (const next of dependants.get(current) ?? []) {
      if (seen.has(next)) continue;
      seen.add(next);
      if (holds(states.get(next) ?? "untested")) continue;
      count += 1;
      open.push(next);
    }
  }
  return count;
}
