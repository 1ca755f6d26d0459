import { byName } from "../check-graph";
import type { BoardLink } from "./board-order";

/** From whom to whom, among the boards that are left. */
type Links = readonly BoardLink[];

/**
 * The board that is proven next among those that are left. One that no other of them carries, supplies or drives; of several
 * the one behind which most boards wait, then by name. Where all wait in a circle: of a group that waits for nobody outside
 * itself the one into which the fewest lines of the group run, then the one from which most run, then by name. What is said
 * is never broken: it has no circle, so that in every group somebody waits for no word.
 */
export function nextBoard(left: readonly string[], links: Links): string | undefined {
  const among = links.filter(({ from, to }) => left.includes(from) && left.includes(to));
  const behind = new Map(left.map((board) => [board, reached(board, among)]));
  const waits = (board: string) => among.some(({ to }) => to === board);
  const free = left.filter((board) => !waits(board));
  const size = (board: string) => behind.get(board)?.size ?? 0;
  if (free.length > 0) return best(free, (a, b) => size(b) - size(a));
  const isBefore = (one: string, other: string) => behind.get(one)?.has(other) ?? false;
  const lonely = left.filter((board) => left.every((other) => !isBefore(other, board) || isBefore(board, other)));
  const groups = among.filter(({ from, to }) => isBefore(to, from));
  const lines = (board: string, end: "from" | "to") =>
    groups.reduce((sum, link) => sum + (link[end] === board ? Math.max(1, link.nets.length) : 0), 0);
  const unsaid = lonely.filter((board) => !groups.some(({ to, kind }) => kind === "said" && to === board));
  return best(unsaid, (a, b) => lines(a, "to") - lines(b, "to") || lines(b, "from") - lines(a, "from"));
}

const best = (boards: readonly string[], compare: (a: string, b: string) => number): string | undefined =>
  [...boards].sort((a, b) => compare(a, b) || byName(a, b))[0];

/** All boards that come after it; itself only where the way leads back. */
function reached(start: string, links: Links): Set<string> {
  const found = new Set<string>();
  const queue = [start];
  for (const at of queue) {
    for (const { from, to } of links) {
      if (from !== at || found.has(to)) continue;
      found.add(to);
      queue.push(to);
    }
  }
  return found;
}
