import type { Transaction } from "@/db/client";
import { findRevision } from "@/db/queries/boards";
import { findFaultsToChange, findReworksToTake, findStandingConcessions } from "@/db/queries/punch";
import { punchItems } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { nameRework, wireWords } from "@/lib/rework/rework-words";
import type { TakePunchInput } from "./schema";

/**
 * A revision takes what the units of the earlier ones taught: faults with something to change, standing concessions,
 * reworks. Taken again it adds only what is new; what is ticked off stays so.
 */
export async function takePunch(scope: ProjectScope, input: TakePunchInput): Promise<Answer<{ items: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "take-punch" }, async (tx) => {
    const found = await findRevision(tx, scope, input.revisionId);
    if (!found) return reject("not-found", "There is no such revision in this project.");
    const { revision, board } = found;
    const rows = await itemsFor(tx, scope, { boardId: board.id, letter: revision.letter });
    const taken =
      rows.length === 0
        ? []
        : await tx
            .insert(punchItems)
            .values(rows.map((row) => ({ ...row, projectId, revisionId: revision.id })))
            .onConflictDoNothing()
            .returning({ id: punchItems.id });
    if (taken.length > 0) {
      const subject = { projectId, actorId: viewer.userId, subjectId: revision.id };
      const { code } = board;
      await recordEvent(tx, subject, "punch.taken", { code, letter: revision.letter, items: taken.length });
    }
    return { items: taken.length };
  });
}

type Item = Pick<typeof punchItems.$inferInsert, "source" | "sourceId" | "unitId" | "text">;

async function itemsFor(
  tx: Transaction,
  scope: ProjectScope,
  revision: { boardId: string; letter: string },
): Promise<Item[]> {
  const found = await findFaultsToChange(tx, scope, revision);
  const conceded = await findStandingConcessions(tx, scope, revision);
  const reworked = await findReworksToTake(tx, scope, revision);
  return [
    ...found.map(({ id, unitId, title, nextRevision }): Item => ({
      ...{ source: "fault", sourceId: id, unitId },
      text: `${nextRevision} (${title})`,
    })),
    ...conceded.map(({ id, unitId, title, reason }): Item => ({
      ...{ source: "concession", sourceId: id, unitId },
      text: `${title}: ${reason}`,
    })),
    ...reworked.map(({ id, unitId, kind, number, wire, what, why }): Item => ({
      ...{ source: "rework", sourceId: id, unitId },
      text: `${nameRework({ kind, number, wire })}${wire ? `, ${wireWords(wire)}` : ""}: ${why === "" ? what : `${what} (${why})`}`,
    })),
  ];
}
