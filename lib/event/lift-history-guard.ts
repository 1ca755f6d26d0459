import { sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";

/**
 * Lets the rest of the transaction delete attempts and what else is final; for the use cases that purge and for
 * nothing else.
 */
export async function liftHistoryGuard(tx: Transaction): Promise<void> {
  await tx.execute(sql`select set_config('boardwake.purge', 'on', true)`);
}
