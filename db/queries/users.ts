import { eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { users } from "@/db/schema/people";

export type UserRow = typeof users.$inferSelect;

/** Addresses are kept trimmed and in lower case; see normalEmail in lib/account/schema.ts. */
export async function findUserByEmail(db: Queryable, email: string): Promise<UserRow | undefined> {
  const [row] = await db.select().from(users).where(eq(users.email, email)).limit(1);
  return row;
}

export async function findUser(db: Queryable, userId: string): Promise<UserRow | undefined> {
  const [row] = await db.select().from(users).where(eq(users.id, userId)).limit(1);
  return row;
}
