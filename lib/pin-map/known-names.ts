import type { Queryable } from "@/db/client";
import { findOwnNames } from "@/db/queries/pin-map";
import { FAMILIES } from "@/lib/calc/levels";
import type { KnownNames } from "./read-cell";

/** The families that a cell may name, built-in and the project's own, and the rails that imply a role. */
export async function knownNames(db: Queryable, scope: { projectId: string }): Promise<KnownNames> {
  const own = await findOwnNames(db, scope);
  return { families: [...new Set([...FAMILIES.map(({ name }) => name), ...own.families])], rails: own.rails };
}
