import { eq } from "drizzle-orm";
import { procedures } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { openDraft } from "./open-draft";
import type { DiscardDraftInput } from "./schema";

/** Throws the draft away. Issued versions and travelers know nothing of it. */
export async function discardDraft(scope: ProjectScope, input: DiscardDraftInput): Promise<Answer<null>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "discard-draft" }, async (tx) => {
    const { procedure } = await openDraft(tx, scope, input);
    await tx.delete(procedures).where(eq(procedures.id, procedure.id));
    return null;
  });
}
