import type { CheckState } from "@/db/schema/travelers";
import { holds, type Blocker, type CheckHistory, type DerivedCheck } from "./check-history";
import { findDoubt, type Doubt } from "./find-doubt";
import { groupUnits } from "./unit-order";
import { reasonFor } from "./state-reason";

/**
 * The state of every check, from history alone. The order of the rows does not matter. Checks that are needed by
 * others must be among them, with the units whose hold points they wait for; a need that is not there is ignored.
 */
export function deriveStates(histories: readonly CheckHistory[]): Map<string, DerivedCheck> {
  const byId = new Map(histories.map((history) => [history.id, history]));
  const doubts = findDoubt(histories, byId);
  const states = new Map(histories.map((history) => [history.id, stateFromAttempts(history, doubts.get(history.id))]));
  const derived = new Map<string, DerivedCheck>();
  for (const unit of groupUnits(histories)) {
    const openHolds: Blocker[] = [];
    for (const check of unit) {
      const blockers = [...openHolds, ...openNeeds(check, byId, states, openHolds)];
      const state = states.get(check.id) ?? (blockers.length > 0 ? "waiting" : "untested");
      derived.set(check.id, {
        id: check.id,
        state,
        reason: reasonFor(state, check, blockers, doubts.get(check.id)),
        insideGuardBand: check.last?.verdict === "guard-band",
        lastAttemptId: check.last?.id ?? null,
        blockers,
      });
      if (check.holdPoint && !check.lifted && !holds(state)) openHolds.push(blocker(check, state, "hold point"));
    }
  }
  return withStatesOfBlockers(derived);
}

/** The state where there is a valid attempt. Without one it depends on what the check waits for. */
function stateFromAttempts(check: CheckHistory, doubt: Doubt | undefined): CheckState | undefined {
  const { last, reopened } = check;
  if (!last) return undefined;
  if (reopened && reopened.afterArrival >= last.arrival) return "reopened";
  if (last.verdict === "does-not-conform") {
    return check.concessions.some((concession) => concession.attemptId === last.id) ? "conceded" : "failed";
  }
  return doubt ? "doubtful" : "passed";
}

function openNeeds(
  check: CheckHistory,
  byId: ReadonlyMap<string, CheckHistory>,
  states: ReadonlyMap<string, CheckState | undefined>,
  openHolds: readonly Blocker[],
): Blocker[] {
  return [...check.needs].sort().flatMap((id) => {
    const needed = byId.get(id);
    const state = states.get(id) ?? "untested";
    const named = openHolds.some((hold) => hold.checkId === id);
    return !needed || holds(state) || named ? [] : [blocker(needed, state, "prerequisite")];
  });
}

function blocker(check: CheckHistory, state: CheckState, why: Blocker["why"]): Blocker {
  return { checkId: check.id, serial: check.serial, title: check.title, state, why };
}

/** A needed check of a unit that came later in the loop was called untested above; it may be waiting itself. */
function withStatesOfBlockers(derived: Map<string, DerivedCheck>): Map<string, DerivedCheck> {
  for (const check of derived.values()) {
    check.blockers = check.blockers.map((one) => ({ ...one, state: derived.get(one.checkId)?.state ?? one.state }));
  }
  return derived;
}
