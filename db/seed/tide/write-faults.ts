import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { boards, revisions } from "@/db/schema/boards";
import { faults } from "@/db/schema/faults";
import { attempts } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { editFault } from "@/lib/fault/edit-fault";
import { loadFault } from "@/lib/fault/load-fault";
import { openFault } from "@/lib/fault/open-fault";
import { editFaultInput, openFaultInput } from "@/lib/fault/schema";
import { dealPunch } from "@/lib/punch/deal-punch";
import { loadPunch } from "@/lib/punch/load-punch";
import { takePunch } from "@/lib/punch/take-punch";
import { previewRework } from "@/lib/rework/preview-rework";
import { recordRework } from "@/lib/rework/record-rework";
import { eveningAt, type Happening } from "./calendar";
import { FAULTS, PUNCH, REWORKS, type FaultTold } from "./fault-story";
import { granted } from "./granted";
import { linesOf, type Cast } from "./tell-story";
import type { Upload } from "./upload-picture";

const EMPTY = {
  ...{ title: "", symptom: "", suspected: "", tried: "", cause: "", mend: "", lesson: "", nextRevision: "" },
  ...{ hours: "", state: "open" },
};

/** Faults and reworks in the order of the story, through the product's own use cases. */
export function faultHappenings(db: Database, cast: Cast, now: Date, upload: Upload): Happening[] {
  const at = ({ daysAgo, minutes, by }: Pick<FaultTold, "daysAgo" | "minutes" | "by">) =>
    eveningAt(now, daysAgo, minutes, cast[by].scope.timeZone);
  return [
    ...FAULTS.flatMap((fault) =>
      fault.told.map((told, index) => ({
        at: at(told),
        work: () =>
          index === 0
            ? begin(db, cast[told.by].scope, fault, upload)
            : goOn(db, cast[told.by].scope, fault.told.slice(0, index + 1), fault),
      })),
    ),
    ...REWORKS.map((rework) => ({ at: at(rework), work: () => put(db, cast[rework.by].scope, rework, upload) })),
    { at: at({ ...PUNCH, by: "maud" }), work: () => takeList(db, cast.maud.scope) },
  ];
}

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });

/** All that was told so far, without when and by whom. */
function textsOf(told: readonly FaultTold[]) {
  const { daysAgo: _day, minutes: _minutes, by: _by, ...texts } = Object.assign({}, ...told) as FaultTold;
  return { ...EMPTY, ...texts };
}

async function begin(db: Database, scope: ProjectScope, fault: (typeof FAULTS)[number], upload: Upload) {
  const { serial: unit, line, signals, pins } = fault;
  const checkId = line ? (await linesOf(db, scope, unit)).get(line)?.checkId : undefined;
  const [failing] = checkId
    ? await db
        .select({ id: attempts.id })
        .from(attempts)
        .where(and(eq(attempts.checkId, checkId), eq(attempts.verdict, "does-not-conform")))
        .limit(1)
    : [];
  const ties = { unit, checkId: checkId ?? null, attemptId: failing?.id ?? null, probePlanId: null };
  const form = { ...write(scope), ...textsOf([fault.told[0]]), ...ties, signals, pins };
  const { number } = granted(await openFault(scope, openFaultInput.parse(form)));
  const id = (await loadFault(scope, number))?.id;
  if (fault.picture && id) await upload(scope, { faultId: id }, fault.picture);
}

async function goOn(
  db: Database,
  scope: ProjectScope,
  told: readonly FaultTold[],
  { signals, pins }: Pick<(typeof FAULTS)[number], "signals" | "pins">,
) {
  const texts = textsOf(told);
  const { id: faultId, version } = await faultCalled(db, scope, texts.title);
  granted(await editFault(scope, editFaultInput.parse({ ...write(scope), ...texts, signals, pins, faultId, version })));
}

async function faultCalled(db: Database, scope: ProjectScope, title: string) {
  const where = and(eq(faults.projectId, scope.projectId), eq(faults.title, title));
  const [row] = await db.select({ id: faults.id, version: faults.version }).from(faults).where(where);
  if (!row) throw new Error(`the story has no fault “${title}” yet`);
  return row;
}

async function put(db: Database, scope: ProjectScope, rework: (typeof REWORKS)[number], upload: Upload) {
  const { serial: unit, kind, what, why, wire, signals, pins } = rework;
  const lines = await linesOf(db, scope, unit);
  const spared = Object.entries(rework.spared).flatMap(([line, reason]) => {
    const checkId = lines.get(line)?.checkId;
    return checkId ? [{ checkId, reason }] : [];
  });
  const touches = { signals, pins, parts: [], blocks: [], rails: [] };
  const doubt = { project: scope.slug, unit, kind, wire, touches, added: [], spared };
  const shown = granted(await previewRework(scope, doubt));
  const faultId = rework.fault ? (await faultCalled(db, scope, rework.fault)).id : null;
  const { id } = granted(
    await recordRework(scope, {
      ...{ ...write(scope), ...doubt, what, why, faultId, carriedFrom: null, performedAt: new Date() },
      seen: shown.doubtful.map(({ checkId }) => checkId),
    }),
  );
  if (rework.before) await upload(scope, { reworkId: id, reworkSide: "before" }, rework.before);
  if (rework.after) await upload(scope, { reworkId: id, reworkSide: "after" }, rework.after);
}

async function takeList(db: Database, scope: ProjectScope) {
  const [revision] = await db
    .select({ id: revisions.id, boardId: boards.id })
    .from(revisions)
    .innerJoin(boards, eq(boards.id, revisions.boardId))
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.code, PUNCH.code), eq(revisions.letter, PUNCH.letter)));
  if (!revision) throw new Error(`the story has no revision ${PUNCH.letter} of ${PUNCH.code} yet`);
  granted(await takePunch(scope, { ...write(scope), revisionId: revision.id }));
  for (const { id: itemId, version } of (await loadPunch(scope, revision.boardId))[revision.id] ?? [])
    granted(await dealPunch(scope, { ...write(scope), itemId, version, how: PUNCH.how }));
}
