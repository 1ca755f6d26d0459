import { existsSync } from "node:fs";
import { join } from "node:path";
import postgres from "postgres";
import { root, runScript } from "../run-typescript";

const seed = "db/seed/run.ts";

async function withSql<T>(url: string, work: (sql: postgres.Sql) => Promise<T>): Promise<T> {
  const sql = postgres(url, { max: 1, connect_timeout: 10, onnotice: () => undefined });
  try {
    return await work(sql);
  } finally {
    await sql.end({ timeout: 5 });
  }
}

async function isSeeded(url: string): Promise<boolean> {
  return withSql(url, async (sql) => {
    const [found] = await sql`select to_regclass('demo.seeded') is not null as yes`;
    return found?.["yes"] === true;
  });
}

/** A run killed while seeding leaves half of it: without the marker the database starts afresh. */
async function emptyDatabase(url: string): Promise<void> {
  const admin = new URL(url);
  const name = admin.pathname.slice(1);
  admin.pathname = "/postgres";
  await withSql(admin.href, async (sql) => {
    await sql`drop database if exists ${sql(name)} with (force)`;
    await sql`create database ${sql(name)}`;
  });
}

/** Migrates, and fills the database once; a marker in the database itself, set last, says that it is done. */
export async function prepareDatabase(env: Record<string, string>): Promise<void> {
  const url = env["DATABASE_URL"] ?? "";
  const hasSeed = existsSync(join(root, seed));
  const seeded = await isSeeded(url);
  if (hasSeed && !seeded) {
    await emptyDatabase(url);
    await fetch(`${env["FAKE_OBJECT_STORE_URL"]}/__fake/clear`, { method: "POST" });
  }
  await runScript("scripts/migrate.ts", env);
  if (!hasSeed || seeded) return;
  console.log("Filling the database with the tide computer.");
  await runScript(seed, env);
  await withSql(url, (sql) => sql`create schema demo create table seeded (at timestamptz not null default now())`);
}
