import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { lockPunchItem } from "@/db/queries/punch";
import { punchItems } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { DealPunchInput, ReopenPunchInput } from "./schema";

type Dealt = { id: string; version: number };

/** Ticks an item off with how it was dealt with. */
export async function dealPunch(scope: ProjectScope, input: DealPunchInput): Promise<Answer<Dealt>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "deal-punch" }, async (tx) => {
    const { item, code, letter } = await openItem(tx, scope, input);
    const version = item.version + 1;
    await tx
      .update(punchItems)
      .set({ dealtWith: input.how, dealtBy: viewer.userId, dealtAt: new Date(), version })
      .where(eq(punchItems.id, item.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: item.id };
    await recordEvent(tx, subject, "punch.dealt", { code, letter, item: item.text, how: input.how });
    return { id: item.id, version };
  });
}

/** Takes the tick back. */
export async function reopenPunch(scope: ProjectScope, input: ReopenPunchInput): Promise<Answer<Dealt>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "reopen-punch" }, async (tx) => {
    const { item, code, letter } = await openItem(tx, scope, input);
    if (item.dealtWith === "") return { id: item.id, version: item.version };
    const version = item.version + 1;
    await tx
      .update(punchItems)
      .set({ dealtWith: "", dealtBy: null, dealtAt: null, version })
      .where(eq(punchItems.id, item.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: item.id };
    await recordEvent(tx, subject, "punch.reopened", { code, letter, item: item.text });
    return { id: item.id, version };
  });
}

async function openItem(tx: Transaction, scope: ProjectScope, { itemId, version }: ReopenPunchInput) {
  const found = await lockPunchItem(tx, scope, itemId);
  if (!found) return reject("not-found", "There is no such item on a punch list of this project.");
  if (found.item.version !== version) {
    const { dealtWith, version: current } = found.item;
    reject("conflict", "Somebody ticked this item meanwhile. Look at it and do it again.", {
      details: { current: { dealtWith, version: current } },
    });
  }
  return found;
}
