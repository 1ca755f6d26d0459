import { unplanned } from "@/db/queries/board-plans";
import { findFamily } from "@/lib/calc/levels";
import { choosePackages, pack, type BlockDesign, type PackingMode, type PackingResult } from "@/lib/calc/packing";
import type { Designs } from "./load-designs";

export const planOf = ({ plans }: Pick<Designs, "plans">, boardId: string) =>
  plans.find((plan) => plan.boardId === boardId) ?? unplanned(boardId);

/** Blocks as packing takes them. */
export const blockDesigns = ({ blocks, holdings }: Pick<Designs, "blocks" | "holdings">): BlockDesign[] =>
  blocks.map(({ id, name, gates }) => ({
    id,
    name,
    gates,
    children: holdings.filter(({ blockId }) => blockId === id).map(({ childId, count }) => ({ block: childId, count })),
  }));

/** A family that is no longer in the table is taken for CMOS: the one whose open inputs do harm. */
export function familyOf({ families }: Pick<Designs, "families">, name: string) {
  return { name, technology: findFamily(families, name)?.technology ?? ("CMOS" as const) };
}

/** The packages of one board by its plan, or by another mode than it says. */
export function packBoard(designs: Designs, boardId: string, mode?: PackingMode): PackingResult {
  const plan = planOf(designs, boardId);
  const blocks = blockDesigns(designs);
  const use = designs.uses
    .filter((use) => use.boardId === boardId)
    .map(({ blockId, count }) => ({ block: blockId, count }));
  return pack({
    blocks,
    board: { use, loose: [] },
    packages: choosePackages(blocks, [], designs.own),
    family: familyOf(designs, plan.family),
    mode: mode ?? plan.packing,
  });
}
