import type { Transaction } from "@/db/client";
import { findAttempt, findCheck } from "@/db/queries/checks";
import { nextFaultNumber } from "@/db/queries/faults";
import { findUnitBySerial } from "@/db/queries/units";
import { faults } from "@/db/schema/faults";
import { probePlans } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { and, eq } from "drizzle-orm";
import { isClosed } from "./fault-words";
import type { OpenFaultInput } from "./schema";

/** A defect gets its record: seen on one unit, at one of its checks or without. */
export async function openFault(scope: ProjectScope, input: OpenFaultInput): Promise<Answer<{ number: number }>> {
  const { projectId, viewer } = scope;
  const { project: _project, writeId, unit: serial, checkId, attemptId, probePlanId, ...fields } = input;
  return change({ writeId, userId: viewer.userId, action: "open-fault" }, async (tx) => {
    const unit = await findUnitBySerial(tx, scope, serial);
    if (!unit) {
      const message = `There is no unit ${serial} in this project.`;
      return reject("invalid", message, { fields: { unit: message } });
    }
    await requireTies(tx, scope, unit.id, { checkId, attemptId, probePlanId });
    const number = await nextFaultNumber(tx, scope);
    const [made] = await tx
      .insert(faults)
      .values({
        ...fields,
        ...{ projectId, number, checkId, attemptId, probePlanId },
        unitId: unit.id,
        createdBy: viewer.userId,
        closedAt: isClosed(fields.state) ? new Date() : null,
      })
      .returning({ id: faults.id });
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: made?.id };
    await recordEvent(tx, checkId ? { ...subject, checkId } : subject, "fault.opened", {
      number,
      title: fields.title,
      serial: unit.serial,
    });
    return { number };
  });
}

type Ties = Pick<OpenFaultInput, "checkId" | "attemptId" | "probePlanId">;

/** Check, attempt and round of probing must be of this very unit. */
async function requireTies(tx: Transaction, scope: ProjectScope, unitId: string, ties: Ties): Promise<void> {
  if (ties.checkId !== null) {
    const check = await findCheck(tx, scope.projectId, ties.checkId);
    if (check?.unitId !== unitId) reject("not-found", "The unit has no such check. Choose the check on its traveler.");
  }
  if (ties.attemptId !== null) {
    const attempt = await findAttempt(tx, scope.projectId, ties.attemptId);
    if (!attempt || attempt.checkId !== ties.checkId) reject("not-found", "The check has no such attempt.");
  }
  if (ties.probePlanId !== null) {
    const [plan] = await tx
      .select({ id: probePlans.id })
      .from(probePlans)
      .where(
        and(
          eq(probePlans.projectId, scope.projectId),
          eq(probePlans.unitId, unitId),
          eq(probePlans.id, ties.probePlanId),
        ),
      );
    if (!plan) reject("not-found", "The unit has no such round of probing.");
  }
}
