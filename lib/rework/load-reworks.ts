import { and, asc, eq, inArray, isNull, ne } from "drizzle-orm";
import { database } from "@/db/client";
import { findReworkEvidence } from "@/db/queries/attachments";
import { findConnectorsOfBoard } from "@/db/queries/connectors";
import { findDoubts, findReworksOfUnits, findReworkUnit, findTouches } from "@/db/queries/reworks";
import { units } from "@/db/schema/boards";
import { reworks } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { evidenceView } from "@/lib/attachment/evidence-view";
import type { ConnectorGrid } from "@/lib/calc/connector";
import { compareReworks, type Comparison } from "./compare-reworks";
import { reworkView, type ReworkView } from "./rework-view";

export type BoardConnector = { reference: string; type: string; grid: ConnectorGrid | null };

export type ReworksView = {
  unit: { id: string; serial: string; archived: boolean };
  board: { code: string; name: string };
  revision: string;
  /** Newest first. */
  reworks: ReworkView[];
  /** Of the board, for the drawing of its wires. */
  connectors: BoardConnector[];
  /** Other units of the board that it can be compared with or whose reworks can be carried over. */
  others: { serial: string; sameRevision: boolean; reworks: number }[];
};

/** All reworks of one unit; undefined when the project has no such unit. */
export async function loadReworks(scope: ProjectScope, serial: string): Promise<ReworksView | undefined> {
  const db = database();
  const unit = await findReworkUnit(db, scope, serial);
  if (!unit) return undefined;
  const [rows, pictures, connectors, others] = await Promise.all([
    findReworksOfUnits(db, scope, [unit.id]),
    findReworkEvidence(db, scope, unit.id),
    findConnectorsOfBoard(db, scope, unit.board.id),
    db
      .select({
        serial: units.serial,
        revisionId: units.revisionId,
        reworks: db.$count(reworks, eq(reworks.unitId, units.id)),
      })
      .from(units)
      .where(
        and(
          eq(units.projectId, scope.projectId),
          eq(units.boardId, unit.board.id),
          ne(units.id, unit.id),
          isNull(units.archivedAt),
        ),
      )
      .orderBy(asc(units.serial)),
  ]);
  const ids = rows.map(({ id }) => id);
  const [touches, doubts, origins] = await Promise.all([
    findTouches(db, ids),
    findDoubts(db, ids),
    findOrigins(
      scope,
      rows.flatMap(({ carriedFrom }) => (carriedFrom === null ? [] : [carriedFrom])),
    ),
  ]);
  return {
    unit: { id: unit.id, serial: unit.serial, archived: unit.archivedAt !== null },
    board: { code: unit.board.code, name: unit.board.name },
    revision: unit.revision.letter,
    reworks: rows.map((row) =>
      reworkView(row, {
        touches: touches.filter(({ reworkId }) => reworkId === row.id).map(({ kind, name }) => ({ kind, name })),
        doubts: doubts.filter(({ rework_id }) => rework_id === row.id),
        carriedFrom: row.carriedFrom === null ? null : (origins.get(row.carriedFrom) ?? null),
        before: pictures.filter((one) => one.reworkId === row.id && one.side === "before").map(evidenceView),
        after: pictures.filter((one) => one.reworkId === row.id && one.side !== "before").map(evidenceView),
      }),
    ),
    connectors: connectors.map(({ reference, type, grid }) => ({ reference, type, grid })),
    others: others.map(({ serial: other, revisionId, reworks: count }) => ({
      serial: other,
      sameRevision: revisionId === unit.revision.id,
      reworks: count,
    })),
  };
}

async function findOrigins(scope: ProjectScope, ids: readonly string[]) {
  if (ids.length === 0) return new Map<string, { serial: string; number: number }>();
  const rows = await database()
    .select({ id: reworks.id, serial: units.serial, number: reworks.number })
    .from(reworks)
    .innerJoin(units, eq(units.id, reworks.unitId))
    .where(and(eq(reworks.projectId, scope.projectId), inArray(reworks.id, [...ids])));
  return new Map(rows.map(({ id, serial, number }) => [id, { serial, number }]));
}

export type ReworkComparison = { other: { serial: string; revision: string }; pairs: Comparison[] };

/** Which rework which of two units of one board has; undefined when the other one is not of this board. */
export async function loadComparison(
  scope: ProjectScope,
  serial: string,
  otherSerial: string,
): Promise<ReworkComparison | undefined> {
  const db = database();
  const [unit, other] = await Promise.all([findReworkUnit(db, scope, serial), findReworkUnit(db, scope, otherSerial)]);
  if (!unit || !other || unit.id === other.id || unit.board.id !== other.board.id) return undefined;
  const rows = await findReworksOfUnits(db, scope, [unit.id, other.id]);
  const touches = await findTouches(
    db,
    rows.map(({ id }) => id),
  );
  const lines = rows.map((row) => ({
    unitId: row.unitId,
    ...{ id: row.id, number: row.number, kind: row.kind, what: row.what, wire: row.wire },
    carriedFrom: row.carriedFrom,
    touches: touches.filter(({ reworkId }) => reworkId === row.id).map(({ kind, name }) => `${kind} ${name}`),
  }));
  return {
    other: { serial: other.serial, revision: other.revision.letter },
    pairs: compareReworks(
      lines.filter(({ unitId }) => unitId === unit.id),
      lines.filter(({ unitId }) => unitId === other.id),
    ),
  };
}
