import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { HeldAttempt } from "./held-attempt";
import { freshly, type QueueStore } from "./queue-store";

type Schema = DBSchema & {
  attempts: { key: number; value: Omit<HeldAttempt, "order"> & { order?: number }; indexes: { id: string } };
};

let opened: Promise<IDBPDatabase<Schema>> | undefined;

function device(): Promise<IDBPDatabase<Schema>> {
  opened ??= openDB<Schema>("boardwake-bench", 1, {
    upgrade(db) {
      // The key counts up over all tabs, which is the order in which attempts were made on this device.
      const attempts = db.createObjectStore("attempts", { keyPath: "order", autoIncrement: true });
      attempts.createIndex("id", "body.id", { unique: true });
    },
    blocking: (_current, _next, event) => {
      // A newer build in another tab wants to change the store: let go and open again on the next use.
      opened = undefined;
      if (event.target instanceof IDBDatabase) event.target.close();
    },
  });
  opened.catch(() => {
    opened = undefined;
  });
  return opened;
}

const withOrder = (row: Omit<HeldAttempt, "order"> & { order?: number }): HeldAttempt[] =>
  row.order === undefined ? [] : [{ ...row, order: row.order }];

/** Held attempts in IndexedDB: they survive a reload, a closed tab and a dead battery. */
export const deviceStore: QueueStore = {
  async all() {
    const rows = await (await device()).getAll("attempts");
    return rows.flatMap(withOrder);
  },
  async add(attempt) {
    const row = freshly(attempt);
    const order = await (await device()).add("attempts", row);
    return { ...row, order };
  },
  async put(attempt) {
    const transaction = (await device()).transaction("attempts", "readwrite");
    // Only when it is still there: a discarded attempt never comes back.
    if (await transaction.store.getKey(attempt.order)) await transaction.store.put(attempt);
    await transaction.done;
  },
  async remove(id) {
    const db = await device();
    const order = await db.getKeyFromIndex("attempts", "id", id);
    if (order !== undefined) await db.delete("attempts", order);
  },
};
