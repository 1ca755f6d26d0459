import { insideOf, type Holding } from "./block-graph";

type BlockRow = { id: string; name: string; createdAt: Date; changedAt: Date };
type Rows = {
  blocks: readonly BlockRow[];
  holdings: readonly Holding[];
  uses: readonly { boardId: string; blockId: string }[];
  units: readonly { boardId: string; serial: string; createdAt: Date }[];
};

/** A unit that was there before a block of its board changed: the block says how the next one is built, not this one. */
export type OutdatedUnit = { serial: string; boardId: string; block: { id: string; name: string }; changedAt: string };

/**
 * A block that never changed since it was written down makes nothing outdated: whoever writes an old design down says
 * how it is.
 */
export function outdatedUnits({ blocks, holdings, uses, units }: Rows): OutdatedUnit[] {
  const byId = new Map(blocks.map((block) => [block.id, block]));
  const inside = new Map<string, BlockRow[]>();
  for (const boardId of new Set(units.map((unit) => unit.boardId))) {
    const used = uses.filter((use) => use.boardId === boardId).map(({ blockId }) => blockId);
    inside.set(
      boardId,
      [...insideOf(holdings, used)].flatMap((id) => byId.get(id) ?? []),
    );
  }
  return units.flatMap(({ boardId, serial, createdAt }) =>
    (inside.get(boardId) ?? [])
      .filter((block) => block.changedAt > block.createdAt && createdAt < block.changedAt)
      .map(({ id, name, changedAt }) => ({
        serial,
        boardId,
        block: { id, name },
        changedAt: changedAt.toISOString(),
      })),
  );
}
