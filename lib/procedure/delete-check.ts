import { and, eq } from "drizzle-orm";
import { procedureChecks } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { closeDraft, openDraft } from "./open-draft";
import type { DeleteCheckInput } from "./schema";

/** Only from a draft. Checks that needed it need it no longer; the answer says which, so that an undo can put it back. */
export async function deleteCheck(
  scope: ProjectScope,
  input: DeleteCheckInput,
): Promise<Answer<{ version: number; neededBy: string[] }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "delete-check" }, async (tx) => {
    const { procedure, checks } = await openDraft(tx, scope, input);
    if (!checks.some((check) => check.key === input.key)) {
      return reject("not-found", "The check is not in this draft any more.");
    }
    const inDraft = (key: string) => and(eq(procedureChecks.procedureId, procedure.id), eq(procedureChecks.key, key));
    await tx.delete(procedureChecks).where(inDraft(input.key));
    const dependants = checks.filter((check) => check.needs.includes(input.key));
    for (const check of dependants) {
      const needs = check.needs.filter((key) => key !== input.key);
      await tx.update(procedureChecks).set({ needs }).where(inDraft(check.key));
    }
    const rows = checks
      .filter((check) => check.key !== input.key)
      .map((check) => ({ ...check, needs: check.needs.filter((key) => key !== input.key) }));
    return { version: await closeDraft(tx, procedure.id, rows), neededBy: dependants.map((check) => check.key) };
  });
}
