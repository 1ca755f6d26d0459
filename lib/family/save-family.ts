import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { lockFamily } from "@/db/queries/families";
import { findOwnFamilies } from "@/db/queries/machine";
import { families } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { findFamily } from "@/lib/calc/levels";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { familiesOf } from "./families-of";
import type { SaveFamilyInput } from "./schema";

type Saved = { id: string; name: string; version: number };

/** The project's own figures of a family, copied from a data sheet. The wiring is checked anew with them. */
export async function saveFamily(scope: ProjectScope, input: SaveFamilyInput): Promise<Answer<Saved>> {
  const { projectId, viewer } = scope;
  const { familyId, name, figures } = input;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-family" }, async (tx) => {
    const current = familyId === "" ? undefined : await lockFamily(tx, scope, familyId);
    if (familyId !== "" && !current) return reject("not-found", "There is no such family in this project.");
    if (current && current.version !== input.version) rejectStale(current);
    await rejectTakenName(tx, scope, name, current?.id);
    const version = (current?.version ?? 0) + 1;
    const [row] = current
      ? await tx.update(families).set({ name, figures, version }).where(eq(families.id, current.id)).returning()
      : await tx.insert(families).values({ projectId, name, figures, version }).onConflictDoNothing().returning();
    if (!row) return rejectName(name, name);
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: row.id }, "family.saved", { name });
    await refreshFindings(tx, scope);
    return { id: row.id, name, version };
  });
}

export function rejectStale(current: NonNullable<Awaited<ReturnType<typeof lockFamily>>>): never {
  const { name, figures, version } = current;
  return reject("conflict", `Somebody changed ${name} meanwhile. Look at both and save again.`, {
    details: { current: { name, figures, version } },
  });
}

async function rejectTakenName(tx: Transaction, scope: ProjectScope, name: string, ownId: string | undefined) {
  const others = (await findOwnFamilies(tx, scope)).filter((one) => one.id !== ownId);
  const same = findFamily(familiesOf(others).slice(0, others.length), name);
  if (same) rejectName(name, same.name);
}

function rejectName(name: string, there: string): never {
  const sentence =
    name === there
      ? `The project has figures of ${there} already. Change those.`
      : `${name} and ${there} name the same family, and the project has figures of ${there} already. Change those.`;
  return reject("invalid", sentence, { fields: { name: sentence } });
}
