import { and, eq } from "drizzle-orm";
import { procedureChecks } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, RefusalError, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { CheckRow } from "./check-row";
import { closeDraft, openDraft } from "./open-draft";
import { readSpec } from "./read-check";
import { MOST_CHECKS, type SaveCheckInput } from "./schema";

/** Adds a check to the draft, changes one, or brings a deleted one back under its own key. */
export async function saveCheck(
  scope: ProjectScope,
  input: SaveCheckInput,
): Promise<Answer<{ version: number; key: string }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "save-check" }, async (tx) => {
    const { procedure, checks } = await openDraft(tx, scope, input);
    const spec = readSpec(input.check);
    if (!spec.ok) throw new RefusalError(spec.error);
    const { typed: _typed, ...fields } = input.check;
    const key = input.key ?? crypto.randomUUID();
    const needs = input.check.needs.filter((needed) => checks.some((check) => check.key === needed));
    const values = { ...fields, needs, spec: spec.value };
    const old = checks.find((check) => check.key === key);
    if (old) {
      await tx
        .update(procedureChecks)
        .set(values)
        .where(and(eq(procedureChecks.procedureId, procedure.id), eq(procedureChecks.key, key)));
      const rows = checks.map((check) => (check.key === key ? { ...check, ...values } : check));
      return { version: await closeDraft(tx, procedure.id, rows), key };
    }
    if (checks.length >= MOST_CHECKS) reject("invalid", `A procedure has at most ${MOST_CHECKS} checks.`);
    const added: CheckRow = { key, position: 0, ...values };
    await tx.insert(procedureChecks).values({ ...added, procedureId: procedure.id });
    const at = checks.findIndex((check) => check.key === input.after);
    const place = at < 0 ? checks.length : at + 1;
    const rows = [...checks.slice(0, place), added, ...checks.slice(place)];
    return { version: await closeDraft(tx, procedure.id, rows), key };
  });
}
