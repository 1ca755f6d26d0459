import { eq, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { findAccountToken, spendAccountToken, spendAllAccountTokens } from "@/db/queries/account-tokens";
import { users } from "@/db/schema/people";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { tokenHash } from "@/lib/auth/token";
import type { Call } from "@/lib/http/call";
import { limit } from "@/lib/http/rate-limit";
import { LINK_REFUSALS } from "./link-refusals";
import { lookAtLink } from "./look-at-link";
import { passwordFits } from "./password";
import type { ConfirmInput } from "./schema";

/**
 * Confirms the address with the link of the mail and the password of the sign-up together: the link proves the mailbox,
 * the password that both are the same person.
 */
export async function confirmAddress(input: ConfirmInput, call: Call): Promise<Answer<{ email: string }>> {
  const counted = await limit("sign-in", `${input.token} ${call.ip}`);
  if (!counted.ok) return counted;
  const link = await lookAtLink("confirm-address", input.token);
  if (link.state !== "open") return { ok: false, error: LINK_REFUSALS[link.state] };
  const row = await findAccountToken(database(), "confirm-address", tokenHash(input.token));
  if (!(await passwordFits(row?.user.passwordHash, input.password))) {
    return refuse(
      "invalid",
      "This is not the password of the sign-up. If you never signed up, leave the page: nothing happens.",
      {
        fields: { password: "This is not the password of the sign-up." },
      },
    );
  }
  return database().transaction(async (tx) => {
    const spent = await spendAccountToken(tx, "confirm-address", tokenHash(input.token));
    if (!spent) return { ok: false, error: LINK_REFUSALS.used };
    await tx
      .update(users)
      .set({ emailVerified: sql`now()`, mailBouncedAt: null })
      .where(eq(users.id, spent.userId));
    await spendAllAccountTokens(tx, "confirm-address", spent.userId);
    return ok({ email: link.email });
  });
}
