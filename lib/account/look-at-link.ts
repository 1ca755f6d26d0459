import { database } from "@/db/client";
import { findAccountToken } from "@/db/queries/account-tokens";
import type { AccountTokenPurpose } from "@/db/schema/people";
import { tokenHash } from "@/lib/auth/token";

export type LinkState =
  { state: "open"; email: string; name: string | null } | { state: "unknown" | "used" | "expired" };

/** What became of the link, without using it: mail scanners open every link they see. */
export async function lookAtLink(purpose: AccountTokenPurpose, token: string): Promise<LinkState> {
  const row = await findAccountToken(database(), purpose, tokenHash(token));
  if (!row) return { state: "unknown" };
  if (row.token.usedAt) return { state: "used" };
  if (row.token.expiresAt <= new Date()) return { state: "expired" };
  return { state: "open", email: row.user.email, name: row.user.name };
}
