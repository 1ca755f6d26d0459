import { and, asc, eq, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { users } from "@/db/schema/people";
import { connectors, pins, ruleFindings } from "@/db/schema/wiring";

type InProject = { projectId: string };

/** All findings of the machine with who accepted them; the weightiest first, each weight by board and title. */
export async function findFindings(db: Queryable, scope: InProject) {
  return db
    .select({
      key: ruleFindings.key,
      rule: ruleFindings.rule,
      weight: ruleFindings.weight,
      finding: ruleFindings.finding,
      facts: ruleFindings.facts,
      state: ruleFindings.state,
      reason: ruleFindings.reason,
      acceptedBy: users.name,
      acceptedAt: ruleFindings.acceptedAt,
      foundAt: ruleFindings.foundAt,
    })
    .from(ruleFindings)
    .leftJoin(users, eq(users.id, ruleFindings.acceptedBy))
    .where(eq(ruleFindings.projectId, scope.projectId))
    .orderBy(
      sql`array_position(array['must', 'should', 'look'], ${ruleFindings.weight})`,
      sql`${ruleFindings.boards} ->> 0`,
      sql`${ruleFindings.finding} ->> 'title'`,
      asc(ruleFindings.key),
    );
}

/** Without a single pin the rule check has nothing to look at. */
export async function hasAnyPin(db: Queryable, scope: InProject): Promise<boolean> {
  const rows = await db
    .select({ id: pins.id })
    .from(pins)
    .innerJoin(connectors, eq(connectors.id, pins.connectorId))
    .where(eq(connectors.projectId, scope.projectId))
    .limit(1);
  return rows.length > 0;
}

/** The row stays locked until the transaction ends, so that a run of the rule check waits for the decision. */
export async function lockFinding(db: Queryable, scope: InProject, key: string) {
  const [row] = await db
    .select({
      id: ruleFindings.id,
      state: ruleFindings.state,
      facts: ruleFindings.facts,
      title: sql<string>`${ruleFindings.finding} ->> 'title'`,
    })
    .from(ruleFindings)
    .where(and(eq(ruleFindings.projectId, scope.projectId), eq(ruleFindings.key, key)))
    .for("update");
  return row;
}

/** What is open, for counts and the weekly mail, oldest first. */
export async function findOpenFindings(db: Queryable, scope: InProject) {
  return db
    .select({
      weight: ruleFindings.weight,
      title: sql<string>`${ruleFindings.finding} ->> 'title'`,
      foundAt: ruleFindings.foundAt,
    })
    .from(ruleFindings)
    .where(and(eq(ruleFindings.projectId, scope.projectId), eq(ruleFindings.state, "open")))
    .orderBy(asc(ruleFindings.foundAt));
}
