import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findConditions, findRails } from "@/db/queries/machine";
import { powerLines } from "@/db/schema/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { openLines, unchangedLine } from "./open-lines";
import type { PowerLineItem } from "./line-item";
import type { SavePowerLineInput } from "./schema";
import { lineWords } from "./line-kinds";

const MOST_LINES = 200;

type Saved = { line: string; item: PowerLineItem };

/** Adds a line to what a board draws, or changes one. */
export async function savePowerLine(scope: ProjectScope, input: SavePowerLineInput): Promise<Answer<Saved>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-power-line" }, async (tx) => {
    const { board, lines } = await openLines(tx, scope, input.board);
    const current = input.line === "" ? undefined : unchangedLine(lines, input.line, input.seen);
    const others = lines.filter((line) => line.id !== current?.id).map(({ item }) => item);
    if (!current && lines.length >= MOST_LINES) reject("invalid", `A board has at most ${MOST_LINES} lines here.`);
    const item = input.typed;
    await rejectUnknownRail(tx, scope, item, others);
    rejectTwice(item, others, board.name);
    const line = current?.id ?? (await insert(tx, board.id, (lines.at(-1)?.position ?? 0) + 1, item));
    if (current) await tx.update(powerLines).set({ item }).where(eq(powerLines.id, current.id));
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "power.line-saved", { code: board.code, what: lineWords(item) });
    await refreshFindings(tx, scope);
    return { line, item };
  });
}

async function insert(tx: Transaction, boardId: string, position: number, item: PowerLineItem): Promise<string> {
  const [row] = await tx.insert(powerLines).values({ boardId, position, item }).returning({ id: powerLines.id });
  if (!row) throw new Error("inserting a power line returned no row");
  return row.id;
}

/** A line takes from a rail of the machine, or from one that a regulator of the same board makes. */
async function rejectUnknownRail(
  tx: Transaction,
  scope: ProjectScope,
  { rail }: PowerLineItem,
  others: readonly PowerLineItem[],
): Promise<void> {
  const [rails, { logicRail }] = await Promise.all([findRails(tx, scope), findConditions(tx, scope)]);
  const made = others.flatMap((item) => (item.kind === "regulator" ? [item.output] : []));
  if ([...rails.map(({ name }) => name), logicRail, ...made].includes(rail)) return;
  const sentence = `There is no rail ${rail}. Add it to the rails, or a regulator that makes it to this board.`;
  reject("invalid", sentence, { fields: { "typed.rail": sentence } });
}

function rejectTwice(item: PowerLineItem, others: readonly PowerLineItem[], board: string): void {
  const isWhole = item.kind === "whole" && others.some((other) => other.kind === "whole" && other.rail === item.rail);
  if (isWhole) {
    const sentence = `What all of ${board} takes from ${item.rail} is typed in already. Change that line.`;
    reject("conflict", sentence, { fields: { "typed.rail": sentence } });
  }
  const isMade =
    item.kind === "regulator" && others.some((other) => other.kind === "regulator" && other.output === item.output);
  if (isMade) {
    const sentence = `Another regulator makes ${item.output} already. Give this one's rail a name of its own.`;
    reject("conflict", sentence, { fields: { "typed.output": sentence } });
  }
}
