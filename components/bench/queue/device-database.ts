import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { HeldAttempt, HeldFile } from "./held-attempt";

export type StoredAttempt = Omit<HeldAttempt, "order"> & { order?: number };

type Schema = DBSchema & {
  attempts: { key: number; value: StoredAttempt; indexes: { id: string } };
  files: { key: string; value: HeldFile; indexes: { checkId: string } };
};

let opened: Promise<IDBPDatabase<Schema>> | undefined;

/** The bench's own database on this device, opened on first use. */
export function deviceDatabase(): Promise<IDBPDatabase<Schema>> {
  opened ??= openDB<Schema>("boardwake-bench", 1, {
    upgrade(db) {
      // The key counts up over all tabs, which is the order in which attempts were made on this device.
      const attempts = db.createObjectStore("attempts", { keyPath: "order", autoIncrement: true });
      attempts.createIndex("id", "body.id", { unique: true });
      db.createObjectStore("files", { keyPath: "uploadId" }).createIndex("checkId", "checkId");
    },
    blocking: (_current, _next, event) => {
      // A newer build in another tab wants to change the store: let go and open again on the next use.
      opened = undefined;
      if (event.target instanceof IDBDatabase) event.target.close();
    },
    terminated: () => {
      opened = undefined;
    },
  });
  opened.catch(() => {
    opened = undefined;
  });
  return opened;
}
