import { and, eq, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { checks, type CheckState, type Verdict } from "@/db/schema/travelers";
import { holds } from "./check-history";
import { reasonForPass } from "./state-reason";

type Attempted = { id: string; verdict: Verdict };
type Settled = { state: CheckState; reason: string };

/**
 * The state of a check whose last attempt arrived just now, with the locks held: nothing reopened it, conceded it or
 * cast doubt on it since.
 */
export function stateAfter(verdict: Verdict): Settled {
  return verdict === "does-not-conform"
    ? { state: "failed", reason: "" }
    : { state: "passed", reason: reasonForPass(verdict) };
}

/**
 * Whether an attempt moves no other check: nobody waits for this one, or it held before and holds still. Only then
 * may settleCheck stand in for refreshStates, which reads the history of the whole unit.
 */
export function movesNoOther(check: { hasDependants: boolean }, from: CheckState, verdict: Verdict): boolean {
  return !check.hasDependants || (holds(from) && verdict !== "does-not-conform");
}

/** Writes the state of the one check that an attempt moved. */
export async function settleCheck(
  tx: Transaction,
  projectId: string,
  checkId: string,
  last: Attempted,
): Promise<Settled> {
  const { state, reason } = stateAfter(last.verdict);
  await tx
    .update(checks)
    .set({
      state,
      stateReason: reason,
      insideGuardBand: last.verdict === "guard-band",
      lastAttemptId: last.id,
      stateSince: sql`case when ${checks.state} = ${state} then ${checks.stateSince} else clock_timestamp() end`,
    })
    .where(and(eq(checks.id, checkId), eq(checks.projectId, projectId)));
  return { state, reason };
}
