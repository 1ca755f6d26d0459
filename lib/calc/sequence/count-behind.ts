import { turnedRound, type CheckGraph, type StandingCheck } from "../check-graph";

export type Behind = { checks: number; units: { serial: string; checks: number }[] };

/**
 * How many open checks come after each, directly or through others, and on which units, most first. A set of bits a check,
 * joined from the last of the order to the first: checks × edges / 32 steps.
 */
export function countBehind(
  { checks, reliesOn }: CheckGraph<StandingCheck>,
  order: readonly string[],
): (id: string) => Behind {
  const numberOf = new Map(checks.map(({ id }, at) => [id, at]));
  const dependants = turnedRound(reliesOn);
  const words = Math.ceil(checks.length / 32);
  const sets = new Map<string, Uint32Array>();
  for (const id of [...order].reverse()) {
    const set = new Uint32Array(words);
    for (const next of dependants.get(id) ?? []) {
      const number = numberOf.get(next) ?? 0;
      set[number >>> 5] = (set[number >>> 5] ?? 0) | (1 << (number & 31));
      const further = sets.get(next);
      for (let word = 0; word < words; word += 1) set[word] = (set[word] ?? 0) | (further?.[word] ?? 0);
    }
    sets.set(id, set);
  }
  return (id) => {
    const units = new Map<string, number>();
    let count = 0;
    (sets.get(id) ?? []).forEach((word, at) => {
      for (let rest = word; rest !== 0; rest &= rest - 1) {
        const serial = checks[at * 32 + 31 - Math.clz32(rest & -rest)]?.serial ?? "";
        units.set(serial, (units.get(serial) ?? 0) + 1);
        count += 1;
      }
    });
    const most = [...units].map(([serial, own]) => ({ serial, checks: own })).sort((a, b) => b.checks - a.checks);
    return { checks: count, units: most };
  };
}
