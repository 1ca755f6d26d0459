import type { Queryable } from "@/db/client";
import { findBlockChildren, findBlocks, findBoardBlocks, findBoardsInWork } from "@/db/queries/blocks";
import { findBoardPlans } from "@/db/queries/board-plans";
import { findOwnFamilies } from "@/db/queries/machine";
import { findParts } from "@/db/queries/parts";
import { familiesOf } from "@/lib/family/families-of";
import { ownLogic } from "@/lib/part/own-logic";

/** What packing takes, for all boards in work of a project. Seven queries, whatever its size. */
export async function loadDesigns(db: Queryable, scope: { projectId: string }) {
  const [boards, plans, uses, blocks, holdings, parts, families] = await Promise.all([
    findBoardsInWork(db, scope),
    findBoardPlans(db, scope),
    findBoardBlocks(db, scope),
    findBlocks(db, scope),
    findBlockChildren(db, scope),
    findParts(db, scope),
    findOwnFamilies(db, scope),
  ]);
  return { boards, plans, uses, blocks, holdings, parts, own: ownLogic(parts), families: familiesOf(families) };
}

export type Designs = Awaited<ReturnType<typeof loadDesigns>>;
