import { eq } from "drizzle-orm";
import { lockFinding } from "@/db/queries/findings";
import { ruleFindings } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { WithdrawAcceptanceInput } from "./schema";

/** The finding is open again. Who accepted it, and why, stays in the log. */
export async function withdrawAcceptance(
  scope: ProjectScope,
  input: WithdrawAcceptanceInput,
): Promise<Answer<{ title: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "withdraw-acceptance" }, async (tx) => {
    const finding = await lockFinding(tx, scope, input.key);
    if (!finding) return reject("not-found", "This finding is gone: the wiring was changed. Nothing was changed.");
    const { title } = finding;
    if (finding.state === "open") return reject("conflict", `“${title}” is open already. Nothing was changed.`);
    await tx
      .update(ruleFindings)
      .set({ state: "open", reason: "", acceptedFacts: null, acceptedBy: null, acceptedAt: null })
      .where(eq(ruleFindings.id, finding.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: finding.id };
    await recordEvent(tx, subject, "finding.acceptance-withdrawn", { title, reason: input.reason });
    return { title };
  });
}
