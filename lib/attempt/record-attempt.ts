import type { Transaction } from "@/db/client";
import { findStanding, type CheckRow } from "@/db/queries/checks";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, reject, type Answer } from "@/lib/actions/answer";
import { checkKind } from "@/lib/check-kinds/list";
import { rejectRetired } from "@/lib/check/lock-check";
import { lockAffectedUnits, lockOneCheck, shareStructure } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { movesNoOther, settleCheck } from "@/lib/check/settle-check";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { insertAttempt } from "./insert-attempt";
import { judgeAttempt } from "./judge-attempt";
import { loadRecording } from "./load-recording";
import { overtaken } from "./overtaken";
import type { RecordedAttempt } from "./recorded-attempt";
import { rejectBlocked } from "./reject-blocked";
import type { RecordAttemptInput } from "./schema";

/**
 * Records one carrying-out of a check for good. The server judges; two people at once are both kept and the later one
 * to arrive counts; nothing is recorded past an open hold point or prerequisite.
 */
export async function recordAttempt(scope: ProjectScope, input: RecordAttemptInput): Promise<Answer<RecordedAttempt>> {
  const { viewer } = scope;
  if (input.madeBy !== undefined && input.madeBy !== viewer.userId) {
    return refuse("signed-out", "This was recorded by somebody else on this device. It goes out when they sign in.");
  }
  return change({ writeId: input.id, userId: viewer.userId, action: "record-attempt" }, (tx) =>
    recordAttemptIn(tx, scope, input),
  );
}

/** The same within a change that has more to do, such as closing a round of probing. */
export async function recordAttemptIn(
  tx: Transaction,
  scope: ProjectScope,
  input: RecordAttemptInput,
): Promise<RecordedAttempt> {
  const { projectId, viewer } = scope;
  await shareStructure(tx, projectId);
  const recording = await loadRecording(tx, scope, input);
  const { check } = recording;
  const kind = checkKind(check.kind);
  const { entry, judged } = judgeAttempt(scope, input, recording);

  await (check.hasDependants ? lockAffectedUnits(tx, projectId, [check.unitId]) : lockOneCheck(tx, check));
  const before = await findStanding(tx, check.id, viewer.userId);
  if (!before || before.retired) return rejectRetired(check.title);
  if (before.blocked) return rejectBlocked(tx, projectId, check);

  const summary = kind.summary(check.spec, entry, judged.readings);
  const { verdict } = judged;
  const inserted = await insertAttempt(tx, scope, { ...recording, input, entry, judged });
  const now = movesNoOther(check, before.state, verdict)
    ? await settleCheck(tx, projectId, check.id, { id: input.id, verdict })
    : await refreshed(tx, scope, check);
  const subject = { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: input.id };
  await recordEvent(tx, subject, "attempt.recorded", {
    serial: check.serial,
    title: check.title,
    verdict,
    reading: summary,
    from: before.state,
    to: now.state,
    firstPass: !before.attempted && verdict !== "does-not-conform",
  });
  return {
    attemptId: input.id,
    checkId: check.id,
    arrival: inserted.arrival,
    recordedAt: inserted.recordedAt.toISOString(),
    verdict,
    summary,
    sentences: inserted.sentences,
    from: before.state,
    state: now.state,
    stateReason: now.reason,
    overtook: overtaken(before, input.seenArrival, kind, check.spec),
  };
}

async function refreshed(tx: Transaction, { projectId, viewer }: ProjectScope, check: CheckRow) {
  const states = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
  return states.get(check.id) ?? reject("not-found", "The check is gone. Nothing was recorded.");
}
