import { eq } from "drizzle-orm";
import { findBlocks, lockBlocks } from "@/db/queries/blocks";
import { writeBoardPlan } from "@/db/queries/board-plans";
import { findOwnFamilies } from "@/db/queries/machine";
import { boardBlocks } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { familiesOf } from "@/lib/family/families-of";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { openPlan } from "./open-plan";
import { reopenTies, spareSets } from "./reopen-ties";
import type { SaveBoardPlanInput } from "./schema";

/** Which blocks the board uses, and how its packages are counted. */
export async function saveBoardPlan(
  scope: ProjectScope,
  input: SaveBoardPlanInput,
): Promise<Answer<{ version: number; tiesReopened: boolean }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-board-plan" }, async (tx) => {
    await lockBlocks(tx, scope);
    const spares = await spareSets(tx, scope);
    const { board, plan } = await openPlan(tx, scope, input);
    const { packing, family, clockHz, activity, loadPf, unitsPlanned } = input;
    const families = familiesOf(await findOwnFamilies(tx, scope));
    if (!families.some(({ name }) => name === family)) {
      const sentence = `There is no family ${family}. Choose one from the list.`;
      reject("invalid", sentence, { fields: { family: sentence } });
    }
    const before = await tx.select().from(boardBlocks).where(eq(boardBlocks.boardId, board.id));
    const usedBefore = used(before.map(({ blockId, count }) => ({ block: blockId, count })));
    rejectUnknown(await findBlocks(tx, scope), before, input);
    await tx.delete(boardBlocks).where(eq(boardBlocks.boardId, board.id));
    if (input.blocks.length > 0) {
      await tx
        .insert(boardBlocks)
        .values(input.blocks.map(({ block, count }) => ({ boardId: board.id, blockId: block, count })));
    }
    const values = { packing, family, clockHz, activity, loadPf, unitsPlanned };
    const version = await writeBoardPlan(tx, plan, values);
    const tiesReopened = (await reopenTies(tx, scope, spares)).includes(board.code);
    const isOther = packing !== plan.packing || usedBefore !== used(input.blocks);
    const what = isOther ? "its blocks and packages" : "its conditions";
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "plan.edited", { code: board.code, what });
    await refreshFindings(tx, scope);
    return { version: version + (tiesReopened ? 1 : 0), tiesReopened };
  });
}

const used = (rows: readonly { block: string; count: number }[]) =>
  rows
    .map(({ block, count }) => `${block} ${count}`)
    .sort()
    .join();

function rejectUnknown(
  blocks: readonly { id: string; name: string; archivedAt: Date | null }[],
  before: readonly { blockId: string }[],
  input: SaveBoardPlanInput,
): void {
  input.blocks.forEach(({ block }, index) => {
    const found = blocks.find(({ id }) => id === block);
    const wasThere = before.some(({ blockId }) => blockId === block);
    if (found && (!found.archivedAt || wasThere)) return;
    const sentence = found
      ? `Row ${index + 1}: ${found.name} is archived. Restore it first.`
      : `Row ${index + 1}: there is no such block in this project.`;
    reject("invalid", sentence, { fields: { [`blocks.${index}.block`]: sentence } });
  });
}
