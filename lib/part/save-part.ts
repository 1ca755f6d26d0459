import { eq } from "drizzle-orm";
import { lockPart } from "@/db/queries/parts";
import { parts } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectUsedFunction } from "./reject-used-function";
import type { SavePartInput } from "./schema";

/** Adds one of the project's own parts, or changes one. */
export async function savePart(
  scope: ProjectScope,
  input: SavePartInput,
): Promise<Answer<{ number: string; version: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-part" }, async (tx) => {
    const current = input.part === "" ? undefined : await lockPart(tx, scope, { id: input.part });
    if (input.part !== "" && !current) return reject("not-found", "There is no such part in this project.");
    if (current && current.version !== input.version) {
      const { number, description, stock, priceCents, note, version } = current;
      reject("conflict", "Somebody changed this part meanwhile. Look at both and save again.", {
        details: { current: { number, description, stock, priceCents, note, version } },
      });
    }
    const { number, description, stock, price, note } = input;
    const same = await lockPart(tx, scope, { number });
    if (same && same.id !== current?.id) {
      const sentence = `${number} is in the list already${same.archivedAt ? ", archived" : ""}. Change that one instead.`;
      reject("conflict", sentence, { fields: { number: sentence } });
    }
    const logic = input.logic === null ? null : { ...input.logic, number };
    const values = { number, description, stock, priceCents: price, note, logic };
    const version = (current?.version ?? 0) + 1;
    const [row] = current
      ? await tx
          .update(parts)
          .set({ ...values, version })
          .where(eq(parts.id, current.id))
          .returning({ id: parts.id })
      : await tx
          .insert(parts)
          .values({ projectId, ...values })
          .returning({ id: parts.id });
    const subject = { projectId, actorId: viewer.userId, subjectId: row?.id };
    await recordEvent(tx, subject, current ? "part.edited" : "part.added", { number });
    if (current && current.logic !== null) await rejectUsedFunction(tx, scope, current.number);
    await refreshFindings(tx, scope);
    return { number, version };
  });
}
