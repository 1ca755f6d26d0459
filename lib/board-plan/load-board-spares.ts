import { database } from "@/db/client";
import { findBuiltUnits } from "@/db/queries/blocks";
import type { ProjectScope } from "@/lib/access/scope";
import { outdatedUnits, type OutdatedUnit } from "@/lib/block/outdated-units";
import type { PlacedPackage, SpareGate } from "@/lib/calc/packing";
import { loadDesigns } from "./load-designs";
import { packBoard, planOf } from "./pack-board";

export type BoardSpares = {
  packages: PlacedPackage[];
  spares: SpareGate[];
  tied: boolean;
  outdated: OutdatedUnit[];
};

/** What the board's own page says of its packages: where a spare gate is that a rework can use. Undefined: no blocks. */
export async function loadBoardSpares(scope: ProjectScope, code: string): Promise<BoardSpares | undefined> {
  const db = database();
  const [designs, units] = await Promise.all([loadDesigns(db, scope), findBuiltUnits(db, scope)]);
  const board = designs.boards.find((one) => one.code === code.toUpperCase());
  if (!board || !designs.uses.some(({ boardId }) => boardId === board.id)) return undefined;
  const packed = packBoard(designs, board.id);
  const { blocks, holdings, uses } = designs;
  return {
    packages: packed.ok ? packed.packing.packages : [],
    spares: packed.ok ? packed.packing.spares : [],
    tied: planOf(designs, board.id).sparesTied,
    outdated: outdatedUnits({ blocks, holdings, uses, units }).filter(({ boardId }) => boardId === board.id),
  };
}
