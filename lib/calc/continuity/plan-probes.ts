import type { Netlist } from "../netlist";
import { chainPairs, orderPairs, type PointPairs } from "./chains";
import { choosePoints, type Choice } from "./choose-points";
import { isolationPairs, type IsolationPairs } from "./isolation-pairs";
import { isolationWays } from "./isolation-ways";
import { layProbes } from "./lay-probes";
import type { PlanOptions, ProbePlan } from "./plan";
import { pointBook, type PointBook } from "./point-book";
import { CAUTION, effectiveLimits, limitRemark } from "./populated";
import { planRemarks } from "./plan-remarks";

/**
 * What to probe, in which order. Opens: n − 1 pairs for a net of n points, a chain from neighbour to neighbour. Isolation: every
 * rail against every other, then only nets that lie beside each other: by the file's own word, by pads whose edges are at most
 * `neighbourMm` apart on one side of the board (without looking for what lies between), and by the names of the pins where
 * places are not known. Shorts between nets that are nowhere beside each other are left out: that is what the plan saves.
 *
 * Limits are those of IPC-9252 or one's own; on a board with parts the standard's isolation does not apply (see populated.ts).
 * The work grows in proportion to the points.
 */
export function planProbes(netlist: Netlist, options: PlanOptions): ProbePlan {
  const book = pointBook(netlist);
  const choice = choosePoints(book, options);
  const limits = effectiveLimits(options.limits, options.populated);
  const joined = chainPairs(book, choice.chains);
  const isolation = isolationPairs(netlist, book, choice, options);
  const apart = inOrder(isolation, choice.isWanted, (pairs) => orderPairs(book, pairs), book.netOf);
  const { probes, travelMm } = layProbes(book, joined, apart, limits);
  const { nets, points } = countProbed(book, choice, joined);
  const others = options.railsOnly === true ? nets : isolation.nets;
  const everyPair = isolationWays(nets).everyPair + nets * (others - nets);
  return {
    probes,
    counts: {
      nets,
      points,
      continuity: joined.a.length,
      isolation: apart.a.length,
    },
    everyPair,
    saved: Math.max(0, everyPair - apart.a.length),
    travelMm,
    caution: options.populated ? CAUTION : null,
    remarks: [
      ...planRemarks(netlist, book, choice, options),
      ...isolation.remarks,
      ...(apart.a.length > 0 ? [limitRemark(limits, options.populated)] : []),
    ],
  };
}

/** Nets that the plan is about, and points that it joins. */
function countProbed(book: PointBook, { candidates, isWanted }: Choice, { a, b }: PointPairs) {
  const [isNet, isPoint] = [new Uint8Array(book.nets), new Uint8Array(book.points.length)];
  for (const at of candidates) isNet[book.netOf[at] ?? 0] = isWanted[book.netOf[at] ?? 0] ?? 0;
  for (const at of a) isPoint[at] = 1;
  for (const at of b) isPoint[at] = 1;
  const count = (flags: Uint8Array) => flags.reduce((sum, flag) => sum + flag, 0);
  return { nets: count(isNet), points: count(isPoint) };
}

/** Rails first. Of each pair at least one net must be wanted. */
function inOrder(
  { rails, neighbours }: IsolationPairs,
  isWanted: Uint8Array,
  order: (pairs: PointPairs) => PointPairs,
  netOf: Int32Array,
): PointPairs {
  const net = (at: number | undefined) => netOf[at ?? 0] ?? 0;
  const wanted = ({ a, b }: PointPairs, isSaid: (one: number, other: number) => boolean): PointPairs => {
    const kept: PointPairs = { a: [], b: [] };
    a.forEach((at, i) => {
      const [one, other] = [net(at), net(b[i])];
      if ((isWanted[one] === 0 && isWanted[other] === 0) || isSaid(one, other)) return;
      kept.a.push(at);
      kept.b.push(b[i] ?? 0);
    });
    return kept;
  };
  const first = order(wanted(rails, () => false));
  const second = order(wanted(neighbours, (one, other) => rails.has(one, other)));
  return { a: first.a.concat(second.a), b: first.b.concat(second.b) };
}
