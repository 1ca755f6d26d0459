import type { Said, Study } from "./study";

/** Nets that change places on the way, with the probes that show where each end leads. */
export type CrossedGroup = { nets: number[]; joins: Said[]; /** Pieces that hang together. */ coppers: number[][] };

/**
 * Open nets whose pieces hang together with pieces of the others in a ring: each of them has two pieces at least that touch
 * another one's, and there is a copper for every net. Two nets are a crossed pair, three a turn of three wires. Where all hang
 * together as one, it is a short.
 */
export function findCrossed({ pieces, joins, pieceOf, netOf }: Study): CrossedGroup[] {
  const ringed = new Set(pieces.keys());
  const inRing = () => joins.filter(({ probe }) => ringed.has(netOf(probe.a)) && ringed.has(netOf(probe.b)));
  for (;;) {
    const touching = new Map<number, Set<number>>();
    for (const { probe } of inRing()) {
      for (const point of [probe.a, probe.b]) {
        touching.set(netOf(point), (touching.get(netOf(point)) ?? new Set()).add(pieceOf(point)));
      }
    }
    const loose = [...ringed].filter((net) => (touching.get(net)?.size ?? 0) < 2);
    if (loose.length === 0) break;
    for (const net of loose) ringed.delete(net);
  }
  const links = inRing();
  const byNet = components(links.map(({ probe }) => [netOf(probe.a), netOf(probe.b)]));
  return byNet.flatMap((nets) => {
    const own = links.filter(({ probe }) => nets.includes(netOf(probe.a)));
    const coppers = components(own.map(({ probe }) => [pieceOf(probe.a), pieceOf(probe.b)]));
    return coppers.length < nets.length ? [] : [{ nets: nets.sort((a, b) => a - b), joins: own, coppers }];
  });
}

/** Numbers that hang together by pairs, in the order of their first pair. */
export function components(pairs: readonly (readonly [number, number])[]): number[][] {
  const groupOf = new Map<number, number[]>();
  for (const [one, other] of pairs) {
    const [mine, theirs] = [groupOf.get(one) ?? [one], groupOf.get(other) ?? [other]];
    groupOf.set(one, mine);
    groupOf.set(other, theirs);
    if (mine === theirs) continue;
    const [large, small] = mine.length >= theirs.length ? [mine, theirs] : [theirs, mine];
    for (const member of small) {
      large.push(member);
      groupOf.set(member, large);
    }
  }
  return [...new Set(groupOf.values())];
}
