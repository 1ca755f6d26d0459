import { database } from "@/db/client";
import { findFaultEvidence } from "@/db/queries/attachments";
import { findEvents } from "@/db/queries/events";
import { findFault } from "@/db/queries/faults";
import { findReworksOfFault } from "@/db/queries/reworks";
import type { Stage } from "@/db/schema/procedures";
import type { FaultState } from "@/db/schema/faults";
import type { CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { evidenceView } from "@/lib/attachment/evidence-view";
import { attemptsOf, type SeenAttempt } from "./attempts-of";
import { historyLine } from "./history-line";
import { nameRework, wireWords } from "@/lib/rework/rework-words";
import type { EvidenceView } from "@/lib/traveler/traveler-view";

export type FaultTexts = Record<
  "title" | "symptom" | "suspected" | "tried" | "cause" | "mend" | "lesson" | "nextRevision",
  string
>;

export type FaultView = FaultTexts & {
  id: string;
  number: number;
  state: FaultState;
  hours: number | null;
  signals: string[];
  pins: string[];
  version: number;
  unit: { serial: string; revisionId: string; revision: string; archived: boolean };
  board: { id: string; code: string; name: string };
  check: { id: string; title: string; state: CheckState; stage: Stage } | null;
  /** The attempt that showed it. */
  attemptId: string | null;
  /** The round of probing that found it. */
  probePlanId: string | null;
  attempts: SeenAttempt[];
  reworks: { id: string; number: number; serial: string; title: string; says: string; by: string; at: string }[];
  evidence: EvidenceView[];
  /** Newest first. */
  history: { id: number; at: string; sentence: string }[];
  by: string;
  at: string;
  closedAt: string | null;
};

const ATTEMPTS = 6;
const HISTORY = 50;

/** One fault with what hangs on it; undefined when the project has none of this number. */
export async function loadFault(scope: ProjectScope, number: number): Promise<FaultView | undefined> {
  const db = database();
  const found = await findFault(db, scope, number);
  if (!found) return undefined;
  const { fault, board } = found;
  const [attempts, reworks, evidence, events] = await Promise.all([
    fault.checkId ? attemptsOf(db, scope, fault.checkId, ATTEMPTS) : [],
    findReworksOfFault(db, scope, fault.id),
    findFaultEvidence(db, scope, fault.id),
    findEvents(db, scope, { subjectId: fault.id }, HISTORY),
  ]);
  const somebody = (name: string | null) => name ?? "Somebody who left";
  const { id, title, symptom, suspected, tried, cause, mend, lesson, nextRevision } = fault;
  return {
    ...{ id, number, title, symptom, suspected, tried, cause, mend, lesson, nextRevision },
    ...{ state: fault.state, hours: fault.hours, signals: fault.signals, pins: fault.pins, version: fault.version },
    unit: {
      serial: found.serial,
      revisionId: found.revisionId,
      revision: found.revision,
      archived: found.unitArchivedAt !== null,
    },
    board,
    check:
      fault.checkId && found.checkTitle && found.checkState && found.checkStage
        ? { id: fault.checkId, title: found.checkTitle, state: found.checkState, stage: found.checkStage }
        : null,
    attemptId: fault.attemptId,
    probePlanId: fault.probePlanId,
    attempts,
    reworks: reworks.map((row) => ({
      ...{ id: row.id, number: row.number, serial: row.serial, title: nameRework(row) },
      says: row.wire ? `${wireWords(row.wire)}. ${row.what}` : row.what,
      by: somebody(row.byName),
      at: row.performedAt.toISOString(),
    })),
    evidence: evidence.map(evidenceView),
    history: events.map((event) => ({
      id: event.id,
      at: event.at.toISOString(),
      sentence: historyLine(event.kind, event.payload, somebody(event.actorName)),
    })),
    by: somebody(found.byName),
    at: fault.createdAt.toISOString(),
    closedAt: fault.closedAt?.toISOString() ?? null,
  };
}
