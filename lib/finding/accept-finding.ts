import { eq, sql } from "drizzle-orm";
import { lockFinding } from "@/db/queries/findings";
import { ruleFindings } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { AcceptFindingInput } from "./schema";

/** A maintainer lets a finding stay as it is, for as long as it rests upon the same facts. */
export async function acceptFinding(
  scope: ProjectScope,
  input: AcceptFindingInput,
): Promise<Answer<{ title: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "accept-finding" }, async (tx) => {
    const finding = await lockFinding(tx, scope, input.key);
    if (!finding) return reject("not-found", "This finding is gone: the wiring was changed. Nothing was accepted.");
    const { title, facts } = finding;
    if (finding.state === "accepted") return reject("conflict", `“${title}” is accepted already. Nothing was changed.`);
    if (facts !== input.facts) {
      const sentence = `The facts of “${title}” changed while you looked at it. Look again; nothing was accepted.`;
      return reject("conflict", sentence, { details: { current: facts } });
    }
    await tx
      .update(ruleFindings)
      .set({
        state: "accepted",
        reason: input.reason,
        acceptedFacts: facts,
        acceptedBy: viewer.userId,
        acceptedAt: sql`clock_timestamp()`,
      })
      .where(eq(ruleFindings.id, finding.id));
    const { reason } = input;
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: finding.id }, "finding.accepted", {
      title,
      reason,
    });
    return { title };
  });
}
