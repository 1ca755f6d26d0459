import { sql } from "drizzle-orm";
import { database } from "@/db/client";

type Table = { name: string };

/** A digest of every row of every table, jobs included: equal before and after means that nothing at all was changed. */
export async function wholeDatabase(): Promise<Record<string, string>> {
  const tables = await database().execute<Table>(sql`
    select format('%I.%I', schemaname, tablename) as name from pg_tables
    where schemaname = 'public' or (schemaname = 'graphile_worker' and tablename = '_private_jobs')
    order by 1`);
  const parts = tables.map(
    ({ name }) => sql`
      select ${name}::text as name, count(*)::text || ' ' || coalesce(md5(string_agg(t::text, '|' order by t::text)), '') as digest
      from ${sql.raw(name)} t`,
  );
  const rows = await database().execute<{ name: string; digest: string }>(sql.join(parts, sql` union all `));
  return Object.fromEntries(rows.map(({ name, digest }) => [name, digest]));
}

/** Every row that says which project it belongs to, for one project. */
export async function contentsOf(project: { id: string }): Promise<Record<string, string>> {
  const tables = await database().execute<Table>(sql`
    select format('%I.%I', table_schema, table_name) as name from information_schema.columns
    where table_schema = 'public' and column_name = 'project_id' order by 1`);
  const parts = tables.map(
    ({ name }) => sql`
      select ${name}::text as name, coalesce(md5(string_agg(t::text, '|' order by t::text)), '') as digest
      from ${sql.raw(name)} t where project_id = ${project.id}`,
  );
  const rows = await database().execute<{ name: string; digest: string }>(sql.join(parts, sql` union all `));
  return Object.fromEntries(rows.map(({ name, digest }) => [name, digest]));
}
