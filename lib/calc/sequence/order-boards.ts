import { byName, putInOrder } from "../check-graph";
import { boardLinks, says } from "./board-links";
import type { BoardLink, BoardOrderInput, BoardOrdering, BoardOverride, BoardRisk } from "./board-order";
import { boardSteps } from "./board-steps";
import { joined, listNets } from "./list-nets";

/**
 * Which board is proven next, and why: nothing unproven may drive or supply something proven, so that a board comes after
 * all that drive or supply it. Where boards drive each other one is proven apart, on the extender, with the bench in the
 * place of the others; where an unproven board would reach a proven one, the extender leaves these lines open.
 * A board is proven when every unit of it that stands in the machine is. Overrides are kept whatever the machine says, and
 * what to mind then is said; overrides in a circle are refused with its members.
 */
export function orderBoards({ machine, proofs, railSources, overrides }: BoardOrderInput): BoardOrdering {
  const codes = machine.boards.map(({ code }) => code).sort(byName);
  const known = overrides.filter(({ board, before }) => codes.includes(board) && codes.includes(before));
  const refused = circleOf(codes, known);
  if (refused) return refused;
  const provenAt = new Set(proofs.flatMap(({ placement, proven }) => (proven ? [placement] : [])));
  const unitsOf = (board: string) =>
    machine.placements
      .filter((placement) => placement.board === board)
      .map(({ id, label }) => ({ label, proven: provenAt.has(id) }))
      .sort((a, b) => byName(a.label, b.label));
  const isProven = (board: string) => unitsOf(board).length > 0 && unitsOf(board).every(({ proven }) => proven);
  const proven = codes.filter(isProven);
  const derived = boardLinks({ machine, railSources });
  const links = [...derived, ...known.map(said)].sort((a, b) => byName(a.from, b.from) || byName(a.to, b.to));
  const unproven = codes.filter((code) => !isProven(code));
  return {
    ok: true,
    value: {
      steps: boardSteps(unproven, proven, links, unitsOf),
      proven,
      links,
      risks: risksOf(derived, new Set(proven)),
      remarks: remarksOf(overrides, codes, derived),
    },
  };
}

const said = ({ board: from, before: to, reason }: BoardOverride): BoardLink => {
  const link = { from, to, kind: "said" as const, nets: [] };
  return { ...link, sentence: `${says(link)}: ${reason.trim()}` };
};

function circleOf(codes: readonly string[], overrides: readonly BoardOverride[]): BoardOrdering | undefined {
  const after = (code: string) => overrides.flatMap(({ board, before }) => (before === code ? [board] : []));
  const order = putInOrder(new Map(codes.map((code) => [code, after(code)])));
  if (order.ok) return undefined;
  // From those who wait to those who come before.
  const [first = "", ...others] = order.circle;
  const circle = [first, ...others.reverse()];
  const pairs = circle.map((code, at) => `${code}${at === 0 ? " comes" : ""} before ${circle[at + 1] ?? first}`);
  return { ok: false, circle, message: `By what was said ${joined(pairs)}: no order does that.` };
}

function risksOf(links: readonly BoardLink[], proven: ReadonlySet<string>): BoardRisk[] {
  const pairs = new Map<string, BoardLink[]>();
  for (const link of links) {
    if (link.kind === "carries" || proven.has(link.from) || !proven.has(link.to)) continue;
    const key = `${link.from}\u0000${link.to}`;
    pairs.set(key, [...(pairs.get(key) ?? []), link]);
  }
  return [...pairs.values()].flatMap((pair): BoardRisk[] => {
    const [first] = pair;
    if (!first) return [];
    const nets = [...new Set(pair.flatMap((link) => link.nets))].sort(byName);
    const { from, to } = first;
    const sentence = `${from} is not proven and gives ${listNets(nets)} to ${to}, which is: keep ${from} out of the machine, or these lines open, until it is proven.`;
    return [{ unproven: from, proven: to, nets, sentence }];
  });
}

function remarksOf(
  overrides: readonly BoardOverride[],
  codes: readonly string[],
  links: readonly BoardLink[],
): string[] {
  return overrides.flatMap(({ board, before }) => {
    const missing = [board, before].filter((code) => !codes.includes(code));
    if (missing.length > 0) return [`There is no board ${joined(missing)}.`];
    const against = links.filter(({ from, to }) => from === before && to === board).map(says);
    return against.length === 0 ? [] : [`${board} comes before ${before} by your own word, but ${joined(against)}.`];
  });
}
