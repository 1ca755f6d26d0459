import { drizzle } from "drizzle-orm/postgres-js";
import postgres from "postgres";
import { closeDatabase, database } from "@/db/client";

/** What the work asks the database, statement by statement, through a logger on a connection of its own. */
export async function queriesOf(work: () => Promise<unknown>): Promise<string[]> {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error("DATABASE_URL is not set");
  database();
  const kept = globalThis as typeof globalThis & { boardwakeDatabase?: unknown };
  const before = kept.boardwakeDatabase;
  const queries: string[] = [];
  const client = postgres(url, { max: 4, onnotice: () => undefined });
  kept.boardwakeDatabase = { client, db: drizzle(client, { logger: { logQuery: (query) => queries.push(query) } }) };
  try {
    await work();
  } finally {
    await closeDatabase();
    kept.boardwakeDatabase = before;
  }
  return queries;
}
