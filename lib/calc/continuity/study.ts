import { DisjointSets } from "../interconnect";
import type { Netlist } from "../netlist";
import { addTo } from "./add-to";
import { lastResults, outcomeOf, type Outcome } from "./outcomes";
import type { PointNumber, Probe, ProbeResult } from "./plan";
import { pointBook, type PointBook } from "./point-book";

/** A probe with what it said. */
export type Said = { probe: Probe; outcome: Outcome; ohm: number | null };

export type Study = {
  book: PointBook;
  said: Said[];
  /** Pieces of every net that is open, the largest first; a piece is told by `pieceOf`. */
  pieces: Map<number, PointNumber[][]>;
  /** Probes that read open, by number of the net, where no other way was found. */
  breaks: Map<number, Said[]>;
  /** Probes that read open although others join their points. */
  doubted: Said[];
  /** Two nets that touch. */
  joins: Said[];
  /** The same number for points of one piece: of a net that is not open, for all of its points. */
  pieceOf(point: PointNumber): number;
  netOf(point: PointNumber): number;
};

/**
 * Sorts the results: which nets are in pieces, and which pieces of two nets touch. A probe without a result breaks nothing, so
 * that a net counts as whole until a probe says otherwise.
 */
export function studyResults(netlist: Netlist, probes: readonly Probe[], results: readonly ProbeResult[]): Study {
  const book = pointBook(netlist);
  const netOf = (point: PointNumber) => book.netOf[point] ?? -1;
  const known = probes.filter(({ a, b }) => netOf(a) >= 0 && netOf(b) >= 0);
  const last = lastResults(results);
  const said: Said[] = [];
  const own = new DisjointSets(book.points.length);
  const opens: Said[] = [];
  for (const probe of known) {
    const result = last.get(probe.id);
    const outcome = result && outcomeOf(probe, result);
    if (outcome !== undefined) said.push({ probe, outcome, ohm: result?.ohm ?? null });
    if (netOf(probe.a) !== netOf(probe.b)) continue;
    if (outcome === "apart") opens.push({ probe, outcome, ohm: result?.ohm ?? null });
    else if (outcome !== undefined || probe.kind === "continuity") own.join(probe.a, probe.b);
  }
  const breaks = new Map<number, Said[]>();
  const doubted: Said[] = [];
  for (const one of opens) {
    if (own.find(one.probe.a) === own.find(one.probe.b)) doubted.push(one);
    else addTo(breaks, netOf(one.probe.a), one);
  }
  return {
    book,
    said,
    pieces: gatherPieces(known, own, new Set(breaks.keys()), netOf),
    breaks,
    doubted,
    joins: said.filter(({ probe, outcome }) => outcome === "joined" && netOf(probe.a) !== netOf(probe.b)),
    pieceOf: (point) => (breaks.has(netOf(point)) ? own.find(point) : (book.firstOf[netOf(point)] ?? -1)),
    netOf,
  };
}

/** Points of open nets that any continuity probe touches, by piece. */
function gatherPieces(
  probes: readonly Probe[],
  own: DisjointSets,
  open: ReadonlySet<number>,
  netOf: (point: PointNumber) => number,
): Map<number, PointNumber[][]> {
  const points = new Set<PointNumber>();
  for (const { a, b } of probes) {
    if (open.has(netOf(a)) && netOf(a) === netOf(b)) points.add(a).add(b);
  }
  const byRoot = new Map<number, PointNumber[]>();
  for (const point of points) {
    addTo(byRoot, own.find(point), point);
  }
  const byNet = new Map<number, PointNumber[][]>();
  for (const piece of byRoot.values()) {
    addTo(
      byNet,
      netOf(piece[0] ?? -1),
      piece.sort((one, other) => one - other),
    );
  }
  for (const pieces of byNet.values())
    pieces.sort((one, other) => other.length - one.length || (one[0] ?? 0) - (other[0] ?? 0));
  return byNet;
}
