import { database } from "@/db/client";
import { findNetlist } from "@/db/queries/netlists";
import { findRails } from "@/db/queries/machine";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { planRound } from "./plan-round";
import { pointsOf, shownProbes } from "./round-points";
import type { PlanFigures, RoundPoint, RoundProbe } from "./round-view";
import type { PreviewRoundInput } from "./schema";

export type RoundPreview = { figures: PlanFigures; count: number; points: RoundPoint[]; probes: RoundProbe[] };

/** Of a long plan the list shows the beginning before it is started. */
const SHOWN = 2000;

/** What a round would be, before it is one. */
export async function previewRound(scope: ProjectScope, input: PreviewRoundInput): Promise<Answer<RoundPreview>> {
  const db = database();
  const [found, rails] = await Promise.all([findNetlist(db, scope, input.netlistId), findRails(db, scope)]);
  if (!found) return refuse("not-found", "There is no such netlist in this project.");
  const netlist = storedNetlist(found.netlist.content);
  const { probes, figures } = planRound(
    netlist,
    input.options,
    rails.map(({ name }) => name),
  );
  return ok({ figures, count: probes.length, ...shownProbes(pointsOf(netlist), probes.slice(0, SHOWN)) });
}
