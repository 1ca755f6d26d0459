import { eq, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findBlockChildren, findBlocks, findBoardBlocks, findBuiltUnits, lockBlocks } from "@/db/queries/blocks";
import { findParts } from "@/db/queries/parts";
import { blockChildren, blocks } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { reopenTies, spareSets } from "@/lib/board-plan/reopen-ties";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { knownFunctions } from "@/lib/part/own-logic";
import { outdatedUnits } from "./outdated-units";
import { rejectCircle } from "./reject-circle";
import type { SaveBlockInput } from "./schema";

type Saved = { id: string; version: number; outdated: string[]; tiesReopened: string[] };

/** Adds a block or changes one; the answer names the units that it no longer describes, and the boards whose ties it opens anew. */
export async function saveBlock(scope: ProjectScope, input: SaveBlockInput): Promise<Answer<Saved>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-block" }, async (tx) => {
    await lockBlocks(tx, scope);
    const spares = await spareSets(tx, scope);
    const [all, holdings] = await Promise.all([findBlocks(tx, scope), findBlockChildren(tx, scope)]);
    const current = all.find((block) => block.id === input.block);
    if (input.block !== "" && !current) return reject("not-found", "There is no such block in this project.");
    const before = holdings.filter(({ blockId }) => blockId === current?.id);
    if (current?.archivedAt) reject("conflict", `${current.name} is archived. Restore it first.`);
    if (current && current.version !== input.version) {
      const { name, summary, gates, version } = current;
      const children = before.map(({ childId, count }) => ({ block: childId, count }));
      reject("conflict", "Somebody changed this block meanwhile. Look at both and save again.", {
        details: { current: { name, summary, gates, children, version } },
      });
    }
    rejectTakenName(all, input);
    rejectUnknown(all, before, input, knownFunctions(await findParts(tx, scope)));
    const { gates, children } = input;
    rejectCircle(all, holdings, { id: current?.id ?? "", name: input.name, children });
    const isOther = !current || contents(current.gates, before) !== contents(gates, children.map(asHolding));
    const saved = await write(tx, scope, input, current, isOther);
    await tx.delete(blockChildren).where(eq(blockChildren.blockId, saved.id));
    if (children.length > 0) {
      await tx
        .insert(blockChildren)
        .values(children.map(({ block, count }) => ({ blockId: saved.id, childId: block, count })));
    }
    const outdated = current && isOther ? await outdatedBy(tx, scope, saved.id) : [];
    const subject = { projectId, actorId: viewer.userId, subjectId: saved.id };
    if (current) await recordEvent(tx, subject, "block.edited", { name: input.name, outdated: outdated.length });
    else await recordEvent(tx, subject, "block.created", { name: input.name });
    const tiesReopened = await reopenTies(tx, scope, spares);
    await refreshFindings(tx, scope);
    return { ...saved, outdated, tiesReopened };
  });
}

const asHolding = ({ block, count }: { block: string; count: number }) => ({ childId: block, count });

/** Equal for blocks that hold the same, in whatever order it was typed. */
function contents(
  gates: readonly { gateFunction: string; count: number }[],
  children: readonly { childId: string; count: number }[],
): string {
  const own = gates.map(({ gateFunction, count }) => `${gateFunction} ${count}`).sort();
  return JSON.stringify([own, children.map(({ childId, count }) => `${childId} ${count}`).sort()]);
}

type BlockRow = Awaited<ReturnType<typeof findBlocks>>[number];

async function write(
  tx: Transaction,
  { projectId }: ProjectScope,
  { name, summary, gates }: SaveBlockInput,
  current: BlockRow | undefined,
  isOther: boolean,
): Promise<{ id: string; version: number }> {
  const values = { name, summary, gates };
  const [row] = current
    ? await tx
        .update(blocks)
        .set({ ...values, version: current.version + 1, ...(isOther ? { changedAt: sql`now()` } : {}) })
        .where(eq(blocks.id, current.id))
        .returning({ id: blocks.id, version: blocks.version })
    : await tx
        .insert(blocks)
        .values({ projectId, ...values })
        .returning({ id: blocks.id, version: blocks.version });
  if (!row) throw new Error("writing a block returned no row");
  return row;
}

async function outdatedBy(tx: Transaction, scope: ProjectScope, id: string): Promise<string[]> {
  const [all, holdings, uses, units] = await Promise.all([
    findBlocks(tx, scope),
    findBlockChildren(tx, scope),
    findBoardBlocks(tx, scope),
    findBuiltUnits(tx, scope),
  ]);
  const found = outdatedUnits({ blocks: all, holdings, uses, units });
  return found.filter(({ block }) => block.id === id).map(({ serial }) => serial);
}

function rejectTakenName(all: readonly BlockRow[], { block, name }: SaveBlockInput): void {
  const same = all.find((other) => other.id !== block && other.name.toLowerCase() === name.toLowerCase());
  if (!same) return;
  const sentence = `There is a block ${same.name}${same.archivedAt ? ", which is archived" : ""} already. Choose another name.`;
  reject("conflict", sentence, { fields: { name: sentence } });
}

function rejectUnknown(
  all: readonly BlockRow[],
  before: readonly { childId: string }[],
  { gates, children }: SaveBlockInput,
  functions: ReadonlySet<string>,
): void {
  const fields: Record<string, string> = {};
  gates.forEach(({ gateFunction }, index) => {
    if (functions.has(gateFunction)) return;
    fields[`gates.${index}.gateFunction`] =
      `Row ${index + 1}: no part does “${gateFunction}”. Choose one from the list, or add your own part first.`;
  });
  children.forEach(({ block }, index) => {
    const child = all.find(({ id }) => id === block);
    const wasThere = before.some(({ childId }) => childId === block);
    if (!child) fields[`children.${index}.block`] = `Row ${index + 1}: there is no such block in this project.`;
    else if (child.archivedAt && !wasThere)
      fields[`children.${index}.block`] = `Row ${index + 1}: ${child.name} is archived. Restore it first.`;
  });
  const [first] = Object.values(fields);
  if (first) reject("invalid", first, { fields });
}
