import { eq } from "drizzle-orm";
import { database, type Transaction } from "@/db/client";
import { writes } from "@/db/schema/events";
import { ok, RefusalError, type Answer } from "@/lib/actions/answer";

/** The client's own UUID of a write: repeating it (double click, retry, replay after a lost network) changes nothing. */
export type Write = { writeId: string; userId: string | null; action: string };

/**
 * Runs one change: all or nothing, once. `work` does the whole change in the given transaction and may reject();
 * its value must be JSON, since a repeat of the same write id gets the stored value back.
 * Two requests with the same id at once: the second waits for the first at the unique key.
 */
export async function change<Value>(write: Write, work: (tx: Transaction) => Promise<Value>): Promise<Answer<Value>> {
  try {
    const value = await database().transaction(async (tx) => {
      const fresh = await tx
        .insert(writes)
        .values({ id: write.writeId, userId: write.userId, action: write.action })
        .onConflictDoNothing()
        .returning({ id: writes.id });
      if (fresh.length === 0) return await firstAnswer<Value>(tx, write);
      const done = await work(tx);
      await tx
        .update(writes)
        .set({ answer: done ?? null })
        .where(eq(writes.id, write.writeId));
      return done;
    });
    return ok(value);
  } catch (error) {
    if (error instanceof RefusalError) return { ok: false, error: error.refusal };
    throw error;
  }
}

async function firstAnswer<Value>(tx: Transaction, write: Write): Promise<Value> {
  const [row] = await tx.select().from(writes).where(eq(writes.id, write.writeId));
  if (!row || row.action !== write.action || row.userId !== write.userId) {
    throw new RefusalError({
      code: "conflict",
      message: "This write id was used for something else. Nothing was changed.",
    });
  }
  // What this very action stored under this id: the same type by construction.
  return row.answer as Value;
}
