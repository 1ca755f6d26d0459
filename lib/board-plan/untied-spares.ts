import type { BoardDesign } from "@/lib/calc/interconnect";
import { groupSpares } from "@/lib/calc/packing";
import type { Designs } from "./load-designs";
import { familyOf, packBoard, planOf } from "./pack-board";

/**
 * Spare gates whose inputs nobody has tied yet, by the code of the board. Only of CMOS, whose open inputs drift; a board
 * that uses no block has none.
 */
export function untiedSpares(designs: Designs): Map<string, BoardDesign["untiedSpares"]> {
  const found = new Map<string, BoardDesign["untiedSpares"]>();
  for (const { id, code } of designs.boards) {
    const { sparesTied, family } = planOf(designs, id);
    if (sparesTied || familyOf(designs, family).technology !== "CMOS") continue;
    if (!designs.uses.some((use) => use.boardId === id)) continue;
    const packed = packBoard(designs, id);
    if (packed.ok) found.set(code, groupSpares(packed.packing.spares, family));
  }
  return found;
}
