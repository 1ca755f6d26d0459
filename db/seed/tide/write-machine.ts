import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { revisions } from "@/db/schema/boards";
import { procedureChecks, procedures } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { archiveUnit } from "@/lib/unit/archive-unit";
import { createBoard } from "@/lib/board/create-board";
import { createRevision } from "@/lib/board/create-revision";
import { releaseRevision } from "@/lib/board/release-revision";
import { checkKind } from "@/lib/check-kinds/list";
import { recordEvent } from "@/lib/event/record-event";
import { createSlot } from "@/lib/slot/create-slot";
import { placeUnit } from "@/lib/slot/place-unit";
import { createUnit } from "@/lib/unit/create-unit";
import { eveningAt, type Happening } from "./calendar";
import type { CheckLine } from "./check-line";
import { granted } from "./granted";
import { BOARDS, SLOTS, UNITS, type DemoBoard } from "./machine";
import { typedSpec } from "./typed-spec";

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });

/** Boards with their revisions and procedures, units with their travelers, and which of them sits where. */
export function machineHappenings(db: Database, scope: ProjectScope, now: Date): Happening[] {
  const at = (daysAgo: number, minutes: number) => eveningAt(now, daysAgo, minutes, scope.timeZone);
  const boardIds = new Map<string, string>();
  const unitIds = new Map<string, string>();

  const boards = BOARDS.map((board) => ({
    at: at(Math.max(...board.revisions.map((one) => one.daysAgo)), 0),
    work: async () => {
      const { code, name, summary, kind, connectorType } = board;
      const form = {
        ...write(scope),
        code,
        name,
        summary,
        kind,
        connectorType,
        connectorReference: kind === "backplane" ? "X1" : "J1",
      };
      const made = granted(await createBoard(scope, form));
      boardIds.set(code, made.id);
      await writeRevisions(db, scope, made.id, board);
      await issueProcedure(db, scope, made.id, board);
    },
  }));
  const units = UNITS.map(({ serial, note, board, letter, daysAgo }) => ({
    at: at(daysAgo, 1),
    work: async () => {
      const boardId = known(boardIds, board);
      const revisionId = await revisionOf(db, boardId, letter);
      unitIds.set(serial, granted(await createUnit(scope, { ...write(scope), boardId, revisionId, serial, note })).id);
    },
  }));
  const put = UNITS.filter((unit) => unit.archived).map(({ serial }) => ({
    at: at(85, 0),
    work: async () => {
      granted(await archiveUnit(scope, { ...write(scope), unitId: known(unitIds, serial) }));
    },
  }));
  const slotIds = new Map<number, string>();
  const slots = SLOTS.map(({ position, label, pitchHp, board }) => ({
    at: at(SLOTS_DRAWN_DAYS_AGO, position),
    work: async () => {
      const form = { ...write(scope), position, label, pitchHp, boardId: known(boardIds, board) };
      slotIds.set(position, granted(await createSlot(scope, form)).id);
    },
  }));
  const places = SLOTS.flatMap(({ position, unit, daysAgo }) =>
    unit === undefined || daysAgo === undefined
      ? []
      : [
          {
            at: at(daysAgo, 55),
            work: async () => {
              const ids = { slotId: known(slotIds, position), unitId: known(unitIds, unit) };
              granted(await placeUnit(scope, { ...write(scope), ...ids }));
            },
          },
        ],
  );
  return [...boards, ...units, ...put, ...slots, ...places];
}

/** All boards are on paper by then; slots name the board they are wired for. */
const SLOTS_DRAWN_DAYS_AGO = 62;

function known<Key>(ids: Map<Key, string>, key: Key): string {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`the demo has no ${String(key)} yet`);
  return id;
}

async function writeRevisions(db: Database, scope: ProjectScope, boardId: string, board: DemoBoard): Promise<void> {
  const last = board.revisions.at(-1);
  while (last && !(await findRevision(db, boardId, last.letter))) {
    granted(await createRevision(scope, { ...write(scope), boardId, notes: "" }));
  }
  for (const { letter, notes } of board.revisions) {
    const revisionId = await revisionOf(db, boardId, letter);
    await db.update(revisions).set({ notes }).where(eq(revisions.id, revisionId));
    granted(await releaseRevision(scope, { ...write(scope), revisionId }));
  }
}

async function findRevision(db: Database, boardId: string, letter: string) {
  const [row] = await db
    .select({ id: revisions.id })
    .from(revisions)
    .where(and(eq(revisions.boardId, boardId), eq(revisions.letter, letter)));
  return row;
}

async function revisionOf(db: Database, boardId: string, letter: string): Promise<string> {
  const row = await findRevision(db, boardId, letter);
  if (!row) throw new Error(`the demo has no revision ${letter}`);
  return row.id;
}

async function issueProcedure(db: Database, scope: ProjectScope, boardId: string, board: DemoBoard): Promise<void> {
  await db.transaction(async (tx) => {
    const [procedure] = await tx
      .insert(procedures)
      .values({
        boardId,
        number: 1,
        state: "issued",
        note: "First issue.",
        createdBy: scope.viewer.userId,
        issuedAt: new Date(),
      })
      .returning({ id: procedures.id });
    if (!procedure) throw new Error("inserting a demo procedure returned no row");
    const keys = new Map(board.lines.map((line) => [line.id, crypto.randomUUID()]));
    await tx.insert(procedureChecks).values(board.lines.map((line, index) => rowOf(line, index, procedure.id, keys)));
    const subject = { projectId: scope.projectId, actorId: scope.viewer.userId, subjectId: procedure.id };
    await recordEvent(tx, subject, "procedure.issued", { code: board.code, number: 1, note: "First issue." });
  });
}

function rowOf(line: CheckLine, index: number, procedureId: string, keys: Map<string, string>) {
  const key = keys.get(line.id);
  const spec = checkKind(line.expect.kind).readTyped(typedSpec(line.expect));
  if (!key || !spec.ok) throw new Error(`the demo check “${line.title}” does not read: ${JSON.stringify(spec)}`);
  return {
    procedureId,
    key,
    position: index + 1,
    stage: line.stage,
    title: line.title,
    instruction: line.instruction,
    caution: line.caution ?? "",
    reference: line.reference ?? "",
    holdPoint: line.hold ?? false,
    kind: line.expect.kind,
    spec: spec.value,
    covers: { signals: line.signals ?? [], pins: line.pins ?? [], rails: line.rails ?? [], blocks: [] },
    needs: (line.needs ?? []).flatMap((id) => keys.get(id) ?? []),
  };
}
