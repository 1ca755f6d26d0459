import { database } from "@/db/client";
import { countOpenChecks } from "@/db/queries/rack";
import type { ProjectScope } from "@/lib/access/scope";

export type PlaceCounts = { failing: number; doubtful: number };

/** The figures beside the places in the header. Doubtful includes reopened: both wait to be repeated. */
export async function loadPlaceCounts(scope: ProjectScope): Promise<PlaceCounts> {
  return countOpenChecks(database(), scope);
}
