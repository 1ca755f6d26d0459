import { and, eq, ne, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findBoardByCode } from "@/db/queries/boards";
import { lockDelayPath } from "@/db/queries/delay-paths";
import { findOwnFamilies } from "@/db/queries/machine";
import { findParts } from "@/db/queries/parts";
import { delayPaths } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { familiesOf } from "@/lib/family/families-of";
import { ownLogic } from "@/lib/part/own-logic";
import type { SaveDelayPathInput } from "./schema";
import { workOut } from "./work-out";

/** Adds a delay path or changes one. A path that cannot be worked out is refused at the step that keeps it from it. */
export async function saveDelayPath(
  scope: ProjectScope,
  input: SaveDelayPathInput,
): Promise<Answer<{ id: string; version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-delay-path" }, async (tx) => {
    const current = input.id === "" ? undefined : await lockDelayPath(tx, scope, input.id);
    if (input.id !== "" && !current) return reject("not-found", "There is no such delay path in this project.");
    if (current && current.version !== input.version) {
      reject("conflict", "Somebody changed this path meanwhile. Look at both and save again.", {
        details: { current: { name: current.name, version: current.version } },
      });
    }
    await rejectTakenName(tx, scope, input);
    const board = input.board === "" ? undefined : await findBoardByCode(tx, scope, input.board.toUpperCase());
    if (input.board !== "" && !board) {
      const sentence = `There is no board ${input.board} in this project.`;
      reject("invalid", sentence, { fields: { board: sentence } });
    }
    await rejectUnworkable(tx, scope, input);
    const values = { name: input.name, boardId: board?.id ?? null, path: input.path };
    const [row] = current
      ? await tx
          .update(delayPaths)
          .set({ ...values, version: current.version + 1 })
          .where(eq(delayPaths.id, current.id))
          .returning({ id: delayPaths.id, version: delayPaths.version })
      : await tx
          .insert(delayPaths)
          .values({ projectId, ...values })
          .returning({ id: delayPaths.id, version: delayPaths.version });
    if (!row) throw new Error("writing a delay path returned no row");
    const subject = { projectId, actorId: viewer.userId, subjectId: row.id };
    await recordEvent(tx, subject, current ? "delay.edited" : "delay.created", { name: input.name });
    return row;
  });
}

async function rejectTakenName(tx: Transaction, { projectId }: ProjectScope, { id, name }: SaveDelayPathInput) {
  const [same] = await tx
    .select({ name: delayPaths.name, archivedAt: delayPaths.archivedAt })
    .from(delayPaths)
    .where(
      and(
        eq(delayPaths.projectId, projectId),
        sql`lower(${delayPaths.name}) = lower(${name})`,
        id === "" ? undefined : ne(delayPaths.id, id),
      ),
    );
  if (!same) return;
  const sentence = `There is a path ${same.name}${same.archivedAt ? ", which is archived" : ""} already. Choose another name.`;
  reject("conflict", sentence, { fields: { name: sentence } });
}

async function rejectUnworkable(tx: Transaction, scope: ProjectScope, { path }: SaveDelayPathInput): Promise<void> {
  const [parts, families] = await Promise.all([findParts(tx, scope), findOwnFamilies(tx, scope)]);
  const worked = workOut(path, { own: ownLogic(parts), families: familiesOf(families) });
  if (worked.ok) return;
  const step = /^steps\/(\d+)$/.exec(worked.field)?.[1];
  const field = step === undefined ? `path.${worked.field}` : `path.steps.${step}.typicalS`;
  reject("invalid", worked.message, { fields: { [field]: worked.message } });
}
