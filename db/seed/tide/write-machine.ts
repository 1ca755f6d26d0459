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
import { eveningAt, happening } from "./calendar";
import type { CheckLine } from "./check-line";
import { granted } from "./granted";
import { BOARDS, SLOTS, UNITS, type DemoBoard } from "./machine";
import { typedSpec } from "./typed-spec";

type Machine = { units: Map<string, string> };

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });

/** Boards with their revisions and procedures, units with their travelers, and which of them sits where. */
export async function writeMachine(db: Database, scope: ProjectScope, now: Date): Promise<Machine> {
  const at = (daysAgo: number) => eveningAt(now, daysAgo, 0, scope.timeZone);
  const boards = new Map<string, string>();
  for (const board of BOARDS) {
    await happening(db, at(Math.max(...board.revisions.map((one) => one.daysAgo))), async () => {
      const { code, name, summary, kind } = board;
      const face = { connectorType: board.connectorType, connectorReference: "J1" };
      const made = granted(await createBoard(scope, { ...write(scope), code, name, summary, kind, ...face }));
      boards.set(code, made.id);
      await writeRevisions(db, scope, made.id, board);
      await issueProcedure(db, scope, made.id, board);
    });
  }
  const units = new Map<string, string>();
  for (const unit of UNITS) {
    const boardId = boards.get(unit.board);
    if (!boardId) throw new Error(`the demo has no board ${unit.board}`);
    await happening(db, at(unit.daysAgo), async () => {
      const revisionId = await revisionOf(db, boardId, unit.letter);
      const { serial, note } = unit;
      units.set(serial, granted(await createUnit(scope, { ...write(scope), boardId, revisionId, serial, note })).id);
    });
  }
  return { units };
}

/** Slots last, since a unit goes into the rack when it has come that far; SUP-01 is put away. */
export async function fillRack(
  db: Database,
  scope: ProjectScope,
  now: Date,
  units: Map<string, string>,
): Promise<void> {
  const boardIds = new Map<string, string>();
  const { boards } = await import("@/db/schema/boards");
  for (const row of await db
    .select({ id: boards.id, code: boards.code })
    .from(boards)
    .where(eq(boards.projectId, scope.projectId))) {
    boardIds.set(row.code, row.id);
  }
  for (const slot of SLOTS) {
    await happening(db, eveningAt(now, slot.daysAgo ?? 60, 55, scope.timeZone), async () => {
      const { position, label, pitchHp } = slot;
      const boardId = boardIds.get(slot.board) ?? null;
      const made = granted(await createSlot(scope, { ...write(scope), position, label, pitchHp, boardId }));
      const unitId = slot.unit ? units.get(slot.unit) : undefined;
      if (unitId) granted(await placeUnit(scope, { ...write(scope), slotId: made.id, unitId }));
    });
  }
  for (const unit of UNITS.filter((one) => one.archived)) {
    const unitId = units.get(unit.serial);
    if (!unitId) continue;
    await happening(db, eveningAt(now, 85, 0, scope.timeZone), async () => {
      granted(await archiveUnit(scope, { ...write(scope), unitId }));
    });
  }
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
