import type { Queryable } from "@/db/client";
import { findResults, findRound } from "@/db/queries/probing";
import { findContinuityFaults, followUpProbes, type ContinuityReport } from "@/lib/calc/continuity";
import type { ProjectScope } from "@/lib/access/scope";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { lastWords } from "./said-result";
import { storedProbes } from "./stored-plan";

/** What the results of a round come to. */
export async function reportRound(
  db: Queryable,
  scope: ProjectScope,
  id: string,
): Promise<{ report: ContinuityReport; probed: number; followUps: number } | undefined> {
  const found = await findRound(db, scope, id);
  if (!found) return undefined;
  const said = lastWords(await findResults(db, id));
  const results = [...said.values()].map(({ probe, beeps, ohm }) => ({ probe, beeps, ohm }));
  const netlist = storedNetlist(found.netlist.content);
  const probes = storedProbes(found.plan.probes);
  return {
    report: findContinuityFaults(netlist, probes, results),
    probed: said.size,
    followUps: followUpProbes(netlist, probes, results).length,
  };
}
