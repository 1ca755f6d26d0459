import type { CheckState } from "@/db/schema/travelers";
import { holds, type CheckHistory, type DerivedCheck } from "./check-history";
import { groupUnits } from "./unit-order";

export type NextCheck = {
  checkId: string;
  unitId: string;
  serial: string;
  title: string;
  state: CheckState;
  /** Waiting checks that it holds back, directly or through others. */
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

/** Ranks what the bench should do next by how many waiting checks it lets go. */
export function nextChecks(
  histories: readonly CheckHistory[],
  derived: ReadonlyMap<string, DerivedCheck>,
): NextCheck[] {
  const dependants = dependantsOf(histories, derived);
  const free = histories.filter((check) => {
    const own = derived.get(check.id);
    return own !== undefined && URGENCY.includes(own.state) && own.blockers.length === 0;
  });
  const ranked = free.map((check) => {
    const state = derived.get(check.id)?.state ?? "untested";
    const holdsBack = countHeldBack(check.id, dependants, derived);
    return { check, state, holdsBack, urgency: URGENCY.indexOf(state) };
  });
  ranked.sort(
    (a, b) =>
      b.holdsBack - a.holdsBack ||
      a.urgency - b.urgency ||
      a.check.serial.localeCompare(b.check.serial, "en") ||
      a.check.position - b.check.position ||
      (a.check.id < b.check.id ? -1 : 1),
  );
  return ranked.map(({ check, state, holdsBack }) => ({
    checkId: check.id,
    unitId: check.unitId,
    serial: check.serial,
    title: check.title,
    state,
    holdsBack,
    reason: reasonFor(state, holdsBack),
  }));
}

function reasonFor(state: CheckState, holdsBack: number): string {
  if (holdsBack === 0) return REASONS[state] ?? "";
  return `Holds back ${holdsBack} ${holdsBack === 1 ? "check" : "checks"}.`;
}

/** For each check that does not hold: who waits for it directly. */
function dependantsOf(
  histories: readonly CheckHistory[],
  derived: ReadonlyMap<string, DerivedCheck>,
): Map<string, string[]> {
  const open = (id: string) => !holds(derived.get(id)?.state ?? "untested");
  const dependants = new Map<string, string[]>();
  const wait = (needed: string, waiting: string) => {
    const list = dependants.get(needed);
    if (list) list.push(waiting);
    else dependants.set(needed, [waiting]);
  };
  for (const unit of groupUnits(histories)) {
    const holdPoints: string[] = [];
    for (const check of unit) {
      for (const hold of holdPoints) wait(hold, check.id);
      for (const needed of check.needs) if (open(needed)) wait(needed, check.id);
      if (check.holdPoint && !check.lifted && open(check.id)) holdPoints.push(check.id);
    }
  }
  return dependants;
}

function countHeldBack(
  id: string,
  dependants: ReadonlyMap<string, string[]>,
  derived: ReadonlyMap<string, DerivedCheck>,
): number {
  const seen = new Set([id]);
  const open = [id];
  let count = 0;
  for (let current = open.pop(); current !== undefined; current = open.pop()) {
    for (const next of dependants.get(current) ?? []) {
      if (seen.has(next)) continue;
      seen.add(next);
      const state = derived.get(next)?.state;
      if (state === "waiting") count += 1;
      if (state && !holds(state)) open.push(next);
    }
  }
  return count;
}
