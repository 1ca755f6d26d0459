import { readGraph, type CheckState } from "../check-graph";
import { NO_PACES, type Paces } from "../forecast";
import { boardBook, EMPTY_BOOK, type BoardBook } from "./board-book";
import type { DoubtAfter, DoubtLine, DoubtReason } from "./doubt-line";
import { impliedCover, statesNothing } from "./implied-cover";
import { meetCovers } from "./meet-covers";
import { repeatWork } from "./repeat-work";
import type { BoardMap, CoveringCheck, DoubtChoices, Rework } from "./rework";
import { describeWay, spreadDoubt } from "./spread-doubt";
import { touchSet, type TouchSet } from "./touch-set";

export type DoubtContext = {
  /** Of the boards whose units have checks among these; a board without a map is found by names alone. */
  maps?: readonly BoardMap[];
  choices?: DoubtChoices;
  paces?: Paces;
};

/**
 * What a rework does to every check (`domain.md` rule 7). A passed check becomes doubtful if what it covers meets what the
 * rework touches, or if it relies on such a check: by a prerequisite or an earlier hold point, through any number of others,
 * on other units too. What a check covers: what it states, spread over its board's pin map, and what `impliedCover` adds.
 * Integration checks of `neighbours` count by their signals and pins: they prove the net that runs through both boards.
 *
 * Doubt goes through checks that have not passed, and through spared ones: sparing speaks for one check alone. A check that
 * is added by hand takes along what relies on it. More touched, more neighbours, more added: never fewer doubtful checks.
 * Linear in checks, names and edges. Left out: whether the rework could in truth change what was measured.
 */
export function doubtfulAfter(
  rework: Rework,
  checks: readonly CoveringCheck[],
  { maps = [], choices = { added: [], spared: [] }, paces = NO_PACES }: DoubtContext = {},
): DoubtAfter {
  const graph = readGraph(checks);
  const books = new Map(maps.map((map) => [map.board, boardBook(map)]));
  const bookOf = ({ board }: { board: string }) => books.get(board) ?? EMPTY_BOOK;
  const touched = touchSet(rework.touches, bookOf(rework));
  const remarks = [...touched.remarks];
  const reasons = new Map<string, DoubtReason[]>();
  const give = (id: string, reason: DoubtReason) => reasons.set(id, [...(reasons.get(id) ?? []), reason]);
  for (const check of graph.checks) {
    for (const sentence of meet(rework, check, touched, bookOf(check))) {
      give(check.id, { why: "touched", sentence, through: [] });
    }
    const implied = reasons.has(check.id) ? undefined : impliedCover(rework, check);
    if (implied !== undefined) give(check.id, { why: "implied", sentence: implied, through: [] });
  }
  const added = new Set<string>();
  for (const { checkId, reason } of choices.added) {
    if (!graph.byId.has(checkId) || added.has(checkId)) continue;
    if (!reasons.has(checkId)) added.add(checkId);
    give(checkId, { why: "added", sentence: reason.trim() || "Added by hand.", through: [] });
  }
  for (const [id, through] of spreadDoubt(graph, (one) => reasons.has(one))) {
    const check = graph.byId.get(id);
    if (!check) continue;
    give(id, { why: "relies", sentence: describeWay(check, through, graph, (one) => added.has(one)), through });
  }
  const spared = new Map<string, string>();
  for (const { checkId, reason } of choices.spared) {
    const check = graph.byId.get(checkId);
    if (reason.trim() !== "") spared.set(checkId, reason.trim());
    else if (check && reasons.has(checkId)) remarks.push(`Say why “${check.title}” of ${check.serial} is spared.`);
  }
  const lines = [...graph.checks]
    .sort((a, b) => Number(b.unitId === rework.unitId) - Number(a.unitId === rework.unitId))
    .map((check) => line(check, reasons.get(check.id), spared.get(check.id), rework));
  const doubtful = lines.flatMap(({ checkId, outcome }) => (outcome === "doubtful" ? [checkId] : []));
  const repeated = doubtful.flatMap((id) => graph.byId.get(id) ?? []);
  return { lines, doubtful, repeat: repeatWork(repeated, paces), remarks: [...new Set(remarks)] };
}

function meet(rework: Rework, check: CoveringCheck, touched: TouchSet, book: BoardBook): string[] {
  if (check.unitId === rework.unitId) return meetCovers(check.covers, touched, book);
  if (check.stage !== "integration" || !rework.neighbours.includes(check.unitId)) return [];
  const { signals, pins } = check.covers;
  // Pins and parts of the reworked board are not the neighbour's, whatever they are called.
  const onNets = { ...touched, pins: new Set<string>(), pinNames: new Set<string>(), parts: new Map<string, string>() };
  return meetCovers({ signals, pins, rails: [], blocks: [] }, onNets, book);
}

function line(
  { id: checkId, state, unitId, covers }: CoveringCheck,
  found: readonly DoubtReason[] | undefined,
  spared: string | undefined,
  rework: Rework,
): DoubtLine {
  const [first, ...rest] = found ?? [];
  if (!first) {
    const sentence =
      unitId !== rework.unitId
        ? "It is of another unit and relies on nothing that is touched."
        : statesNothing(covers)
          ? "It does not say what it covers, and firmware moves neither joints nor copper nor current."
          : "Nothing that it covers or relies on is touched.";
    return { checkId, outcome: "untouched", sentence };
  }
  const reasons: [DoubtReason, ...DoubtReason[]] = [first, ...rest];
  if (state !== "passed") return { checkId, outcome: "open", sentence: NO_PASS[state], reasons };
  return spared === undefined
    ? { checkId, outcome: "doubtful", reasons }
    : { checkId, outcome: "spared", reason: spared, reasons };
}

const NO_PASS: Record<Exclude<CheckState, "passed">, string> = {
  waiting: "It has not been done yet.",
  untested: "It has not been done yet.",
  failed: "It fails as it is; it will be repeated anyway.",
  reopened: "It is open again already.",
  doubtful: "It is in doubt already.",
  conceded: "A concession accepts it. That stands; withdraw it if the rework mends the fault.",
};
