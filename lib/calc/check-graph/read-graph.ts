import { byName } from "./by-name";
import type { Edges } from "./put-in-order";
import { holds, type StandingCheck } from "./standing-check";

export type CheckGraph<Check extends StandingCheck> = {
  /** By serial and position. */
  checks: Check[];
  byId: ReadonlyMap<string, Check>;
  /** By id: what the check relies on directly: its prerequisites, and the hold point before it. */
  reliesOn: Edges;
};

/**
 * Who relies on whom. Of several hold points before a check only the last one is named: that one relies on the others.
 * A hold that was lifted binds nobody. Ids that are not among the checks are left out.
 */
export function readGraph<Check extends StandingCheck>(checks: readonly Check[]): CheckGraph<Check> {
  const ordered = [...checks].sort(onTheTravelers);
  const byId = new Map(ordered.map((check) => [check.id, check]));
  const reliesOn = new Map<string, string[]>();
  const lastHold = new Map<string, string>();
  for (const { id, unitId, needs, holdPoint, lifted } of ordered) {
    const hold = lastHold.get(unitId);
    const known = needs.filter((need) => byId.has(need));
    reliesOn.set(id, [...new Set(hold === undefined ? known : [...known, hold])]);
    if (holdPoint && !lifted) lastHold.set(unitId, id);
  }
  return { checks: ordered, byId, reliesOn };
}

/**
 * The same among the checks that do not hold: what each must wait for before it may be recorded. A prerequisite that holds
 * binds no longer, whatever stands behind it.
 */
export const openGraph = <Check extends StandingCheck>(checks: readonly Check[]): CheckGraph<Check> =>
  readGraph(checks.filter(({ state }) => !holds(state)));

const onTheTravelers = (a: StandingCheck, b: StandingCheck): number =>
  byName(a.serial, b.serial) || byName(a.unitId, b.unitId) || a.position - b.position || (a.id < b.id ? -1 : 1);
