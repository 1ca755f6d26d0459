import { and, asc, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { findBoardByCode } from "@/db/queries/boards";
import { findChecksOf, findProcedures } from "@/db/queries/procedures";
import { units } from "@/db/schema/boards";
import { procedures, type procedureChecks } from "@/db/schema/procedures";
import { travelers } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import type { CheckRow } from "./check-row";

export type VersionLine = { number: number; note: string; issuedAt: string };

export type ProcedureView = {
  board: {
    id: string;
    code: string;
    name: string;
    connectorReference: string;
    connectorType: string | null;
    archived: boolean;
  };
  /** Newest first. */
  versions: VersionLine[];
  draft: { number: number; version: number; checks: CheckRow[] } | null;
  /** Checks of the newest issued version; what the draft is compared with. */
  newest: CheckRow[];
  /** Units whose traveler follows an older version. */
  behind: { serial: string; number: number }[];
  /** Units in work that have no traveler yet. */
  without: string[];
};

export function checkRow(row: typeof procedureChecks.$inferSelect): CheckRow {
  const { key, position, stage, title, instruction, caution, reference, holdPoint, kind, spec, covers, needs } = row;
  return { key, position, stage, title, instruction, caution, reference, holdPoint, kind, spec, covers, needs };
}

export async function loadProcedure(scope: ProjectScope, code: string): Promise<ProcedureView | undefined> {
  const db = database();
  const board = await findBoardByCode(db, scope, code.toUpperCase());
  if (!board) return undefined;
  const [all, unitRows] = await Promise.all([
    findProcedures(db, scope, board.code),
    db
      .select({ serial: units.serial, number: procedures.number })
      .from(units)
      .leftJoin(travelers, eq(travelers.unitId, units.id))
      .leftJoin(procedures, eq(procedures.id, travelers.procedureId))
      .where(and(eq(units.projectId, scope.projectId), eq(units.boardId, board.id), isNull(units.archivedAt)))
      .orderBy(asc(units.serial)),
  ]);
  const draft = all.find((procedure) => procedure.state === "draft");
  const issued = all.filter((procedure) => procedure.state === "issued");
  const newest = issued[0];
  const [draftRows, newestRows] = await Promise.all([
    draft ? findChecksOf(db, draft.id) : [],
    newest ? findChecksOf(db, newest.id) : [],
  ]);
  const { id, name, connectorReference, connectorType } = board;
  return {
    board: { id, code: board.code, name, connectorReference, connectorType, archived: board.archivedAt !== null },
    versions: issued.map((row) => ({
      number: row.number,
      note: row.note,
      issuedAt: row.issuedAt?.toISOString() ?? "",
    })),
    draft: draft ? { number: draft.number, version: draft.version, checks: draftRows.map(checkRow) } : null,
    newest: newestRows.map(checkRow),
    behind: unitRows.flatMap(({ serial, number }) =>
      number !== null && newest && number !== newest.number ? [{ serial, number }] : [],
    ),
    without: unitRows.filter(({ number }) => number === null).map(({ serial }) => serial),
  };
}

/** The checks of one issued version; undefined when there is none of that number. */
export async function loadVersion(scope: ProjectScope, code: string, number: number): Promise<CheckRow[] | undefined> {
  const db = database();
  const all = await findProcedures(db, scope, code.toUpperCase());
  const found = all.find((procedure) => procedure.state === "issued" && procedure.number === number);
  return found ? (await findChecksOf(db, found.id)).map(checkRow) : undefined;
}
