import { drizzle, type PostgresJsDatabase } from "drizzle-orm/postgres-js";
import postgres from "postgres";
import { env } from "@/lib/env";

export type Database = PostgresJsDatabase;
/** What queries take: the database or a running transaction. */
export type Transaction = Parameters<Parameters<Database["transaction"]>[0]>[0];
export type Queryable = Database | Transaction;

export function connect(url: string, poolSize = 10) {
  const client = postgres(url, {
    max: poolSize,
    connect_timeout: 5,
    idle_timeout: 60,
    onnotice: () => undefined,
    connection: { application_name: "boardwake", statement_timeout: 20_000 },
  });
  return { client, db: drizzle(client) };
}

type Connection = ReturnType<typeof connect>;
const kept = globalThis as typeof globalThis & { boardwakeDatabase?: Connection };

/** One pool a process, opened on first use; kept across hot reloads. */
export function database(): Database {
  kept.boardwakeDatabase ??= connect(env().DATABASE_URL, env().DATABASE_POOL);
  return kept.boardwakeDatabase.db;
}

export async function closeDatabase(): Promise<void> {
  await kept.boardwakeDatabase?.client.end({ timeout: 5 });
  delete kept.boardwakeDatabase;
}
