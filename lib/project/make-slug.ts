import { like, or, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { projects } from "@/db/schema/projects";

/** Words that stand in an address under /projects already. */
const TAKEN_WORDS = ["new"];

/** "Tide computer" → "tide-computer"; a name without Latin letters becomes "project". */
export function slugFrom(name: string): string {
  const plain = name
    .normalize("NFKD")
    .replace(/\p{Mark}/gu, "")
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, "-")
    .replace(/^-+|-+$/g, "")
    .slice(0, 48)
    .replace(/-+$/, "");
  return plain === "" || TAKEN_WORDS.includes(plain) ? (plain === "" ? "project" : `project-${plain}`) : plain;
}

/** The first free one of name, name-2, name-3 … */
export async function freeSlug(db: Queryable, name: string): Promise<string> {
  const wanted = slugFrom(name);
  const rows = await db
    .select({ slug: projects.slug })
    .from(projects)
    .where(or(eq(projects.slug, wanted), like(projects.slug, `${wanted}-%`)));
  const taken = new Set(rows.map((row) => row.slug));
  if (!taken.has(wanted)) return wanted;
  for (let count = 2; ; count += 1) {
    if (!taken.has(`${wanted}-${count}`)) return `${wanted}-${count}`;
  }
}
