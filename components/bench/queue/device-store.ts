import { deviceDatabase, type StoredAttempt } from "./device-database";
import type { HeldAttempt } from "./held-attempt";
import { freshly, type QueueStore } from "./queue-store";

const withOrder = (row: StoredAttempt): HeldAttempt[] =>
  row.order === undefined ? [] : [{ ...row, order: row.order }];

/** Held attempts in IndexedDB: they survive a reload, a closed tab and a dead battery. */
export const deviceStore: QueueStore = {
  async all() {
    const rows = await (await deviceDatabase()).getAll("attempts");
    return rows.flatMap(withOrder);
  },
  async add(attempt) {
    const row = freshly(attempt);
    const order = await (await deviceDatabase()).add("attempts", row);
    return { ...row, order };
  },
  async put(attempt) {
    const transaction = (await deviceDatabase()).transaction("attempts", "readwrite");
    // Only when it is still there: a discarded attempt never comes back.
    if ((await transaction.store.getKey(attempt.order)) !== undefined) await transaction.store.put(attempt);
    await transaction.done;
  },
  async remove(id) {
    const db = await deviceDatabase();
    const order = await db.getKeyFromIndex("attempts", "id", id);
    if (order !== undefined) await db.delete("attempts", order);
  },
};
