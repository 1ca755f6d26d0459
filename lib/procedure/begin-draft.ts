import type { Transaction } from "@/db/client";
import { highestNumber } from "@/db/queries/procedures";
import { procedureChecks, procedures } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import type { CheckRow } from "./check-row";

type Given = { boardId: string; checks: readonly Omit<CheckRow, "position">[] };

/** The row of a draft and its checks. The board is locked and has no draft: the caller has looked. */
export async function beginDraft(tx: Transaction, scope: ProjectScope, { boardId, checks }: Given) {
  const number = (await highestNumber(tx, boardId)) + 1;
  const [draft] = await tx
    .insert(procedures)
    .values({ boardId, number, createdBy: scope.viewer.userId })
    .returning({ id: procedures.id, version: procedures.version });
  if (!draft) throw new Error("inserting a draft returned no row");
  if (checks.length > 0) {
    await tx
      .insert(procedureChecks)
      .values(checks.map((check, index) => ({ ...check, procedureId: draft.id, position: index + 1 })));
  }
  return draft;
}
