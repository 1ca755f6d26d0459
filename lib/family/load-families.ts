import { database } from "@/db/client";
import { findFamilyUse } from "@/db/queries/families";
import { findOwnFamilies } from "@/db/queries/machine";
import type { ProjectScope } from "@/lib/access/scope";
import { FAMILIES, findFamily, type Family } from "@/lib/calc/levels";
import { familyFigures } from "./schema";

export type FamilyLine = {
  /** Null for a built-in one. */
  id: string | null;
  version: number;
  family: Family;
  /** Pins that name it, in any spelling. */
  pins: number;
  /** The built-in family whose place an own one takes. */
  replaces: string | null;
  /** A built-in family whose place an own one took. */
  replacedBy: string | null;
};

export type FamiliesView = { own: FamilyLine[]; builtIn: FamilyLine[]; unknown: { name: string; pins: number }[] };

/** Built-in and own families, and the names that pins use for none of them. Two queries. */
export async function loadFamilies(scope: ProjectScope): Promise<FamiliesView> {
  const db = database();
  const [rows, use] = await Promise.all([findOwnFamilies(db, scope), findFamilyUse(db, scope)]);
  const kept = rows.map((row) => ({ row, family: { name: row.name, ...familyFigures.parse(row.figures) } }));
  const known = [...kept.map(({ family }) => family), ...FAMILIES];
  const pinsOf = (family: Family) =>
    use.filter(({ name }) => findFamily(known, name) === family).reduce((total, { pins }) => total + pins, 0);
  return {
    own: kept.map(({ row, family }) => ({
      id: row.id,
      version: row.version,
      family,
      pins: pinsOf(family),
      replaces: findFamily(FAMILIES, family.name)?.name ?? null,
      replacedBy: null,
    })),
    builtIn: FAMILIES.map((family) => ({
      id: null,
      version: 0,
      family,
      pins: pinsOf(family),
      replaces: null,
      replacedBy: kept.find((one) => findFamily([one.family], family.name))?.family.name ?? null,
    })),
    unknown: use.filter(({ name }) => findFamily(known, name) === undefined),
  };
}
