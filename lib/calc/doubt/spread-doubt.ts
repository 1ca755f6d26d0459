import { nameCheck, turnedRound, type CheckGraph } from "../check-graph";
import type { CoveringCheck } from "./rework";

/**
 * From the checks that are touched, by the shortest way, to all that rely on them: for each the checks in between, the
 * nearest first, the touched one last. What is touched itself is not in the answer. Linear in checks and edges.
 */
export function spreadDoubt(
  { checks, reliesOn }: CheckGraph<CoveringCheck>,
  isTouched: (id: string) => boolean,
): Map<string, string[]> {
  const reliedOnBy = turnedRound(reliesOn);
  const cameFrom = new Map<string, string>();
  const queue = checks.map(({ id }) => id).filter(isTouched);
  // Grows while it is read.
  for (const at of queue) {
    for (const next of reliedOnBy.get(at) ?? []) {
      if (cameFrom.has(next) || isTouched(next)) continue;
      cameFrom.set(next, at);
      queue.push(next);
    }
  }
  return new Map([...cameFrom.keys()].map((id) => [id, wayToTouched(id, cameFrom)]));
}

function wayToTouched(id: string, cameFrom: ReadonlyMap<string, string>): string[] {
  const way: string[] = [];
  for (let at = cameFrom.get(id); at !== undefined; at = cameFrom.get(at)) way.push(at);
  return way;
}

/** "It relies on the hold point “A”, which relies on “B” of PSU-01, which the rework touches." */
export function describeWay(
  check: CoveringCheck,
  way: readonly string[],
  { byId }: CheckGraph<CoveringCheck>,
  isAdded: (id: string) => boolean,
): string {
  const name = (id: string) => {
    const other = byId.get(id);
    if (!other) return "";
    const isHold = other.holdPoint && !other.lifted && other.unitId === check.unitId;
    return `${isHold ? "the hold point " : ""}${nameCheck(other, check.serial)}`;
  };
  const [nearest = "", ...rest] = way;
  const last = rest.at(-1);
  const end = isAdded(last ?? nearest) ? "which is in doubt by your own choice" : "which the rework touches";
  if (last === undefined) return `It relies on ${name(nearest)}, ${end}.`;
  const between = rest.length === 1 ? "" : `, over ${rest.length - 1} more,`;
  return `It relies on ${name(nearest)}, and that${between} on ${name(last)}, ${end}.`;
}
