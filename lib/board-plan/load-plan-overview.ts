import { database } from "@/db/client";
import { findBuiltUnits } from "@/db/queries/blocks";
import { findBomLines } from "@/db/queries/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { outdatedUnits, type OutdatedUnit } from "@/lib/block/outdated-units";
import { loadDesigns } from "./load-designs";
import { packBoard, planOf } from "./pack-board";

export type PlanLine = {
  code: string;
  name: string;
  family: string;
  /** Names of the blocks it uses, with their counts. */
  blocks: { name: string; count: number }[];
  packages: number;
  spares: number;
  /** Whether somebody said that their inputs are tied; undefined where there is nothing to tie. */
  tied: boolean | undefined;
  /** What keeps its packages from being counted. */
  problem: string | undefined;
  otherParts: number;
  built: number;
  planned: number | null;
};
export type PlanOverview = { lines: PlanLine[]; outdated: OutdatedUnit[] };

export async function loadPlanOverview(scope: ProjectScope): Promise<PlanOverview> {
  const db = database();
  const [designs, units, bom] = await Promise.all([
    loadDesigns(db, scope),
    findBuiltUnits(db, scope),
    findBomLines(db, scope),
  ]);
  const { blocks, holdings, uses } = designs;
  const lines = designs.boards.map(({ id, code, name }): PlanLine => {
    const plan = planOf(designs, id);
    const own = uses.filter(({ boardId }) => boardId === id);
    const packed = packBoard(designs, id);
    const spares = packed.ok ? packed.packing.spares.length : 0;
    return {
      ...{ code, name, spares, family: plan.family, planned: plan.unitsPlanned },
      blocks: own.map(({ blockId, count }) => ({
        count,
        name: blocks.find((block) => block.id === blockId)?.name ?? "",
      })),
      packages: packed.ok ? packed.packing.packageCount : 0,
      tied: spares === 0 ? undefined : plan.sparesTied,
      problem: packed.ok ? undefined : packed.problems[0]?.message,
      otherParts: bom.filter(({ boardId }) => boardId === id).reduce((sum, { count }) => sum + count, 0),
      built: units.filter(({ boardId }) => boardId === id).length,
    };
  });
  return { lines, outdated: outdatedUnits({ blocks, holdings, uses, units }) };
}
