import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findBoard } from "@/db/queries/boards";
import { findConditions } from "@/db/queries/machine";
import { lockRails, renameRailInLines } from "@/db/queries/rails";
import { planConditions, rails } from "@/db/schema/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { railNow, type SaveRailInput } from "./schema";

type Saved = { id: string; version: number };

const MOST_RAILS = 24;

/** Adds a rail or changes one. A new name goes along with the lines of the boards and with the logic's rail. */
export async function saveRail(scope: ProjectScope, input: SaveRailInput): Promise<Answer<Saved>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-rail" }, async (tx) => {
    const all = await lockRails(tx, scope);
    const current = all.find((rail) => rail.id === input.rail);
    if (input.rail !== "" && !current) return reject("not-found", "This rail is gone. Somebody removed it meanwhile.");
    if (current && current.version !== input.version) {
      reject("conflict", `Somebody changed ${current.name} meanwhile. Look at both and save again.`, {
        details: { current: railNow.parse(current) },
      });
    }
    if (!current && all.length >= MOST_RAILS) reject("invalid", `A machine has at most ${MOST_RAILS} rails here.`);
    const same = all.find((rail) => rail.id !== input.rail && rail.name.toLowerCase() === input.name.toLowerCase());
    if (same) {
      const sentence = `There is a rail ${same.name} already. Change that one, or choose another name.`;
      reject("conflict", sentence, { fields: { name: sentence } });
    }
    if (input.sourceBoardId !== null && !(await findBoard(tx, scope, input.sourceBoardId))) {
      const sentence = "This board is not in the project any more. Choose another one.";
      reject("invalid", sentence, { fields: { source: sentence } });
    }
    const { name, volts, tolerancePercent, capacityA, sourceBoardId, copper } = input;
    const values = { name, volts, tolerancePercent, capacityA, sourceBoardId, copper };
    const saved = current
      ? await update(tx, current, values)
      : await insert(tx, { projectId, ...values, position: (all.at(-1)?.position ?? 0) + 1 });
    if (current && current.name !== name) await rename(tx, scope, current.name, name);
    const subject = { projectId, actorId: viewer.userId, subjectId: saved.id };
    await recordEvent(tx, subject, "rail.saved", { name, isNew: current === undefined });
    await refreshFindings(tx, scope);
    return saved;
  });
}

type Row = typeof rails.$inferInsert;

async function insert(tx: Transaction, row: Row): Promise<Saved> {
  const [saved] = await tx.insert(rails).values(row).returning({ id: rails.id, version: rails.version });
  if (!saved) throw new Error("inserting a rail returned no row");
  return saved;
}

async function update(tx: Transaction, { id, version }: Saved, values: Partial<Row>): Promise<Saved> {
  const raised = version + 1;
  await tx
    .update(rails)
    .set({ ...values, version: raised })
    .where(eq(rails.id, id));
  return { id, version: raised };
}

async function rename(tx: Transaction, scope: ProjectScope, from: string, to: string): Promise<void> {
  await renameRailInLines(tx, scope, from, to);
  const conditions = await findConditions(tx, scope);
  if (conditions.logicRail !== from) return;
  const version = conditions.version + 1;
  await tx
    .insert(planConditions)
    .values({ ...conditions, logicRail: to, version })
    .onConflictDoUpdate({ target: planConditions.projectId, set: { logicRail: to, version } });
}
