import { lockBoard, findBoardByCode } from "@/db/queries/boards";
import { findChecksOf, findProcedures } from "@/db/queries/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { beginDraft } from "./begin-draft";
import { checkRow } from "./load-procedure";
import type { StartDraftInput } from "./schema";
import { STARTERS } from "./starters/list";
import { readStarter } from "./starters/read-starter";

/** One draft a board: from a starter, from the newest issued version (same keys, so travelers can follow), or empty. */
export async function startDraft(scope: ProjectScope, input: StartDraftInput): Promise<Answer<{ version: number }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "start-draft" }, async (tx) => {
    const named = await findBoardByCode(tx, scope, input.board.toUpperCase());
    const board = named ? await lockBoard(tx, scope, named.id) : undefined;
    if (!board) return reject("not-found", "There is no such board in this project.");
    if (board.archivedAt) reject("conflict", `${board.name} is archived. Restore it first.`);
    const all = await findProcedures(tx, scope, board.code);
    if (all.some((procedure) => procedure.state === "draft")) {
      reject("conflict", `${board.name} has a draft already. Go on with that one, or throw it away first.`);
    }
    const newest = all.find((procedure) => procedure.state === "issued");
    if (input.from === "issued" && !newest) reject("conflict", `${board.name} has no issued version to begin from.`);
    const checks =
      input.from === "scratch"
        ? []
        : input.from === "issued"
          ? (newest ? await findChecksOf(tx, newest.id) : []).map(checkRow)
          : readStarter(STARTERS[input.from], () => crypto.randomUUID());
    const draft = await beginDraft(tx, scope, { boardId: board.id, checks });
    return { version: draft.version };
  });
}
