import { and, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { findContinuityChecks, findRound, lockRound } from "@/db/queries/probing";
import { probePlans } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, reject, type Answer } from "@/lib/actions/answer";
import { recordAttempt } from "@/lib/attempt/record-attempt";
import { recordAttemptInput } from "@/lib/attempt/schema";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { reportRound } from "./report-round";
import type { CloseRoundInput } from "./schema";
import { provesUnit, sumUp } from "./sum-up";

type Closed = { said: string; conforms: boolean; attemptId: string | null };

const MOST_SENTENCES = 12;
const MOST_NOTE = 2000;

/**
 * Closes a round. With a check it becomes an attempt of it, whose verdict follows from what was probed and whose note
 * sums it up. The attempt goes first, with an id that its device made: trying again after a break records nothing twice.
 */
export async function closeRound(scope: ProjectScope, input: CloseRoundInput): Promise<Answer<Closed>> {
  const { projectId, viewer } = scope;
  const db = database();
  const [found, reported] = await Promise.all([findRound(db, scope, input.plan), reportRound(db, scope, input.plan)]);
  if (!found || !reported) return refuse("not-found", "There is no such round of probing in this project.");
  const { report, probed } = reported;
  const said = sumUp(report);
  const conforms = provesUnit(report);
  if (input.checkId !== null && found.plan.closedAt === null) {
    if (found.unit.archivedAt !== null) return refuse("gone", `${found.unit.serial} is archived. Restore it first.`);
    const checks = await findContinuityChecks(db, scope, found.unit.id);
    if (!checks.some(({ id }) => id === input.checkId)) {
      return refuse("not-found", `This is no continuity check of ${found.unit.serial} that takes a statement.`);
    }
    const note = [
      `Probed ${probed} of ${found.plan.count} pairs, netlist ${found.letter} ${found.netlist.number}: ${said}.`,
      ...report.findings.slice(0, MOST_SENTENCES).map(({ sentence }) => sentence),
      ...(input.note === "" ? [] : [input.note]),
    ].join("\n");
    const attempt = await recordAttempt(
      scope,
      recordAttemptInput.parse({
        project: input.project,
        id: input.attemptId,
        checkId: input.checkId,
        performedAt: new Date().toISOString(),
        record: { conforms },
        note: note.slice(0, MOST_NOTE),
      }),
    );
    if (!attempt.ok) return attempt;
  }
  return change({ writeId: input.writeId, userId: viewer.userId, action: "close-round" }, async (tx) => {
    const round = await lockRound(tx, scope, input.plan);
    if (!round) return reject("not-found", "There is no such round of probing in this project.");
    if (round.closedAt !== null) return reject("gone", "This round is closed already.");
    const attemptId = input.checkId === null ? null : input.attemptId;
    await tx
      .update(probePlans)
      .set({ closedAt: new Date(), attemptId, checkId: input.checkId ?? round.checkId })
      .where(and(eq(probePlans.id, round.id), isNull(probePlans.closedAt)));
    const subject = { projectId, actorId: viewer.userId, unitId: round.unitId, subjectId: round.id };
    await recordEvent(tx, subject, "probing.closed", { serial: found.unit.serial, said });
    return { said, conforms, attemptId };
  });
}
