import { database } from "@/db/client";
import { findResults, findRoundState } from "@/db/queries/probing";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { saidResult } from "./said-result";
import type { SaidSoFar } from "./say-probes";

/** What was said so far, for a bench that looks on while somebody else probes the other half. */
export async function readProbes(scope: ProjectScope, { plan }: { plan: string }): Promise<Answer<SaidSoFar>> {
  const db = database();
  const round = await findRoundState(db, scope, plan);
  if (!round) return refuse("not-found", "There is no such round of probing in this project.");
  return ok({ results: (await findResults(db, plan)).map(saidResult), closed: round.closedAt !== null });
}
