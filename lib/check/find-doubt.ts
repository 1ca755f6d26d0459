import type { CheckHistory } from "./check-history";
import { groupUnits } from "./unit-order";

/** The failing attempt that puts a check in doubt, and the check it was an attempt of. */
export type Doubt = { arrival: number; by: CheckHistory };

const later = (a: Doubt | undefined, b: Doubt | undefined) => (!a || (b && b.arrival > a.arrival) ? b : a);

/**
 * For each check with a valid attempt: the newest failing attempt of anything it depends on (a prerequisite or an
 * earlier hold point, transitively) that arrived after the check's own last attempt.
 *
 * Newest failures are carried along the edges until nothing changes. Arrivals only grow, so it ends even if the edges
 * went round in a circle; along a chain within a unit one pass is enough.
 */
export function findDoubt(histories: readonly CheckHistory[]): Map<string, Doubt> {
  const byId = new Map(histories.map((history) => [history.id, history]));
  const units = groupUnits(histories);
  const inherited = new Map<string, Doubt>();
  const own = (check: CheckHistory): Doubt | undefined =>
    check.failedArrival === null ? undefined : { arrival: check.failedArrival, by: check };
  const cast = (check: CheckHistory) => later(own(check), inherited.get(check.id));
  for (let changed = true; changed;) {
    changed = false;
    for (const unit of units) {
      let fromHolds: Doubt | undefined;
      for (const check of unit) {
        const found = check.needs.reduce<Doubt | undefined>((newest, id) => {
          const needed = byId.get(id);
          return needed ? later(newest, cast(needed)) : newest;
        }, fromHolds);
        if (found && found.arrival > (inherited.get(check.id)?.arrival ?? 0)) {
          inherited.set(check.id, found);
          changed = true;
        }
        if (check.holdPoint && !check.lifted) fromHolds = later(fromHolds, cast(check));
      }
    }
  }
  for (const check of histories) {
    const doubt = inherited.get(check.id);
    if (doubt && (!check.last || doubt.arrival <= check.last.arrival)) inherited.delete(check.id);
  }
  return inherited;
}
