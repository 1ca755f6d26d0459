import type { Transaction } from "@/db/client";
import { spendAllAccountTokens } from "@/db/queries/account-tokens";
import { accountTokens, type AccountTokenPurpose } from "@/db/schema/people";
import { tokenFor, tokenHash } from "@/lib/auth/token";
import { enqueue } from "@/lib/jobs/enqueue";

const HOUR = 3_600_000;

/** How long the links work. */
export const TOKEN_HOURS: Record<AccountTokenPurpose, number> = { "confirm-address": 48, "reset-password": 2 };

/** Makes a single-use link for the person and enqueues the mail that carries it. Earlier links of its kind end. */
export async function issueAccountToken(tx: Transaction, purpose: AccountTokenPurpose, userId: string): Promise<void> {
  await spendAllAccountTokens(tx, purpose, userId);
  const id = crypto.randomUUID();
  await tx.insert(accountTokens).values({
    id,
    userId,
    purpose,
    tokenHash: tokenHash(tokenFor(purpose, id)),
    expiresAt: new Date(Date.now() + TOKEN_HOURS[purpose] * HOUR),
  });
  await enqueue(tx, "send-mail", { kind: purpose, id });
}
