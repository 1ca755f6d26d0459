import { and, asc, desc, eq, inArray, isNull, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { edgeColumns } from "@/db/queries/connectors";
import { boards, slotOccupancies, slots, units, type BoardKind } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";

export type BoardLine = {
  id: string;
  code: string;
  name: string;
  summary: string;
  kind: BoardKind;
  connectorType: string | null;
  revision: string;
  units: number;
  issued: number | null;
  hasDraft: boolean;
  archived: boolean;
};

export type SlotLine = {
  id: string;
  position: number;
  label: string;
  pitchHp: number;
  boardId: string | null;
  version: number;
  unit: { id: string; serial: string } | null;
  /** Newest first; the open line first of all. */
  history: { serial: string; placedAt: string; removedAt: string | null }[];
};

/** A slot that was taken off the drawing. */
export type ArchivedSlot = { id: string; position: number; label: string; boardName: string | null };

/** A unit that could go into a slot. */
export type PlaceableUnit = { id: string; serial: string; boardId: string; position: number | null };

export type BoardsView = {
  boards: BoardLine[];
  slots: SlotLine[];
  archivedSlots: ArchivedSlot[];
  placeable: PlaceableUnit[];
};

export async function loadBoards(scope: ProjectScope): Promise<BoardsView> {
  const db = database();
  const boardRows = db
    .select({
      id: boards.id,
      code: boards.code,
      name: boards.name,
      summary: boards.summary,
      kind: boards.kind,
      connectorType: edgeColumns.connectorType,
      archivedAt: boards.archivedAt,
      // Written out, because a query of one table names its columns without the table.
      revision: sql<string>`coalesce((select letter from revisions where revisions.board_id = boards.id
        order by revisions.created_at desc limit 1), '')`,
      units: sql<number>`(select count(*) from units where units.board_id = boards.id
        and units.archived_at is null)`.mapWith(Number),
      issued: sql<number | null>`(select max(number) from procedures
        where procedures.board_id = boards.id and procedures.state = 'issued')`,
      hasDraft: sql<boolean>`exists (select 1 from procedures
        where procedures.board_id = boards.id and procedures.state = 'draft')`,
    })
    .from(boards)
    .where(eq(boards.projectId, scope.projectId))
    .orderBy(asc(boards.createdAt), asc(boards.code));
  const slotRows = db
    .select()
    .from(slots)
    .where(eq(slots.projectId, scope.projectId))
    .orderBy(asc(slots.position), asc(slots.archivedAt));
  const unitRows = db
    .select({ id: units.id, serial: units.serial, boardId: units.boardId })
    .from(units)
    .innerJoin(boards, eq(boards.id, units.boardId))
    .where(and(eq(units.projectId, scope.projectId), isNull(units.archivedAt), eq(boards.kind, "card")))
    .orderBy(asc(units.serial));
  const [foundBoards, allSlots, foundUnits] = await Promise.all([boardRows, slotRows, unitRows]);
  const foundSlots = allSlots.filter((slot) => slot.archivedAt === null);
  const sittings = foundSlots.length === 0 ? [] : await sittingsOf(foundSlots.map((slot) => slot.id));
  return {
    boards: foundBoards.map(({ archivedAt, ...board }) => ({ ...board, archived: archivedAt !== null })),
    slots: foundSlots.map(({ id, position, label, pitchHp, boardId, version }) => {
      const history = sittings.filter((line) => line.slotId === id);
      const open = history.find((line) => line.removedAt === null);
      return {
        id,
        position,
        label,
        pitchHp,
        boardId,
        version,
        unit: open ? { id: open.unitId, serial: open.serial } : null,
        history: history.map((line) => ({
          serial: line.serial,
          placedAt: line.placedAt.toISOString(),
          removedAt: line.removedAt?.toISOString() ?? null,
        })),
      };
    }),
    archivedSlots: allSlots
      .filter((slot) => slot.archivedAt !== null)
      .map(({ id, position, label, boardId }) => ({
        id,
        position,
        label,
        boardName: foundBoards.find((board) => board.id === boardId)?.name ?? null,
      })),
    placeable: foundUnits.map((unit) => {
      const seat = sittings.find((line) => line.unitId === unit.id && line.removedAt === null);
      return { ...unit, position: foundSlots.find((slot) => slot.id === seat?.slotId)?.position ?? null };
    }),
  };
}

/** Ids come from slots of the granted project. */
function sittingsOf(slotIds: string[]) {
  return database()
    .select({
      slotId: slotOccupancies.slotId,
      unitId: slotOccupancies.unitId,
      serial: units.serial,
      placedAt: slotOccupancies.placedAt,
      removedAt: slotOccupancies.removedAt,
    })
    .from(slotOccupancies)
    .innerJoin(units, eq(units.id, slotOccupancies.unitId))
    .where(inArray(slotOccupancies.slotId, slotIds))
    .orderBy(sql`${slotOccupancies.removedAt} desc nulls first`, desc(slotOccupancies.placedAt));
}
