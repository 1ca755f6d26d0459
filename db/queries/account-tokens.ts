import { and, eq, gt, isNull, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { accountTokens, users, type AccountTokenPurpose } from "@/db/schema/people";

/** The row behind a link with its person, used up or not. */
export async function findAccountToken(db: Queryable, purpose: AccountTokenPurpose, tokenHash: string) {
  const [row] = await db
    .select({ token: accountTokens, user: users })
    .from(accountTokens)
    .innerJoin(users, eq(users.id, accountTokens.userId))
    .where(and(eq(accountTokens.tokenHash, tokenHash), eq(accountTokens.purpose, purpose)))
    .limit(1);
  return row;
}

/** Uses the link up; undefined when somebody was faster or it has expired. The database decides, so only one can win. */
export async function spendAccountToken(db: Queryable, purpose: AccountTokenPurpose, tokenHash: string) {
  const [row] = await db
    .update(accountTokens)
    .set({ usedAt: sql`now()` })
    .where(
      and(
        eq(accountTokens.tokenHash, tokenHash),
        eq(accountTokens.purpose, purpose),
        isNull(accountTokens.usedAt),
        gt(accountTokens.expiresAt, sql`now()`),
      ),
    )
    .returning({ userId: accountTokens.userId });
  return row;
}

/** Ends every open link of this kind: a new one, or what it was for, makes them pointless. */
export async function spendAllAccountTokens(
  db: Queryable,
  purpose: AccountTokenPurpose,
  userId: string,
): Promise<void> {
  await db
    .update(accountTokens)
    .set({ usedAt: sql`now()` })
    .where(and(eq(accountTokens.userId, userId), eq(accountTokens.purpose, purpose), isNull(accountTokens.usedAt)));
}
