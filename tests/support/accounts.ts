import { randomUUID } from "node:crypto";
import { desc, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { findSessionUser } from "@/db/queries/sessions";
import { accountTokens, users, type AccountTokenPurpose } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import { hashPassword } from "@/lib/account/password";
import { openSession } from "@/lib/auth/session";
import { sessionKey } from "@/lib/auth/session-cookie";
import { tokenFor } from "@/lib/auth/token";
import type { Call } from "@/lib/http/call";
import { one } from "./database";

export const PASSWORD = "copper and solder 9";

export const freshAddress = (name = "somebody") => `${name}.${randomUUID()}@example.org`;

/** A request from a connection that nobody else in the tests has. */
export const freshCall = (): Call => ({ requestId: "test", ip: randomUUID() });

export const writeId = () => randomUUID();

/** An account with the password above. */
export async function makeAccount({ name = "Ada", isConfirmed = true, email = freshAddress(name.toLowerCase()) } = {}) {
  const passwordHash = await hashPassword(PASSWORD);
  const user = one(
    await database()
      .insert(users)
      .values({ name, email, passwordHash, emailVerified: isConfirmed ? new Date() : null })
      .returning(),
  );
  const scope: OwnScope = {
    viewer: { userId: user.id, email, name, emailVerified: isConfirmed, timeZone: "UTC" },
  };
  return { userId: user.id, email, scope };
}

/** A session, and whether it still opens anything. */
export async function signedIn(userId: string) {
  const token = await openSession(userId);
  const key = sessionKey(token);
  return { key, token, isOpen: async () => (await findSessionUser(database(), key)) !== undefined };
}

export const tokensOf = (email: string) =>
  database()
    .select({ id: accountTokens.id, purpose: accountTokens.purpose, usedAt: accountTokens.usedAt })
    .from(accountTokens)
    .innerJoin(users, eq(users.id, accountTokens.userId))
    .where(eq(users.email, email))
    .orderBy(desc(accountTokens.createdAt));

/** The link that the newest mail to the address carries: the mail's job derives it from the row in the same way. */
export async function mailedToken(email: string, purpose: AccountTokenPurpose): Promise<string> {
  const row = (await tokensOf(email)).find((token) => token.purpose === purpose && !token.usedAt);
  if (!row) throw new Error(`no ${purpose} link is open for the address`);
  return tokenFor(purpose, row.id);
}

export async function expireTokens(userId: string): Promise<void> {
  await database()
    .update(accountTokens)
    .set({ expiresAt: new Date(Date.now() - 1000) })
    .where(eq(accountTokens.userId, userId));
}
