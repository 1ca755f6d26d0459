import type { CheckState } from "@/db/schema/travelers";
import { holds, type Blocker, type PlacedCheck } from "./check-history";
import { groupUnits } from "./unit-order";

/**
 * What each check waits for: open hold points before it on its unit, then its own prerequisites that do not hold.
 * A prerequisite that is not among the checks is ignored.
 */
export function findBlockers(
  checks: readonly PlacedCheck[],
  stateOf: (id: string) => CheckState,
): Map<string, Blocker[]> {
  const byId = new Map(checks.map((check) => [check.id, check]));
  const found = new Map<string, Blocker[]>();
  const block = (check: PlacedCheck, why: Blocker["why"]): Blocker => ({
    checkId: check.id,
    serial: check.serial,
    title: check.title,
    state: stateOf(check.id),
    why,
  });
  for (const unit of groupUnits(checks)) {
    const openHolds: Blocker[] = [];
    for (const check of unit) {
      const openNeeds = [...check.needs].sort().flatMap((id) => {
        const needed = byId.get(id);
        const named = openHolds.some((hold) => hold.checkId === id);
        return !needed || named || holds(stateOf(id)) ? [] : [block(needed, "prerequisite")];
      });
      found.set(check.id, [...openHolds, ...openNeeds]);
      if (check.holdPoint && !check.lifted && !holds(stateOf(check.id))) openHolds.push(block(check, "hold point"));
    }
  }
  return found;
}
