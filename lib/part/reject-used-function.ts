import type { Transaction } from "@/db/client";
import { findBlocks, lockBlocks } from "@/db/queries/blocks";
import { findParts } from "@/db/queries/parts";
import { reject } from "@/lib/actions/answer";
import { gateFunctionName } from "@/lib/calc/logic-parts";
import { knownFunctions } from "./own-logic";

/** After a change of the own parts: refuses it when gates of a block would be left with no part that does them. */
export async function rejectUsedFunction(tx: Transaction, scope: { projectId: string }, number: string): Promise<void> {
  await lockBlocks(tx, scope);
  const [blocks, parts] = await Promise.all([findBlocks(tx, scope), findParts(tx, scope)]);
  const known = knownFunctions(parts);
  for (const { name, gates, archivedAt } of blocks) {
    const orphan = gates.find(({ gateFunction }) => !known.has(gateFunction));
    if (!orphan || archivedAt) continue;
    const what = gateFunctionName(orphan.gateFunction);
    reject(
      "conflict",
      `${name} counts gates of ${number} (${what}), and no other part does that. Change the block first.`,
    );
  }
}
