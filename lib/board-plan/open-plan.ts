import type { Transaction } from "@/db/client";
import { findBoardByCode } from "@/db/queries/boards";
import { lockBoardPlan } from "@/db/queries/board-plans";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";

type Asked = { board: string; version: number };

/** The board and its plan, locked, if the plan is still the version that was looked at. */
export async function openPlan(tx: Transaction, scope: ProjectScope, asked: Asked) {
  const named = await findBoardByCode(tx, scope, asked.board.toUpperCase());
  const found = named && (await lockBoardPlan(tx, scope, named.id));
  if (!found) return reject("not-found", "There is no such board in this project.");
  const { board, plan } = found;
  if (board.archivedAt) reject("conflict", `${board.name} is archived. Restore it first.`);
  if (plan.version !== asked.version) {
    reject("conflict", `Somebody changed the plan of ${board.code} meanwhile. Look at both and save again.`, {
      details: { current: { version: plan.version } },
    });
  }
  return found;
}
