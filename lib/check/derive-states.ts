import type { CheckState } from "@/db/schema/travelers";
import type { CheckHistory, DerivedCheck } from "./check-history";
import { findBlockers } from "./find-blockers";
import { findDoubt, type Doubt } from "./find-doubt";
import { isReworked } from "./is-reworked";
import { reasonFor } from "./state-reason";

/**
 * The state of every check, from history alone. The order of the rows does not matter. Whatever the checks depend on
 * must be among them, transitively; a need that is not there is ignored.
 */
export function deriveStates(histories: readonly CheckHistory[]): Map<string, DerivedCheck> {
  const doubts = findDoubt(histories);
  const attempted = new Map(
    histories.map((history) => [history.id, stateFromAttempts(history, doubts.get(history.id))]),
  );
  const blockers = findBlockers(histories, (id) => attempted.get(id) ?? "untested");
  const stateOf = (id: string): CheckState =>
    attempted.get(id) ?? ((blockers.get(id) ?? []).length > 0 ? "waiting" : "untested");
  const derived = histories.map((check): [string, DerivedCheck] => {
    const state = stateOf(check.id);
    const own = (blockers.get(check.id) ?? []).map((blocker) => ({ ...blocker, state: stateOf(blocker.checkId) }));
    return [
      check.id,
      {
        id: check.id,
        state,
        reason: reasonFor(state, check, own, doubts.get(check.id)),
        insideGuardBand: check.last?.verdict === "guard-band",
        lastAttemptId: check.last?.id ?? null,
        blockers: own,
      },
    ];
  });
  return new Map(derived);
}

/** The state where there is a valid attempt. Without one it depends on what the check waits for. */
function stateFromAttempts(check: CheckHistory, doubt: Doubt | undefined): CheckState | undefined {
  const { last, reopened } = check;
  if (!last) return undefined;
  if (reopened && reopened.afterArrival >= last.arrival) return "reopened";
  if (last.verdict === "does-not-conform") {
    return check.concessions.some((concession) => concession.attemptId === last.id) ? "conceded" : "failed";
  }
  return doubt || isReworked(check) ? "doubtful" : "passed";
}
