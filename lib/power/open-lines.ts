import type { Transaction } from "@/db/client";
import { findBoardByCode, lockBoard } from "@/db/queries/boards";
import { findPowerLines } from "@/db/queries/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";
import { powerLineItem, type PowerLineItem } from "./line-item";

/** The board, locked, with its lines: changes of them come one after another. */
export async function openLines(tx: Transaction, scope: ProjectScope, code: string) {
  const named = await findBoardByCode(tx, scope, code.toUpperCase());
  const board = named && (await lockBoard(tx, scope, named.id));
  if (!board) return reject("not-found", "There is no such board in this project.");
  if (board.archivedAt) reject("conflict", `${board.name} is archived. Restore it first.`);
  const rows = await findPowerLines(tx, scope);
  const lines = rows
    .filter(({ boardId }) => boardId === board.id)
    .map(({ id, position, item }) => ({ id, position, item: powerLineItem.parse(item) }));
  return { board, lines };
}

type Line = { id: string; item: PowerLineItem };

/** The line that is to change, if it is still as it was looked at. */
export function unchangedLine<Found extends Line>(
  lines: readonly Found[],
  id: string,
  seen: PowerLineItem | null,
): Found {
  const line = lines.find((one) => one.id === id);
  if (!line) return reject("not-found", "This line is gone. Somebody removed it meanwhile.");
  // Both went through the same schema, which gives the fields in one order.
  if (JSON.stringify(line.item) !== JSON.stringify(seen)) {
    reject("conflict", "Somebody changed this line meanwhile. Look at both and save again.", {
      details: { current: line.item },
    });
  }
  return line;
}
