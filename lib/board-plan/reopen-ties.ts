import { and, eq, inArray, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { boardPlans } from "@/db/schema/power";
import { loadDesigns, type Designs } from "./load-designs";
import { packBoard } from "./pack-board";

type InProject = { projectId: string };
type SpareSets = ReadonlyMap<string, string>;

/** The spare gates of every board in work and what their pins want, to compare before and after a change. */
export async function spareSets(tx: Transaction, scope: InProject): Promise<SpareSets> {
  return setsOf(await loadDesigns(tx, scope));
}

/**
 * "The ties are on the drawing" was said of certain gates: where a change leaves other gates over, it no longer holds.
 * Gives the codes of those boards.
 */
export async function reopenTies(tx: Transaction, scope: InProject, before: SpareSets): Promise<string[]> {
  const designs = await loadDesigns(tx, scope);
  const after = setsOf(designs);
  const other = designs.plans
    .filter(({ boardId, sparesTied }) => sparesTied && after.get(boardId) !== before.get(boardId))
    .map(({ boardId }) => boardId);
  if (other.length === 0) return [];
  await tx
    .update(boardPlans)
    .set({ sparesTied: false, version: sql`${boardPlans.version} + 1` })
    .where(and(inArray(boardPlans.boardId, other), eq(boardPlans.sparesTied, true)));
  return designs.boards.filter(({ id }) => other.includes(id)).map(({ code }) => code);
}

const setsOf = (designs: Designs): SpareSets =>
  new Map(
    designs.boards.map(({ id }) => {
      const packed = packBoard(designs, id);
      const spares = packed.ok ? packed.packing.spares : [];
      return [
        id,
        JSON.stringify(spares.map(({ designator, gate, tieLow, tieHigh }) => [designator, gate, tieLow, tieHigh])),
      ];
    }),
  );
