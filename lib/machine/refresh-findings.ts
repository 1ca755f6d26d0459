import { and, eq, inArray, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { ruleFindings } from "@/db/schema/wiring";
import { checkMachine } from "@/lib/calc/interconnect";
import { loadMachine } from "./load-machine";

type InProject = { projectId: string };

/** Two changes of one design at once: the second computes from what the first left. Ends with the transaction. */
const WIRING = 4110;

/**
 * Runs the rule check over the machine as it stands after the change and stores what it found. Asked by every change of
 * what the check looks at, in the transaction of the change. An acceptance stays while the finding rests upon the same
 * facts, and ends when they change or the finding is gone.
 */
export async function refreshFindings(tx: Transaction, { projectId }: InProject): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(${WIRING}, hashtext(${projectId}))`);
  const { findings } = checkMachine(await loadMachine(tx, { projectId }));
  const kept = await tx
    .select({ key: ruleFindings.key, acceptedFacts: ruleFindings.acceptedFacts })
    .from(ruleFindings)
    .where(eq(ruleFindings.projectId, projectId));
  const gone = kept.filter(({ key }) => !findings.some((one) => one.key === key)).map(({ key }) => key);
  if (gone.length > 0) {
    await tx.delete(ruleFindings).where(and(eq(ruleFindings.projectId, projectId), inArray(ruleFindings.key, gone)));
  }
  if (findings.length === 0) return;
  const same = sql`${ruleFindings.acceptedFacts} is not distinct from excluded.facts`;
  await tx
    .insert(ruleFindings)
    .values(
      findings.map((finding) => {
        const { key, rule, weight, boards, facts } = finding;
        return { projectId, key, rule, weight, boards, facts, finding };
      }),
    )
    .onConflictDoUpdate({
      target: [ruleFindings.projectId, ruleFindings.key],
      set: {
        rule: sql`excluded.rule`,
        weight: sql`excluded.weight`,
        boards: sql`excluded.boards`,
        facts: sql`excluded.facts`,
        finding: sql`excluded.finding`,
        state: sql`case when ${same} then ${ruleFindings.state} else 'open' end`,
        reason: sql`case when ${same} then ${ruleFindings.reason} else '' end`,
        acceptedBy: sql`case when ${same} then ${ruleFindings.acceptedBy} end`,
        acceptedAt: sql`case when ${same} then ${ruleFindings.acceptedAt} end`,
        acceptedFacts: sql`case when ${same} then ${ruleFindings.acceptedFacts} end`,
      },
    });
}
