import { findEarlierAttempts } from "@/db/queries/checks";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, reject, type Answer } from "@/lib/actions/answer";
import { checkKind } from "@/lib/check-kinds/list";
import { rejectRetired } from "@/lib/check/lock-check";
import { lockUnits } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { nameBlockers } from "@/lib/check/state-reason";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { insertAttempt } from "./insert-attempt";
import { loadRecording } from "./load-recording";
import { overtaken } from "./overtaken";
import type { RecordedAttempt } from "./recorded-attempt";
import type { RecordAttemptInput } from "./schema";

/**
 * Records one carrying-out of a check for good. The server judges; two people at once are both kept and the later one
 * to arrive counts; nothing is recorded past an open hold point or prerequisite.
 */
export async function recordAttempt(scope: ProjectScope, input: RecordAttemptInput): Promise<Answer<RecordedAttempt>> {
  const { projectId, viewer } = scope;
  if (input.madeBy !== undefined && input.madeBy !== viewer.userId) {
    return refuse("signed-out", "This was recorded by somebody else on this device. It goes out when they sign in.");
  }
  return change({ writeId: input.id, userId: viewer.userId, action: "record-attempt" }, async (tx) => {
    const { check, instrument, evidence } = await loadRecording(tx, scope, input);
    const kind = checkKind(check.kind);
    const context = {
      rule: scope.decisionRule,
      instrumentRanges: instrument?.ranges ?? [],
      evidence,
      note: input.note,
    };
    const entry = kind.readEntry(input.record);
    if (!entry.ok) return reject("invalid", entry.message, { fields: entry.fields });
    const judged = kind.judge(check.spec, entry.value, context);
    if (!judged.ok) return reject("invalid", judged.message, judged.fields ? { fields: judged.fields } : {});

    await lockUnits(tx, projectId, [check.unitId]);
    const earlier = await findEarlierAttempts(tx, check.id, viewer.userId);
    const inserted = await insertAttempt(tx, scope, { input, check, instrument, entry: entry.value, judged });
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    const now = refreshed.get(check.id) ?? rejectRetired(check.title);
    if (now.blockers.length > 0) {
      const names = nameBlockers(now.blockers, check.serial);
      return reject("blocked", `“${check.title}” waits for ${names}. Nothing was recorded.`, {
        details: { blockers: now.blockers },
      });
    }

    const summary = kind.summary(check.spec, entry.value, judged.readings);
    const subject = { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: input.id };
    await recordEvent(tx, subject, "attempt.recorded", {
      serial: check.serial,
      title: check.title,
      verdict: judged.verdict,
      reading: summary,
      from: now.from,
      to: now.state,
      firstPass: earlier.valid === 0 && judged.verdict !== "does-not-conform",
    });
    return {
      attemptId: input.id,
      checkId: check.id,
      arrival: inserted.arrival,
      recordedAt: inserted.recordedAt.toISOString(),
      verdict: judged.verdict,
      summary,
      sentences: inserted.sentences,
      from: now.from,
      state: now.state,
      stateReason: now.reason,
      overtook: overtaken(earlier, input.seenArrival, kind, check.spec),
    };
  });
}
