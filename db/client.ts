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
    // Short queries only: compiling one takes longer than running it.
    connection: { application_name: "boardwake", statement_timeout: 20_000, jit: "off" },
  });
  const begin = client.begin.bind(client);
  client.begin = <T>(options: string | Work<T>, work?: Work<T>) => {
    if (typeof options !== "string") return begin((sql) => options(keepPlans(sql)));
    return begin(options, (sql) => work?.(keepPlans(sql)) as T);
  };
  return { client: keepPlans(client), db: drizzle(client) };
}

type Work<T> = (sql: postgres.TransactionSql) => T | Promise<T>;

/**
 * The query builder sends each statement unprepared: described and planned anew every time, which for the larger ones
 * takes longer than running them. Here a connection plans each text once. `?prepare=false` in the connection string
 * switches that off, for poolers that cannot do it.
 */
function keepPlans<Sql extends Pick<postgres.TransactionSql, "unsafe">>(sql: Sql): Sql {
  const plain = sql.unsafe;
  sql.unsafe = (query, parameters, options) => plain(query, parameters, { ...options, prepare: true });
  return sql;
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
