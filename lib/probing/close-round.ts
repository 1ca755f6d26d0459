import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findContinuityChecks, findRound, lockRound } from "@/db/queries/probing";
import { probePlans } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { recordAttemptIn } from "@/lib/attempt/record-attempt";
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
 * Closes a round. With a check it becomes an attempt of it in the same change, whose verdict follows from what was
 * probed and whose note sums it up. The round is locked first: nothing is said meanwhile, and of two people who close it
 * only one does.
 */
export async function closeRound(scope: ProjectScope, input: CloseRoundInput): Promise<Answer<Closed>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "close-round" }, async (tx) => {
    const round = await lockRound(tx, scope, input.plan);
    const found = round && (await findRound(tx, scope, round.id));
    const reported = round && (await reportRound(tx, scope, round.id));
    if (!round || !found || !reported) {
      return reject("not-found", "There is no such round of probing in this project.");
    }
    if (round.closedAt !== null) reject("gone", "This round is closed already.");
    const { report, probed } = reported;
    const said = sumUp(report);
    const conforms = provesUnit(report);
    const attemptId = input.checkId === null ? null : input.attemptId;
    if (input.checkId !== null) {
      const netlist = `netlist ${found.letter} ${found.netlist.number}`;
      const note = [
        `Probed ${probed} of ${found.plan.count} pairs, ${netlist}: ${said}.`,
        ...report.findings.slice(0, MOST_SENTENCES).map(({ sentence }) => sentence),
        ...(input.note === "" ? [] : [input.note]),
      ].join("\n");
      await recordRound(tx, scope, { ...input, checkId: input.checkId, unit: found.unit, conforms, note });
    }
    await tx
      .update(probePlans)
      .set({ closedAt: new Date(), attemptId, checkId: input.checkId ?? round.checkId })
      .where(eq(probePlans.id, round.id));
    const subject = { projectId, actorId: viewer.userId, unitId: round.unitId, subjectId: round.id };
    await recordEvent(tx, subject, "probing.closed", { serial: found.unit.serial, said });
    return { said, conforms, attemptId };
  });
}

type Recorded = {
  project: string;
  attemptId: string;
  checkId: string;
  unit: { id: string; serial: string; archivedAt: Date | null };
  conforms: boolean;
  note: string;
};

async function recordRound(tx: Transaction, scope: ProjectScope, round: Recorded): Promise<void> {
  const { project, attemptId, checkId, unit, conforms, note } = round;
  if (unit.archivedAt !== null) reject("gone", `${unit.serial} is archived. Restore it first.`);
  const checks = await findContinuityChecks(tx, scope, unit.id);
  if (!checks.some(({ id }) => id === checkId)) {
    reject("not-found", `This is no continuity check of ${unit.serial} that takes a statement.`);
  }
  const performedAt = new Date().toISOString();
  const record = { conforms };
  const typed = { project, id: attemptId, checkId, performedAt, record, note: note.slice(0, MOST_NOTE) };
  await recordAttemptIn(tx, scope, recordAttemptInput.parse(typed));
}
