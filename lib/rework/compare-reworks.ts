import type { ReworkKind, Wire } from "@/db/schema/faults";

export type ComparedRework = {
  id: string;
  number: number;
  kind: ReworkKind;
  what: string;
  wire: Wire | null;
  carriedFrom: string | null;
  /** "signal PH7", "pin J1 a14". */
  touches: readonly string[];
};

/** One line of the comparison: on both units, or on one of them. */
export type Comparison = { here: ComparedRework | null; there: ComparedRework | null };

/**
 * Pairs the reworks of two units: those carried over from one to the other first, then those that are the same work, a
 * wire between the same two ends or the same kind on the same things. Each is paired once. What pairs stands first.
 */
export function compareReworks(here: readonly ComparedRework[], there: readonly ComparedRework[]): Comparison[] {
  const left = new Set(there);
  const pairs = new Map<ComparedRework, ComparedRework>();
  const pairUp = (fits: (one: ComparedRework, other: ComparedRework) => boolean) => {
    for (const one of here) {
      if (pairs.has(one)) continue;
      const other = [...left].find((candidate) => fits(one, candidate));
      if (!other) continue;
      pairs.set(one, other);
      left.delete(other);
    }
  };
  pairUp((one, other) => one.carriedFrom === other.id || other.carriedFrom === one.id);
  pairUp((one, other) => one.carriedFrom !== null && one.carriedFrom === other.carriedFrom);
  pairUp((one, other) => workKey(one) === workKey(other));
  const byNumber = (a: ComparedRework, b: ComparedRework) => a.number - b.number;
  return [
    ...[...pairs.keys()].sort(byNumber).map((one) => ({ here: one, there: pairs.get(one) ?? null })),
    ...here
      .filter((one) => !pairs.has(one))
      .sort(byNumber)
      .map((one) => ({ here: one, there: null })),
    ...[...left].sort(byNumber).map((other) => ({ here: null, there: other })),
  ];
}

function workKey({ kind, wire, touches }: ComparedRework): string {
  const plain = (text: string) =>
    text
      .replace(/[\s.:/-]+/g, " ")
      .trim()
      .toUpperCase();
  if (wire) return `${kind}|${wire.out}|${[plain(wire.from), plain(wire.to)].sort().join("|")}`;
  return `${kind}|${touches.map(plain).sort().join("|")}`;
}
