import type { Transaction } from "@/db/client";
import { findFaultById } from "@/db/queries/faults";
import { findNextReworkNumber, findRework, findReworkUnit, type ReworkUnit } from "@/db/queries/reworks";
import { reworkDoubts, reworkTouches, reworks, type DoubtOrigin, type TouchKind } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { performedAt } from "@/lib/attempt/performed-at";
import type { DoubtLine } from "@/lib/calc/doubt";
import { lockUnits } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { findNeighbours, loadDoubtGround } from "./doubt-context";
import { doubtPreview } from "./doubt-view";
import { judgeDoubt, withWireEnds, type Judged } from "./judge-doubt";
import { nameRework, wireWords } from "./rework-words";
import type { RecordReworkInput, Touches } from "./schema";

type Recorded = { id: string; number: number; doubtful: number };

/**
 * A physical change to a unit, with what it touches and which checks it puts in doubt, for good. What was shown before it
 * was saved must still be so: somebody may have carried out a check meanwhile.
 */
export async function recordRework(scope: ProjectScope, input: RecordReworkInput): Promise<Answer<Recorded>> {
  const { projectId, viewer } = scope;
  const { writeId: id, kind, what, why, wire, carriedFrom } = input;
  return change({ writeId: id, userId: viewer.userId, action: "record-rework" }, async (tx) => {
    const unit = await openUnit(tx, scope, input.unit);
    const neighbours = await findNeighbours(tx, scope, unit);
    await lockUnits(tx, projectId, [unit.id, ...neighbours]);
    const touches = withWireEnds(input.touches, wire);
    const judged = judgeDoubt(unit, await loadDoubtGround(tx, scope, unit, { neighbours, touches }), input);
    rejectUnseen(unit, judged, input.seen);
    const fault = input.faultId === null ? undefined : await faultOf(tx, scope, input.faultId);
    if (carriedFrom !== null && !(await findRework(tx, scope, carriedFrom)))
      reject("not-found", "There is no such rework in this project to carry over.");

    const number = await findNextReworkNumber(tx, unit.id);
    const { at } = performedAt(input.performedAt, new Date());
    await tx.insert(reworks).values({
      ...{ id, projectId, unitId: unit.id, number, kind, what, why, wire, carriedFrom },
      faultId: fault?.id ?? null,
      userId: viewer.userId,
      performedAt: at,
    });
    const named = touchRows(id, touches);
    if (named.length > 0) await tx.insert(reworkTouches).values(named);
    const title = nameRework({ kind, number, wire });
    const doubts = judged.lines.flatMap((line) => doubtRow(id, title, unit, line, judged));
    if (doubts.length > 0) await tx.insert(reworkDoubts).values(doubts);

    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: id };
    await recordEvent(tx, subject, "rework.recorded", {
      serial: unit.serial,
      number,
      what: wire ? `${title}, ${wireWords(wire)}` : `${title}: ${what}`,
      fault: fault?.number ?? null,
      doubtful: judged.doubtful.length,
      spared: judged.lines.filter(({ outcome }) => outcome === "spared").length,
    });
    const moved = new Set(doubts.flatMap(({ checkId }) => judged.byId.get(checkId)?.unit_id ?? []));
    await refreshStates(tx, { projectId, actorId: viewer.userId }, [...new Set([unit.id, ...moved])]);
    return { id, number, doubtful: judged.doubtful.length };
  });
}

async function openUnit(tx: Transaction, scope: ProjectScope, serial: string): Promise<ReworkUnit> {
  const unit = await findReworkUnit(tx, scope, serial);
  if (!unit) return reject("not-found", `There is no unit ${serial} in this project.`);
  if (unit.archivedAt) reject("conflict", `${serial} is archived. Restore it first; nothing was recorded.`);
  return unit;
}

async function faultOf(tx: Transaction, scope: ProjectScope, faultId: string) {
  return (await findFaultById(tx, scope, faultId)) ?? reject("not-found", "There is no such fault in this project.");
}

function rejectUnseen(unit: ReworkUnit, judged: Judged, seen: readonly string[]): void {
  const now = new Set(judged.doubtful);
  if (seen.length === now.size && seen.every((id) => now.has(id))) return;
  reject(
    "conflict",
    "The list of what comes into doubt has changed since you looked at it. Nothing was recorded; look at it again.",
    { details: { preview: doubtPreview(unit, judged) } },
  );
}

function touchRows(reworkId: string, { signals, pins, parts, blocks, rails }: Touches) {
  const rows = (kind: TouchKind, names: readonly string[]) => names.map((name) => ({ reworkId, kind, name }));
  return [
    ...rows("signal", signals),
    ...rows("pin", pins),
    ...rows("part", parts),
    ...rows("block", blocks),
    ...rows("rail", rails),
  ];
}

/** A check without a pass gets its line, too: voiding its last attempt may bring an older pass back. */
function doubtRow(reworkId: string, title: string, unit: ReworkUnit, line: DoubtLine, { byId }: Judged) {
  const row = byId.get(line.checkId);
  if (!row || line.outcome === "untouched" || row.newest_arrival === 0) return [];
  const where = row.unit_id === unit.id ? title : `${title} on ${unit.serial}`;
  const [first] = line.reasons;
  const ORIGINS = { touched: "touched", implied: "touched", relies: "depends", added: "added" } as const;
  const origin: DoubtOrigin = line.outcome === "spared" ? "spared" : ORIGINS[first.why];
  const because = first.sentence.replace(/^It /, "it ");
  const reason = line.outcome === "spared" ? line.reason : `${where}: ${because}`;
  return [{ reworkId, checkId: line.checkId, origin, reason, afterArrival: row.newest_arrival }];
}
