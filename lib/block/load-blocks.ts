import { database } from "@/db/client";
import type { ProjectScope } from "@/lib/access/scope";
import { loadDesigns, type Designs } from "@/lib/board-plan/load-designs";
import { aroundOf, insideOf, timesInside } from "./block-graph";
import { gatesInside, type GateLine } from "./gates-inside";

export type BlockLine = {
  id: string;
  name: string;
  summary: string;
  version: number;
  changedAt: string;
  archived: boolean;
  gates: GateLine[];
  children: { block: string; name: string; count: number }[];
  /** With everything inside it. */
  allGates: GateLine[];
  /** Boards that have it, directly or through others, and how often. */
  boards: { code: string; count: number }[];
};

export async function loadBlocks(scope: ProjectScope): Promise<BlockLine[]> {
  return blockLines(await loadDesigns(database(), scope));
}

export function blockLines(designs: Designs): BlockLine[] {
  const { blocks, holdings } = designs;
  const names = new Map(blocks.map(({ id, name }) => [id, name]));
  return blocks.map(({ id, name, summary, version, changedAt, archivedAt, gates }) => ({
    ...{ id, name, summary, version },
    changedAt: changedAt.toISOString(),
    archived: archivedAt !== null,
    gates: gatesInside([{ gates, times: 1 }]),
    children: holdings
      .filter(({ blockId }) => blockId === id)
      .map(({ childId, count }) => ({ block: childId, name: names.get(childId) ?? "", count }))
      .sort((one, other) => one.name.localeCompare(other.name)),
    allGates: gatesInside(
      blocks
        .filter((inner) => insideOf(holdings, [id]).has(inner.id))
        .map((inner) => ({ gates: inner.gates, times: timesInside(holdings, id, inner.id) })),
    ),
    boards: boardsWith(designs, id),
  }));
}

/** On which boards a block stands, directly or through others, and how often. */
function boardsWith({ boards, uses, holdings }: Designs, id: string): { code: string; count: number }[] {
  const around = aroundOf(holdings, id);
  return boards.flatMap((board) => {
    const own = uses.filter(({ boardId, blockId }) => boardId === board.id && around.has(blockId));
    const count = own.reduce((sum, use) => sum + use.count * timesInside(holdings, use.blockId, id), 0);
    return count > 0 ? [{ code: board.code, count }] : [];
  });
}
