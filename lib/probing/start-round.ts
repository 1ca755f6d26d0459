import { findRails } from "@/db/queries/machine";
import { findNetlist } from "@/db/queries/netlists";
import { findContinuityChecks, findProbedUnit } from "@/db/queries/probing";
import { probePlans } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { planRound } from "./plan-round";
import { PROBING_LIMITS, type StartRoundInput } from "./schema";
import type { StoredOptions } from "./stored-plan";

/** Starts a round of probing. It keeps the netlist version and the order of its probes, whatever is taken later. */
export async function startRound(scope: ProjectScope, input: StartRoundInput): Promise<Answer<{ id: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "start-round" }, async (tx) => {
    const unit = await findProbedUnit(tx, scope, input.unit);
    if (!unit) return reject("not-found", "There is no such unit in this project.");
    if (unit.archivedAt !== null) return reject("gone", `${unit.serial} is archived. Restore it first.`);
    const found = await findNetlist(tx, scope, input.netlistId);
    if (!found || found.board.id !== unit.board.id) {
      return reject("not-found", `This is no netlist of ${unit.board.name}. Choose one of its own.`);
    }
    const checks = input.checkId === null ? [] : await findContinuityChecks(tx, scope, unit.id);
    if (input.checkId !== null && !checks.some(({ id }) => id === input.checkId)) {
      return reject("not-found", `This is no continuity check of ${unit.serial}.`);
    }
    const rails = (await findRails(tx, scope)).map(({ name }) => name);
    const { probes, figures } = planRound(storedNetlist(found.netlist.content), input.options, rails);
    if (probes.length === 0) {
      return reject("invalid", "There is nothing to probe with these options. Choose more of the board.");
    }
    if (probes.length > PROBING_LIMITS.probes) {
      const most = PROBING_LIMITS.probes.toLocaleString("en-GB");
      return reject("invalid", `A round has at most ${most} probes. Choose less of the board.`);
    }
    const options: StoredOptions = { asked: input.options, figures };
    const [row] = await tx
      .insert(probePlans)
      .values({
        ...{ projectId, options, probes, count: probes.length, checkId: input.checkId, createdBy: viewer.userId },
        unitId: unit.id,
        netlistId: found.netlist.id,
      })
      .returning({ id: probePlans.id });
    if (!row) throw new Error("the round was not inserted");
    const subject = { projectId, actorId: viewer.userId, unitId: unit.id, subjectId: row.id };
    await recordEvent(tx, subject, "probing.started", { serial: unit.serial, probes: probes.length });
    return { id: row.id };
  });
}
