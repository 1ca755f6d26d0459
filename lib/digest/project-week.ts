import { database } from "@/db/client";
import {
  findEntriesBetween,
  findEventsBetween,
  findOpenFailures,
  findProjectToMail,
  type DigestEvent,
} from "@/db/queries/digest-week";
import { findOpenFindings } from "@/db/queries/findings";
import { findBoardsWithUnits, findRackChecks, findSlotsOfProject } from "@/db/queries/rack";
import { findWorkHistory } from "@/db/queries/work-history";

/** More than any week has; a script that records without end does not fill the worker's memory. */
const MOST_EVENTS = 5_000;

export type Span = { since: Date; until: Date };
export type EntryRow = Awaited<ReturnType<typeof findEntriesBetween>>[number];

/**
 * Everything that the digests of one project can need, read once for all its subscribers: the span reaches from the
 * earliest beginning to the latest end, and each mail takes its own part of it.
 */
export async function loadProjectWeek(projectId: string, span: Span) {
  const db = database();
  const scope = { projectId };
  const [project, slots, boards, checks, events, entries, failures, findings, history] = await Promise.all([
    findProjectToMail(db, scope),
    findSlotsOfProject(db, scope),
    findBoardsWithUnits(db, scope),
    findRackChecks(db, scope),
    findEventsBetween(db, scope, span, MOST_EVENTS),
    findEntriesBetween(db, scope, span),
    findOpenFailures(db, scope),
    findOpenFindings(db, scope),
    findWorkHistory(db, scope),
  ]);
  if (!project) return undefined;
  return { project, slots, boards, checks, events, entries, failures, findings, history };
}

export type ProjectWeek = NonNullable<Awaited<ReturnType<typeof loadProjectWeek>>>;

const inSpan = (at: Date, { since, until }: Span) => at >= since && at < until;

/** The part of it that one mail tells of. */
export function partOf(week: ProjectWeek, span: Span): { events: DigestEvent[]; entries: EntryRow[] } {
  return {
    events: week.events.filter((event) => inSpan(event.at, span)),
    entries: week.entries.filter((entry) => inSpan(entry.createdAt, span)),
  };
}
