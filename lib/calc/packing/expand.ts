import { type BlockDesign, type PackingInput } from "./design";

/** Gates by function, in the order in which they first appear. */
export type GateTotals = Map<string, number>;

/** What needs packages as one: an instance of a block on the board, or the loose gates. */
export type Owner = { block: string | null; label: string; gates: GateTotals };

/** Nested counts may multiply to more than a number holds exactly, even to infinity: both are far above what is packed. */
export function addGates(totals: GateTotals, more: Iterable<readonly [string, number]>, times = 1): GateTotals {
  for (const [gateFunction, count] of more) totals.set(gateFunction, (totals.get(gateFunction) ?? 0) + count * times);
  return totals;
}

/** Gates of each block with all that it contains. The blocks must be free of cycles (`checkDesign`). */
export function expandBlocks(blocks: readonly BlockDesign[]): Map<string, GateTotals> {
  const byId = new Map(blocks.map((block) => [block.id, block]));
  const expanded = new Map<string, GateTotals>();
  for (const start of blocks) {
    const stack = [start];
    for (let block = stack.at(-1); block; block = stack.at(-1)) {
      const children = block.children.flatMap(({ block: id }) => byId.get(id) ?? []);
      const missing = children.filter((child) => !expanded.has(child.id));
      if (missing.length > 0) {
        stack.push(...missing);
        continue;
      }
      stack.pop();
      const totals: GateTotals = addGates(new Map(), gatePairs(block.gates));
      for (const { block: id, count } of block.children) addGates(totals, expanded.get(id) ?? [], count);
      expanded.set(block.id, totals);
    }
  }
  return expanded;
}

export const gatePairs = (gates: readonly { gateFunction: string; count: number }[]): [string, number][] =>
  gates.map(({ gateFunction, count }) => [gateFunction, count]);

/** All gates of the board by function. */
export function boardTotals({ blocks, board }: PackingInput, expanded = expandBlocks(blocks)): GateTotals {
  const totals: GateTotals = new Map();
  for (const { block, count } of board.use) addGates(totals, expanded.get(block) ?? [], count);
  return addGates(totals, gatePairs(board.loose));
}

/** The instances of blocks on the board, then the loose gates. */
export function ownersOf({ blocks, board }: PackingInput, expanded = expandBlocks(blocks)): Owner[] {
  const counts = new Map<string, number>();
  for (const { block, count } of board.use) counts.set(block, (counts.get(block) ?? 0) + count);
  const names = new Map(blocks.map((block) => [block.id, block.name]));
  const owners = [...counts].flatMap(([id, count]) =>
    Array.from({ length: count }, (_, index): Owner => {
      const name = names.get(id) ?? id;
      return {
        block: name,
        label: count === 1 ? name : `${name} ${index + 1} of ${count}`,
        gates: expanded.get(id) ?? new Map(),
      };
    }),
  );
  const loose = addGates(new Map(), gatePairs(board.loose));
  return loose.size > 0 ? [...owners, { block: null, label: "loose gates", gates: loose }] : owners;
}
