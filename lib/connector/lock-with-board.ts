import type { Transaction } from "@/db/client";
import { lockBoard } from "@/db/queries/boards";
import { findConnector, lockConnector } from "@/db/queries/connectors";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";

/**
 * The connector and its board, both locked, the board first: changes of one board's connectors come one after another,
 * and a change that needs several of them never waits for one that waits for it.
 */
export async function lockWithBoard(tx: Transaction, scope: ProjectScope, connectorId: string) {
  const found = await findConnector(tx, scope, connectorId);
  const board = found && (await lockBoard(tx, scope, found.boardId));
  const connector = board && (await lockConnector(tx, scope, connectorId));
  if (!connector) return reject("not-found", "There is no such connector in this project.");
  return { connector, board };
}
