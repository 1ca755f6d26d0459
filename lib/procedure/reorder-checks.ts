import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { closeDraft, openDraft } from "./open-draft";
import type { ReorderChecksInput } from "./schema";

/** The whole order at once; stages keep their own order among each other. */
export async function reorderChecks(
  scope: ProjectScope,
  input: ReorderChecksInput,
): Promise<Answer<{ version: number }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "reorder-checks" }, async (tx) => {
    const { procedure, checks } = await openDraft(tx, scope, input);
    const byKey = new Map(checks.map((check) => [check.key, check]));
    const rows = [...new Set(input.keys)].flatMap((key) => byKey.get(key) ?? []);
    if (rows.length !== checks.length) {
      return reject("invalid", "The order names other checks than the draft has. Nothing was changed.");
    }
    return { version: await closeDraft(tx, procedure.id, rows) };
  });
}
