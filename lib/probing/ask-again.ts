import { eq } from "drizzle-orm";
import { findResults, findRound, lockRound } from "@/db/queries/probing";
import { probePlans } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { followUpProbes } from "@/lib/calc/continuity";
import { change } from "@/lib/event/change";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { lastWords } from "./said-result";
import type { AskAgainInput } from "./schema";
import { storedProbes } from "./stored-plan";

/** Adds the probes that the answers call for, behind the others: they tell crossed wires from plain opens. */
export async function askAgain(scope: ProjectScope, input: AskAgainInput): Promise<Answer<{ added: number }>> {
  return change({ writeId: input.writeId, userId: scope.viewer.userId, action: "ask-again" }, async (tx) => {
    const round = await lockRound(tx, scope, input.plan);
    const found = round && (await findRound(tx, scope, input.plan));
    if (!found) return reject("not-found", "There is no such round of probing in this project.");
    if (found.plan.closedAt !== null) return reject("gone", "This round is closed. Start another one.");
    const probes = storedProbes(found.plan.probes);
    const results = [...lastWords(await findResults(tx, input.plan)).values()];
    const more = followUpProbes(storedNetlist(found.netlist.content), probes, results);
    if (more.length > 0) {
      const all = [...probes, ...more];
      await tx.update(probePlans).set({ probes: all, count: all.length }).where(eq(probePlans.id, found.plan.id));
    }
    return { added: more.length };
  });
}
