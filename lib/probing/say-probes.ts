import { and, eq, inArray, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { findResults, lockRound } from "@/db/queries/probing";
import { probeResults } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { parseQuantity } from "@/lib/calc/units";
import { saidResult } from "./said-result";
import type { SaidResult } from "./round-view";
import type { GivenResult, SayProbesInput } from "./schema";

export type SaidSoFar = { results: SaidResult[]; closed: boolean };

/** Readings a device may have held before it found the network again; a clock may run ahead a little. */
const AHEAD_MS = 5 * 60_000;

/**
 * Takes what probes said, and takes back slips. Each result has the id that its device gave it, so a repeat changes
 * nothing and no write id is needed. Answers everything said so far, also by others.
 */
export async function sayProbes(scope: ProjectScope, input: SayProbesInput): Promise<Answer<SaidSoFar>> {
  const { userId } = scope.viewer;
  return database().transaction(async (tx): Promise<Answer<SaidSoFar>> => {
    const round = await lockRound(tx, scope, input.plan);
    if (!round) return refuse("not-found", "There is no such round of probing in this project.");
    const values = [];
    for (const given of input.results) {
      const read = readResult(given, round.count);
      if (typeof read === "string") return refuse("invalid", `${read} Nothing was kept.`);
      values.push({ ...read, id: given.id, planId: round.id, probe: given.probe, typed: given.typed, userId });
    }
    const ids = values.map(({ id }) => id);
    const known = ids.length === 0 ? [] : await tx.select().from(probeResults).where(inArray(probeResults.id, ids));
    if (known.some(({ planId }) => planId !== round.id)) {
      return refuse("conflict", "This id was used in another round. Nothing was kept.");
    }
    const isNew = values.length > known.length || input.voids.length > 0;
    if (round.closedAt !== null && isNew) {
      return refuse("gone", "This round is closed; nothing more is kept in it. Start another one.");
    }
    if (values.length > 0) await tx.insert(probeResults).values(values).onConflictDoNothing();
    if (input.voids.length > 0) {
      await tx
        .update(probeResults)
        .set({ voidedAt: new Date(), voidedBy: userId })
        .where(
          and(eq(probeResults.planId, round.id), inArray(probeResults.id, input.voids), isNull(probeResults.voidedAt)),
        );
    }
    const said = await findResults(tx, round.id);
    return ok({ results: said.map(saidResult), closed: round.closedAt !== null });
  });
}

type Read = Pick<typeof probeResults.$inferInsert, "beeps" | "ohm" | "performedAt">;

function readResult({ probe, beeps, typed, performedAt }: GivenResult, count: number): Read | string {
  if (probe >= count) return `The round has ${count} probes; there is no ${probe + 1}.`;
  if (performedAt.getTime() > Date.now() + AHEAD_MS) return "The device's clock runs ahead.";
  if (typed === "") return { beeps, ohm: null, performedAt };
  const read = parseQuantity(typed, "Ω");
  if (!read.ok) return read.message;
  const { value } = read.value;
  if (value < 0) return `“${typed}” is negative. Write a resistance.`;
  // An overload of the meter is silence: what it reads is beyond every limit.
  return Number.isFinite(value) ? { beeps: null, ohm: value, performedAt } : { beeps: false, ohm: null, performedAt };
}
