import { findCheck } from "@/db/queries/checks";
import { findStandingChecks } from "@/db/queries/travelers";
import { checkPrerequisites, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { nameCheck } from "@/lib/calc/check-graph";
import { insist, NO_SUCH_CHECK } from "@/lib/check/lock-check";
import { lockStructure } from "@/lib/check/lock-states";
import { refreshStates } from "@/lib/check/refresh-states";
import { standingFromRow } from "@/lib/check/standing-from-row";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { describeCircle, findCircle, waitsFor } from "./find-circle";
import type { PrerequisiteInput } from "./schema";

/** One check waits for another from now on, also across units. Never in a circle. */
export async function addPrerequisite(
  scope: ProjectScope,
  input: PrerequisiteInput,
): Promise<Answer<{ state: CheckState }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "add-prerequisite" }, async (tx) => {
    await lockStructure(tx, projectId);
    const check = insist((await findCheck(tx, projectId, input.checkId)) ?? reject("not-found", NO_SUCH_CHECK));
    const needed = insist((await findCheck(tx, projectId, input.needsCheckId)) ?? reject("not-found", NO_SUCH_CHECK));
    const placed = (await findStandingChecks(tx, projectId, true)).map(standingFromRow);
    const byId = new Map(placed.map((one) => [one.id, one]));
    if (byId.get(check.id)?.needs.includes(needed.id)) {
      reject("conflict", `“${check.title}” waits for ${nameCheck(needed, check.serial)} already. Nothing was changed.`);
    }
    const edges = waitsFor(placed);
    edges.set(check.id, [needed.id, ...(edges.get(check.id) ?? [])]);
    const circle = findCircle(edges, check.id)?.flatMap((id) => byId.get(id) ?? []);
    if (circle) {
      const members = circle.map(({ id, serial, title }) => ({ checkId: id, serial, title }));
      reject("conflict", `That goes round in a circle: ${describeCircle(circle)} Nothing was changed.`, {
        details: { circle: members },
      });
    }
    await tx.insert(checkPrerequisites).values({ checkId: check.id, needsCheckId: needed.id });
    const refreshed = await refreshStates(tx, { projectId, actorId: viewer.userId }, [check.unitId]);
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, unitId: check.unitId, checkId: check.id, subjectId: needed.id },
      "prerequisite.added",
      {
        check: `${check.serial}: ${check.title}`,
        needs: `${needed.serial}: ${needed.title}`,
      },
    );
    return { state: refreshed.get(check.id)?.state ?? check.state };
  });
}
