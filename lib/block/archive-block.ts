import { eq } from "drizzle-orm";
import { findBlockChildren, findBlocks, findBoardBlocks, findBoardsInWork, lockBlocks } from "@/db/queries/blocks";
import { blocks } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { ChangeBlockInput } from "./schema";

/** A block that something is made of cannot go; the refusal says where it is used. */
export async function archiveBlock(scope: ProjectScope, input: ChangeBlockInput): Promise<Answer<{ name: string }>> {
  return setArchived(scope, input, "archive-block", new Date());
}

export async function restoreBlock(scope: ProjectScope, input: ChangeBlockInput): Promise<Answer<{ name: string }>> {
  return setArchived(scope, input, "restore-block", null);
}

async function setArchived(
  scope: ProjectScope,
  input: ChangeBlockInput,
  action: "archive-block" | "restore-block",
  archivedAt: Date | null,
): Promise<Answer<{ name: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action }, async (tx) => {
    await lockBlocks(tx, scope);
    const [all, holdings, uses, inWork] = await Promise.all([
      findBlocks(tx, scope),
      findBlockChildren(tx, scope),
      findBoardBlocks(tx, scope),
      findBoardsInWork(tx, scope),
    ]);
    const block = all.find(({ id }) => id === input.block);
    if (!block) return reject("not-found", "There is no such block in this project.");
    const { id, name } = block;
    if ((block.archivedAt === null) === (archivedAt === null)) return { name };
    if (archivedAt) {
      const parents = holdings.filter(({ childId }) => childId === id).map(({ blockId }) => blockId);
      const blocksAround = all
        .filter((other) => parents.includes(other.id) && !other.archivedAt)
        .map((other) => `in ${other.name}`);
      const onBoards = uses.filter(({ blockId }) => blockId === id).map(({ boardId }) => boardId);
      const boardsAround = inWork.filter((board) => onBoards.includes(board.id)).map(({ code }) => `on ${code}`);
      const places = [...boardsAround, ...blocksAround];
      if (places.length > 0) reject("conflict", `${name} is used ${listed(places)}. Take it out there first.`);
    }
    const children = holdings.filter(({ blockId }) => blockId === id).map(({ childId }) => childId);
    const gone = all.find((other) => children.includes(other.id) && other.archivedAt);
    if (!archivedAt && gone) {
      reject("conflict", `${name} holds ${gone.name}, which is archived. Restore that first.`);
    }
    await tx.update(blocks).set({ archivedAt }).where(eq(blocks.id, id));
    const subject = { projectId, actorId: viewer.userId, subjectId: id };
    await recordEvent(tx, subject, archivedAt ? "block.archived" : "block.restored", { name });
    return { name };
  });
}

const listed = (places: readonly string[]) =>
  places.length === 1 ? places[0] : `${places.slice(0, -1).join(", ")} and ${places.at(-1)}`;
