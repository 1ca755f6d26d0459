import { and, asc, desc, eq, isNull, or, sql, type SQL } from "drizzle-orm";
import type { PgColumn } from "drizzle-orm/pg-core";
import type { Queryable } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import { logEntries } from "@/db/schema/evidence";
import { faults } from "@/db/schema/faults";
import { procedureChecks } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";

type InProject = { projectId: string };
/** Words that must all be found, in any of the columns. */
export type Wanted = { words: readonly string[]; limit: number };

/** Wildcards in what was typed are characters like any other. */
const pattern = (word: string) => `%${word.replace(/[\\%_]/g, "\\$&")}%`;

function everyWord(words: readonly string[], ...columns: (PgColumn | SQL)[]) {
  return and(...words.map((word) => or(...columns.map((column) => sql`${column} ilike ${pattern(word)}`))));
}

export async function searchBoards(db: Queryable, scope: InProject, { words, limit }: Wanted) {
  return db
    .select({ id: boards.id, code: boards.code, name: boards.name, summary: boards.summary })
    .from(boards)
    .where(
      and(
        eq(boards.projectId, scope.projectId),
        isNull(boards.archivedAt),
        everyWord(words, boards.code, boards.name, boards.summary),
      ),
    )
    .orderBy(asc(boards.code))
    .limit(limit);
}

export async function searchUnits(db: Queryable, scope: InProject, { words, limit }: Wanted) {
  return db
    .select({ id: units.id, serial: units.serial, board: boards.name, revision: revisions.letter })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .where(
      and(
        eq(units.projectId, scope.projectId),
        isNull(units.archivedAt),
        everyWord(words, units.serial, units.note, boards.name),
      ),
    )
    .orderBy(asc(units.serial))
    .limit(limit);
}

const currentChecks = (scope: InProject) =>
  and(eq(checks.projectId, scope.projectId), isNull(checks.retiredAt), isNull(units.archivedAt));

export async function searchChecks(db: Queryable, scope: InProject, { words, limit }: Wanted) {
  return db
    .select({
      id: checks.id,
      title: procedureChecks.title,
      stage: checks.stage,
      state: checks.state,
      serial: units.serial,
    })
    .from(checks)
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(
      and(currentChecks(scope), everyWord(words, procedureChecks.title, procedureChecks.instruction, units.serial)),
    )
    .orderBy(asc(units.serial), asc(checks.position))
    .limit(limit);
}

/** Signals, pins and rails that checks say they cover, one row for each name, with the checks that prove it. */
export async function searchCovered(db: Queryable, scope: InProject, { words, limit }: Wanted) {
  const name = sql<string>`covered.name`;
  return db
    .select({
      name,
      what: sql<"signals" | "pins" | "rails">`covered.what`,
      count: sql<number>`count(*)`.mapWith(Number),
      serials: sql<string[]>`array_agg(distinct ${units.serial} order by ${units.serial})`,
      first: sql<string>`(array_agg(${checks.id}::text order by ${units.serial}, ${checks.position}))[1]`,
    })
    .from(checks)
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .innerJoin(
      sql`lateral (
        select 'signals' as what, jsonb_array_elements_text(${procedureChecks.covers} -> 'signals') as name
        union select 'pins', jsonb_array_elements_text(${procedureChecks.covers} -> 'pins')
        union select 'rails', jsonb_array_elements_text(${procedureChecks.covers} -> 'rails')
      ) covered`,
      sql`true`,
    )
    .where(and(currentChecks(scope), everyWord(words, name)))
    .groupBy(name, sql`covered.what`)
    .orderBy(name)
    .limit(limit);
}

export async function searchLog(db: Queryable, scope: InProject, { words, limit }: Wanted) {
  return db
    .select({ id: logEntries.id, title: logEntries.title, body: logEntries.body, at: logEntries.createdAt })
    .from(logEntries)
    .where(
      and(
        eq(logEntries.projectId, scope.projectId),
        isNull(logEntries.archivedAt),
        everyWord(words, logEntries.title, logEntries.body),
      ),
    )
    .orderBy(desc(logEntries.createdAt))
    .limit(limit);
}

export async function searchFaults(db: Queryable, scope: InProject, { words, limit }: Wanted) {
  const names = sql`(${faults.signals} || ${faults.pins})::text`;
  return db
    .select({
      id: faults.id,
      number: faults.number,
      title: faults.title,
      state: faults.state,
      serial: units.serial,
      says: sql<string>`concat_ws(' ', ${faults.symptom}, ${faults.cause}, ${faults.mend})`,
    })
    .from(faults)
    .innerJoin(units, eq(units.id, faults.unitId))
    .where(
      and(
        eq(faults.projectId, scope.projectId),
        everyWord(
          words,
          sql`concat('F', ${faults.number})`,
          faults.title,
          faults.symptom,
          faults.suspected,
          faults.tried,
          faults.cause,
          faults.mend,
          faults.lesson,
          names,
          units.serial,
        ),
      ),
    )
    .orderBy(desc(faults.number))
    .limit(limit);
}
