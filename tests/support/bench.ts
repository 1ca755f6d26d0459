import { randomUUID } from "node:crypto";
import { and, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { procedureChecks } from "@/db/schema/procedures";
import { checks, type CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { recordAttempt } from "@/lib/attempt/record-attempt";
import { recordAttemptInput } from "@/lib/attempt/schema";

type Unit = { id: string };

/** The live check of a unit by its title. */
export async function checkOf(unit: Unit, title: string) {
  const rows = await database()
    .select({ check: checks })
    .from(checks)
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.unitId, unit.id), eq(procedureChecks.title, title), isNull(checks.retiredAt)));
  const [row] = rows;
  if (!row) throw new Error(`no check “${title}”`);
  return row.check;
}

export async function stateOf(unit: Unit, title: string): Promise<CheckState> {
  return (await checkOf(unit, title)).state;
}

/** States of all live checks of a unit in traveler order: "passed waiting waiting". */
export async function statesOf(unit: Unit): Promise<string> {
  const rows = await database()
    .select({ state: checks.state })
    .from(checks)
    .where(and(eq(checks.unitId, unit.id), isNull(checks.retiredAt)))
    .orderBy(checks.position);
  return rows.map((row) => row.state).join(" ");
}

type Given = { record: unknown } & Partial<Record<"id" | "note" | "performedAt" | "madeBy", string>> & {
    instrumentId?: string | null;
    attachmentIds?: string[];
    seenArrival?: number;
  };

/** Sends one attempt as the bench does, through the input schema. */
export async function send(scope: ProjectScope, checkId: string, given: Given) {
  const input = recordAttemptInput.parse({
    project: scope.slug,
    id: randomUUID(),
    checkId,
    performedAt: new Date().toISOString(),
    ...given,
  });
  return recordAttempt(scope, input);
}

export const conforms = { conforms: true };
export const fails = { conforms: false };

/** Records a statement by title; a note goes with what does not conform. */
export async function state(scope: ProjectScope, unit: Unit, title: string, record: { conforms: boolean }) {
  return must(
    send(scope, (await checkOf(unit, title)).id, { record, note: record.conforms ? "" : "Not as it should be." }),
  );
}

/** The value of an answer that must be good. */
export async function must<Value>(answer: Promise<Answer<Value>>): Promise<Value> {
  const given = await answer;
  if (!given.ok) throw new Error(`${given.error.code}: ${given.error.message}`);
  return given.value;
}

/** The refusal of an answer that must not be good. */
export async function refusal(answer: Promise<Answer<unknown>>) {
  const given = await answer;
  if (given.ok) throw new Error(`it was accepted: ${JSON.stringify(given.value)}`);
  return given.error;
}
