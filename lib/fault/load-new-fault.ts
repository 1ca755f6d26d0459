import { and, asc, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { boards, units } from "@/db/schema/boards";
import { probePlans } from "@/db/schema/netlists";
import { procedureChecks } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { loadBoardNames, type BoardNames } from "@/lib/board/load-board-names";
import { attemptsOf, type SeenAttempt } from "./attempts-of";

export type NewFaultView = {
  units: { serial: string; board: string }[];
  unit: string;
  /** The check that it was seen at, when it is of the unit. */
  check: { id: string; title: string } | null;
  attemptId: string | null;
  /** The round of probing that found it, when it is of the unit. */
  probePlanId: string | null;
  /** What can be written before anybody types. */
  title: string;
  symptom: string;
  signals: string[];
  pins: string[];
  names: BoardNames;
};

const NO_NAMES: BoardNames = { signals: [], pins: [], parts: [], blocks: [], rails: [] };
const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** What a round of probing found, as its link says it; a person reads it over before it is kept. */
type Found = { title: string; symptom: string; signals: string[]; pins: string[] };

/** A fresh record, filled in from the unit and the failing check that it begins with. */
export async function loadNewFault(
  scope: ProjectScope,
  wanted: { unit: string; check: string; plan?: string; found?: Found },
): Promise<NewFaultView> {
  const db = database();
  const rows = await db
    .select({
      id: units.id,
      serial: units.serial,
      boardId: boards.id,
      revisionId: units.revisionId,
      code: boards.code,
      board: boards.name,
    })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .where(and(eq(units.projectId, scope.projectId), isNull(units.archivedAt)))
    .orderBy(asc(units.serial));
  const unit = rows.find(({ serial }) => serial === wanted.unit);
  const plan = wanted.plan ?? "";
  const [names, seen, round] = await Promise.all([
    unit ? loadBoardNames(scope, { id: unit.boardId, code: unit.code }, unit.revisionId) : NO_NAMES,
    unit && UUID.test(wanted.check) ? seenAt(scope, unit.id, wanted.check) : undefined,
    unit && UUID.test(plan) ? probedIn(scope, unit.id, plan) : undefined,
  ]);
  const found = round && wanted.found;
  return {
    units: rows.map(({ serial, board }) => ({ serial, board })),
    unit: unit?.serial ?? "",
    check: seen ? { id: seen.check.id, title: seen.check.title } : null,
    attemptId: seen?.attempt?.id ?? null,
    probePlanId: round?.id ?? null,
    title: found?.title ?? (seen ? `${seen.check.title}: does not conform` : ""),
    symptom: found?.symptom ?? (seen?.attempt ? told(seen.attempt) : ""),
    signals: found?.signals ?? seen?.check.covers.signals ?? [],
    pins: found?.pins ?? seen?.check.covers.pins ?? [],
    names,
  };
}

async function probedIn(scope: ProjectScope, unitId: string, planId: string) {
  const [round] = await database()
    .select({ id: probePlans.id })
    .from(probePlans)
    .where(and(eq(probePlans.projectId, scope.projectId), eq(probePlans.unitId, unitId), eq(probePlans.id, planId)));
  return round;
}

async function seenAt(scope: ProjectScope, unitId: string, checkId: string) {
  const db = database();
  const [check] = await db
    .select({ id: checks.id, title: procedureChecks.title, covers: procedureChecks.covers })
    .from(checks)
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.projectId, scope.projectId), eq(checks.unitId, unitId), eq(checks.id, checkId)));
  if (!check) return undefined;
  const attempts = await attemptsOf(db, scope, check.id, 20);
  return { check, attempt: attempts.find(({ verdict }) => verdict === "does-not-conform") };
}

/** The bare verdict says no more than the title does. */
const told = ({ summary, note }: SeenAttempt): string =>
  [summary === "does not conform" ? "" : summary, note].filter(Boolean).join(". ");
