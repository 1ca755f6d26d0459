import { gateFunctionName } from "../logic-parts";
import { type BlockDesign, type GateCount, type PackingInput, type PackingProblem } from "./design";
import { findCycle } from "./find-cycle";

/** More of one thing in one place is taken for a slip of the keyboard. */
export const MOST_OF_ONE = 10_000;

/**
 * Everything that is wrong with a design, each with its row; empty: it can be packed. Counts and cycles are looked at in
 * all blocks, missing parts only in those that the board comes to.
 */
export function checkDesign({ blocks, board, packages }: PackingInput): PackingProblem[] {
  const names = new Map(blocks.map((block) => [block.id, block.name]));
  const problems: PackingProblem[] = [];
  const add = (row: string, message: string | undefined) => {
    if (message) problems.push({ row, message });
  };
  const reached = reachedBlocks(blocks, board.use);
  const checkGates = (row: string, where: string, gates: readonly GateCount[], wantsParts: boolean) =>
    gates.forEach(({ gateFunction, count }, index) => {
      const what = gateFunctionName(gateFunction);
      add(`${row}/${index}`, countProblem(where, what, count));
      if (!wantsParts) return;
      const part = Object.hasOwn(packages, gateFunction) ? packages[gateFunction] : undefined;
      if (!part) add(`${row}/${index}`, `${where}: no part is chosen for “${what}”. Choose one, or add your own.`);
      else if (!isCount(part.gatesPerPackage))
        add(`${row}/${index}`, `${where}: the part for “${what}” must have at least one gate in its package.`);
    });
  const checkBlocks = (row: string, where: string, used: readonly { block: string; count: number }[]) =>
    used.forEach(({ block, count }, index) => {
      const name = names.get(block);
      if (name === undefined) add(`${row}/${index}`, `${where}, row ${index + 1}: there is no block “${block}”.`);
      else add(`${row}/${index}`, countProblem(where, name, count));
    });

  for (const block of blocks) {
    checkGates(`block:${block.id}/gates`, `Block “${block.name}”`, block.gates, reached.has(block.id));
    checkBlocks(`block:${block.id}/children`, `Block “${block.name}”`, block.children);
  }
  checkBlocks("board/use", "Board", board.use);
  checkGates("board/loose", "Board, loose gates", board.loose, true);
  return [...problems, ...twiceProblems(blocks), ...cycleProblems(blocks)];
}

function reachedBlocks(blocks: readonly BlockDesign[], use: readonly { block: string }[]): Set<string> {
  const byId = new Map(blocks.map((block) => [block.id, block]));
  const reached = new Set(use.map(({ block }) => block));
  for (const id of reached) for (const child of byId.get(id)?.children ?? []) reached.add(child.block);
  return reached;
}

const isCount = (count: number): boolean => Number.isInteger(count) && count >= 1;

function countProblem(where: string, what: string, count: number): string | undefined {
  if (!isCount(count)) return `${where}, “${what}”: ${count} is no count. Give a whole number from 1.`;
  if (count > MOST_OF_ONE)
    return `${where}, “${what}”: ${count} is more than ${MOST_OF_ONE} of one thing. Is it a slip?`;
  return undefined;
}

function twiceProblems(blocks: readonly BlockDesign[]): PackingProblem[] {
  const seen = new Set<string>();
  return blocks.flatMap((block) => {
    if (!seen.has(block.id)) {
      seen.add(block.id);
      return [];
    }
    return [
      { row: `block:${block.id}`, message: `Two blocks are called “${block.id}”: “${block.name}” is the second.` },
    ];
  });
}

function cycleProblems(blocks: readonly BlockDesign[]): PackingProblem[] {
  const cycle = findCycle(blocks);
  const first = cycle?.[0];
  if (!cycle || !first) return [];
  const members = cycle.map((block) => block.name).join(" → ");
  const message =
    cycle.length === 2
      ? `Block “${first.name}” contains itself. Take it out of itself.`
      : `Blocks contain each other: ${members}. Take one of them out of the one before it.`;
  return [{ row: `block:${first.id}`, message }];
}
