import type { Netlist } from "../netlist";
import { addTo } from "./add-to";
import type { Choice } from "./choose-points";
import { neighboursByName } from "./neighbours-by-name";
import { neighboursByPlace } from "./neighbours-by-place";
import { NetPairs } from "./net-pairs";
import type { PlanOptions } from "./plan";
import type { PointBook } from "./point-book";

/** 0.050 inch between the edges of conductors, accepted practice of flying-probe testers (read in a trade article). */
export const USUAL_WINDOW_MM = 1.27;
const WINDOW_MM = { least: 0.1, most: 50 };

/** All pairs of so many rails would be probed; beyond that they count as other nets do. */
const MOST_RAILS = 40;
/** Points of a net that are looked through for the nearest one, where nets of any size meet. */
const MOST_LOOKED_AT = 64;

export type IsolationPairs = { rails: NetPairs; neighbours: NetPairs; nets: number; remarks: string[] };

/** Rails against each other, then nets beside each other by the file's own word, by place and by the names of pins. */
export function isolationPairs(
  netlist: Netlist,
  book: PointBook,
  choice: Choice,
  options: PlanOptions,
): IsolationPairs {
  const byNet = candidatesByNet(book, choice.candidates);
  const [rails, neighbours] = [new NetPairs(book), new NetPairs(book)];
  const remarks: string[] = [];
  const railNets = [...byNet.keys()].filter((net) => choice.isRail[net] === 1);
  if (railNets.length > MOST_RAILS) {
    remarks.push(
      `${railNets.length} nets look like rails; only the ${MOST_RAILS} with the most points are held against each other.`,
    );
    railNets.sort((one, other) => (byNet.get(other)?.length ?? 0) - (byNet.get(one)?.length ?? 0));
    railNets.length = MOST_RAILS;
  }
  railNets.forEach((one, at) => {
    for (const other of railNets.slice(at + 1)) addNearest(book, byNet, rails, one, other, Infinity);
  });
  const nets = byNet.size;
  if (options.railsOnly === true) return { rails, neighbours, nets, remarks };
  addAdjacent(netlist, book, byNet, neighbours);
  const mostPairs = 40 * choice.candidates.length + neighbours.size + 1000;
  const isComplete = neighboursByPlace(book, choice.candidates, windowOf(options), neighbours, mostPairs);
  if (!isComplete) remarks.push("Very many pads lie on one spot: not all of them are held against each other.");
  neighboursByName(book, choice.candidates, neighbours);
  return { rails, neighbours, nets, remarks };
}

export function windowOf({ neighbourMm = USUAL_WINDOW_MM }: PlanOptions): number {
  return neighbourMm >= WINDOW_MM.least ? Math.min(neighbourMm, WINDOW_MM.most) : WINDOW_MM.least;
}

function candidatesByNet(book: PointBook, candidates: readonly number[]): Map<number, number[]> {
  const byNet = new Map<number, number[]>();
  for (const at of candidates) {
    addTo(byNet, book.netOf[at] ?? 0, at);
  }
  return byNet;
}

function addAdjacent(
  { nets, adjacent }: Netlist,
  book: PointBook,
  byNet: Map<number, number[]>,
  pairs: NetPairs,
): void {
  if (adjacent.length === 0) return;
  const numbers = new Map(nets.map(({ name }, at) => [name, at]));
  for (const { one, other } of adjacent) {
    const [a, b] = [numbers.get(one), numbers.get(other)];
    if (a !== undefined && b !== undefined && a !== b) addNearest(book, byNet, pairs, a, b, MOST_LOOKED_AT);
  }
}

/** Two points of two nets that lie near to each other: from the first point of one net there and back again. */
function addNearest(
  book: PointBook,
  byNet: Map<number, number[]>,
  pairs: NetPairs,
  one: number,
  other: number,
  most: number,
): void {
  const [points, others] = [byNet.get(one) ?? [], byNet.get(other) ?? []];
  const there = nearest(book, points[0], others, most);
  const back = nearest(book, there, points, most);
  if (there === undefined || back === undefined) return;
  // Pads that are found side by side later on lie nearer than any two that are named only.
  pairs.add(back, there, Number.MAX_VALUE);
}

function nearest({ x, y }: PointBook, from: number | undefined, points: readonly number[], most: number) {
  if (from === undefined) return undefined;
  let best = points[0];
  let bestSquared = Infinity;
  for (let i = 0; i < Math.min(points.length, most); i += 1) {
    const at = points[i] ?? 0;
    const [dx, dy] = [(x[at] ?? 0) - (x[from] ?? 0), (y[at] ?? 0) - (y[from] ?? 0)];
    if (dx * dx + dy * dy < bestSquared) [best, bestSquared] = [at, dx * dx + dy * dy];
  }
  return best;
}
