import { and, asc, desc, eq, inArray, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { findBoardByCode } from "@/db/queries/boards";
import { findHoldings } from "@/db/queries/holdings";
import { revisions, slotOccupancies, slots, units, type BoardKind } from "@/db/schema/boards";
import { procedures } from "@/db/schema/procedures";
import { checks, travelers } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import type { ConnectorGrid } from "@/lib/calc/connector";
import { STAGES } from "@/lib/procedure/stages";
import type { RackUnit } from "@/lib/rack/rack-view";
import type { Holdings } from "@/lib/unit/holdings";
import { suggestSerial } from "@/lib/unit/suggest-serial";
import type { CoveredPin } from "./covered-pins";
import { loadCoveredPins } from "./load-covered-pins";

export type RevisionView = {
  id: string;
  letter: string;
  notes: string;
  releasedAt: string | null;
  createdAt: string;
  units: number;
};

export type BoardUnit = RackUnit & {
  revisionId: string;
  note: string;
  version: number;
  archived: boolean;
  position: number | null;
  /** Number of the procedure its traveler follows; null while it has none. */
  procedure: number | null;
  /** What a purge would take; of an archived unit only. */
  holds: Holdings | undefined;
};

export type BoardView = {
  id: string;
  code: string;
  name: string;
  summary: string;
  kind: BoardKind;
  connectorType: string | null;
  connectorGrid: ConnectorGrid | null;
  connectorReference: string;
  version: number;
  archived: boolean;
  revisions: RevisionView[];
  units: BoardUnit[];
  /** Pins of the connector that checks of the newest issued procedure cover. */
  covered: CoveredPin[];
  issued: { number: number; at: string; note: string } | null;
  hasDraft: boolean;
  nextSerial: string;
};

export async function loadBoard(scope: ProjectScope, code: string): Promise<BoardView | undefined> {
  const db = database();
  const board = await findBoardByCode(db, scope, code.toUpperCase());
  if (!board) return undefined;
  const [revisionRows, unitRows, checkRows, procedureRows, covered] = await Promise.all([
    db.select().from(revisions).where(eq(revisions.boardId, board.id)).orderBy(desc(revisions.createdAt)),
    db
      .select({ unit: units, procedure: procedures.number, position: slots.position })
      .from(units)
      .leftJoin(travelers, eq(travelers.unitId, units.id))
      .leftJoin(procedures, eq(procedures.id, travelers.procedureId))
      .leftJoin(slotOccupancies, and(eq(slotOccupancies.unitId, units.id), isNull(slotOccupancies.removedAt)))
      .leftJoin(slots, eq(slots.id, slotOccupancies.slotId))
      .where(and(eq(units.projectId, scope.projectId), eq(units.boardId, board.id)))
      .orderBy(asc(units.serial)),
    db
      .select({ unitId: checks.unitId, stage: checks.stage, state: checks.state })
      .from(checks)
      .innerJoin(units, eq(units.id, checks.unitId))
      .where(and(eq(checks.projectId, scope.projectId), eq(units.boardId, board.id), isNull(checks.retiredAt)))
      .orderBy(asc(checks.position)),
    db
      .select({ number: procedures.number, state: procedures.state, at: procedures.issuedAt, note: procedures.note })
      .from(procedures)
      .where(and(eq(procedures.boardId, board.id), inArray(procedures.state, ["draft", "issued"])))
      .orderBy(desc(procedures.number)),
    loadCoveredPins(db, board),
  ]);
  const archived = unitRows.flatMap(({ unit }) => (unit.archivedAt ? [unit.id] : []));
  const holdings = await findHoldings(db, scope, archived);
  const issued = procedureRows.find((row) => row.state === "issued");
  const { id, name, summary, kind, connectorType, connectorGrid, connectorReference, version } = board;
  const rackBoard = {
    id,
    code: board.code,
    name,
    summary,
    kind,
    connectorType,
    procedureNumber: issued?.number ?? null,
    // The page of a board shows its units' checks; its wiring has a place of its own.
    toMend: 0,
  };
  return {
    ...{ id, code: board.code, name, summary, kind, connectorType, connectorGrid, connectorReference, version },
    archived: board.archivedAt !== null,
    revisions: revisionRows.map((row) => ({
      id: row.id,
      letter: row.letter,
      notes: row.notes,
      releasedAt: row.releasedAt?.toISOString() ?? null,
      createdAt: row.createdAt.toISOString(),
      units: unitRows.filter(({ unit }) => unit.revisionId === row.id && !unit.archivedAt).length,
    })),
    units: unitRows.map(({ unit, procedure, position }): BoardUnit => {
      const own = checkRows.filter((check) => check.unitId === unit.id);
      const count = (...states: string[]) => own.filter((check) => states.includes(check.state)).length;
      return {
        id: unit.id,
        serial: unit.serial,
        revisionId: unit.revisionId,
        revision: revisionRows.find((row) => row.id === unit.revisionId)?.letter ?? "",
        note: unit.note,
        version: unit.version,
        archived: unit.archivedAt !== null,
        position,
        procedure,
        holds: holdings.find((holds) => holds.unitId === unit.id),
        board: rackBoard,
        stages: STAGES.map(({ id: stage }) => ({
          stage,
          states: own.filter((check) => check.stage === stage).map((check) => check.state),
        })),
        total: own.length,
        holding: count("passed", "conceded"),
        failing: count("failed"),
        doubtful: count("doubtful"),
        reopened: count("reopened"),
        marked: null,
      };
    }),
    covered,
    issued: issued ? { number: issued.number, at: issued.at?.toISOString() ?? "", note: issued.note } : null,
    hasDraft: procedureRows.some((row) => row.state === "draft"),
    nextSerial: suggestSerial(
      board.code,
      unitRows.map(({ unit }) => unit.serial),
    ),
  };
}
