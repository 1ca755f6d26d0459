import { and, asc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards, revisions, slotOccupancies, slots, units } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { procedureChecks, procedures } from "@/db/schema/procedures";
import { digestDeliveries, digestSubscriptions, projects } from "@/db/schema/projects";
import { checkPrerequisites, checks, holdLifts } from "@/db/schema/travelers";
import { ruleFindings } from "@/db/schema/wiring";
import { edgeColumns } from "./connectors";
import { workHistory, type WorkHistory } from "./work-history";

type InProject = { projectId: string };

/** Open findings of the wiring that must be mended; written out so that it stands inside any query with projects. */
const mustFindings = sql<number>`(select count(*) from ${ruleFindings} found
  where found.project_id = ${projects.id} and found.state = 'open' and found.weight = 'must')`.mapWith(Number);

/** The project with its slots, one row a slot (one row with nulls when there is none), and who sits in them. */
export async function findSlotsOfProject(db: Queryable, scope: InProject) {
  return db
    .select({
      name: projects.name,
      summary: projects.summary,
      layout: projects.layout,
      toMend: mustFindings,
      slotId: slots.id,
      position: slots.position,
      label: slots.label,
      pitchHp: slots.pitchHp,
      boardId: slots.boardId,
      unitId: slotOccupancies.unitId,
    })
    .from(projects)
    .leftJoin(slots, and(eq(slots.projectId, projects.id), isNull(slots.archivedAt)))
    .leftJoin(slotOccupancies, and(eq(slotOccupancies.slotId, slots.id), isNull(slotOccupancies.removedAt)))
    .where(eq(projects.id, scope.projectId))
    .orderBy(asc(slots.position));
}

/** Every board in work with its units in work, one row a unit (one row with nulls for a board without). */
export async function findBoardsWithUnits(db: Queryable, scope: InProject) {
  const newest = sql<number | null>`(
    select max(${procedures.number}) from ${procedures}
    where ${procedures.boardId} = ${boards.id} and ${procedures.state} = 'issued')`;
  return db
    .select({
      board: {
        id: boards.id,
        code: boards.code,
        name: boards.name,
        summary: boards.summary,
        kind: boards.kind,
        connectorType: edgeColumns.connectorType,
        procedureNumber: newest,
        toMend: sql<number>`(select count(*) from ${ruleFindings} found
          where found.project_id = ${boards.projectId} and found.state = 'open' and found.weight = 'must'
            and jsonb_exists(found.boards, ${boards.code}))`.mapWith(Number),
      },
      unitId: units.id,
      serial: units.serial,
      revision: revisions.letter,
    })
    .from(boards)
    .leftJoin(units, and(eq(units.boardId, boards.id), isNull(units.archivedAt)))
    .leftJoin(revisions, eq(revisions.id, units.revisionId))
    .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)))
    .orderBy(asc(boards.createdAt), asc(units.serial));
}

/** Every check of the units in work, in the order of the travelers, with what it waits for. */
export async function findRackChecks(db: Queryable, scope: InProject) {
  return db
    .select({
      id: checks.id,
      unitId: checks.unitId,
      serial: units.serial,
      stage: checks.stage,
      position: checks.position,
      holdPoint: checks.holdPoint,
      state: checks.state,
      title: procedureChecks.title,
      lifted: sql<boolean>`exists (select 1 from ${holdLifts} where ${holdLifts.checkId} = ${checks.id})`,
      needs: sql<string[]>`array(
        select ${checkPrerequisites.needsCheckId}::text from ${checkPrerequisites}
        where ${checkPrerequisites.checkId} = ${checks.id})`,
    })
    .from(checks)
    .innerJoin(units, and(eq(units.id, checks.unitId), isNull(units.archivedAt)))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.projectId, scope.projectId), isNull(checks.retiredAt)))
    .orderBy(asc(checks.unitId), asc(checks.position));
}

export type RackCheck = Awaited<ReturnType<typeof findRackChecks>>[number];

/** How many checks of the units in work fail or wait to be repeated, what must be mended in the wiring, standing faults. */
export async function countOpenChecks(db: Queryable, scope: InProject) {
  const [row] = await db
    .select({
      failing: sql<number>`count(*) filter (where ${checks.state} = 'failed')`.mapWith(Number),
      doubtful: sql<number>`count(*) filter (where ${checks.state} in ('doubtful', 'reopened'))`.mapWith(Number),
      toMend: sql<number>`(select count(*) from ${ruleFindings} found
        where found.project_id = ${scope.projectId} and found.state = 'open' and found.weight = 'must')`.mapWith(
        Number,
      ),
      faults: sql<number>`(select count(*) from faults
        where faults.project_id = ${scope.projectId} and faults.state in ('open', 'traced'))`.mapWith(Number),
    })
    .from(checks)
    .innerJoin(units, and(eq(units.id, checks.unitId), isNull(units.archivedAt)))
    .where(
      and(
        eq(checks.projectId, scope.projectId),
        isNull(checks.retiredAt),
        inArray(checks.state, ["failed", "doubtful", "reopened"]),
      ),
    );
  return row ?? { failing: 0, doubtful: 0, toMend: 0, faults: 0 };
}

/** What happened since the viewer's last digest, or since Sunday 00:00 in the project's zone; and the history of the work. */
export async function findHappenedSince(
  db: Queryable,
  scope: InProject & { timeZone: string; viewer: { userId: string } },
) {
  const zone = scope.timeZone;
  const kind = (name: string) => sql`${events.kind} = ${name}`;
  const payload = (key: string) => sql`${events.payload} ->> ${key}::text`;
  const [row] = await db.execute<{
    at: string;
    from_digest: boolean;
    attempts: number;
    evenings: number;
    first_passes: number;
    failures: number;
    photos: number;
    captures: number;
    history: WorkHistory;
  }>(sql`
    with digest as (
      select max(${digestDeliveries.dueAt}) as at from ${digestDeliveries}
      join ${digestSubscriptions} on ${digestSubscriptions.id} = ${digestDeliveries.subscriptionId}
      where ${digestSubscriptions.projectId} = ${scope.projectId}
        and ${digestSubscriptions.userId} = ${scope.viewer.userId}
        and ${digestDeliveries.state} in ('sent', 'quiet')
    ), start as (
      select coalesce(digest.at,
        (date_trunc('week', (now() at time zone ${zone}) + interval '1 day') - interval '1 day') at time zone ${zone}) as at,
        digest.at is not null as from_digest
      from digest
    )
    select to_json(start.at) #>> '{}' as at, start.from_digest,
      (count(*) filter (where ${kind("attempt.recorded")}))::int as attempts,
      (count(distinct (${events.at} at time zone ${zone})::date) filter (where ${kind("attempt.recorded")}))::int as evenings,
      (count(*) filter (where ${kind("attempt.recorded")} and ${payload("firstPass")} = 'true'))::int as first_passes,
      (count(*) filter (where ${kind("attempt.recorded")} and ${payload("verdict")} = 'does-not-conform'))::int as failures,
      (count(*) filter (where ${kind("evidence.attached")} and ${payload("kind")} = 'photo'))::int as photos,
      (count(*) filter (where ${kind("evidence.attached")} and ${payload("kind")} <> 'photo'))::int as captures,
      ${workHistory(scope.projectId)} as history
    from start left join ${events} on ${events.projectId} = ${scope.projectId} and ${events.at} >= start.at
    group by start.at, start.from_digest`);
  if (!row) throw new Error("an aggregate without grouping keys gave no row");
  return row;
}
