import { afterAll } from "vitest";
import { closeDatabase, database } from "@/db/client";

/** The database of the integration tests; call it once at the top of a test file. Closed when the file is done. */
export function useDatabase() {
  afterAll(closeDatabase);
  return database();
}

/** The one row that must be there. */
export function one<Row>(rows: readonly Row[]): Row {
  const [row] = rows;
  if (row === undefined || rows.length > 1) throw new Error(`expected one row, got ${rows.length}`);
  return row;
}
