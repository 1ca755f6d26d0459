import { database } from "@/db/client";
import { countOpenChecks } from "@/db/queries/rack";
import type { ProjectScope } from "@/lib/access/scope";

export type PlaceCounts = { failing: number; doubtful: number; toMend: number; faults: number };

/**
 * The figures beside the places in the header. Doubtful includes reopened: both wait to be repeated. To mend are the
 * open findings of the wiring that must be mended; faults are those that are open or traced.
 */
export async function loadPlaceCounts(scope: ProjectScope): Promise<PlaceCounts> {
  return countOpenChecks(database(), scope);
}
