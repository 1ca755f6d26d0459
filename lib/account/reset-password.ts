import { eq, sql } from "drizzle-orm";
import { spendAccountToken, spendAllAccountTokens } from "@/db/queries/account-tokens";
import { deleteSessions } from "@/db/queries/sessions";
import { findUser } from "@/db/queries/users";
import { users } from "@/db/schema/people";
import { reject, type Answer } from "@/lib/actions/answer";
import { tokenHash } from "@/lib/auth/token";
import { change } from "@/lib/event/change";
import { LINK_REFUSALS } from "./link-refusals";
import { lookAtLink } from "./look-at-link";
import { hashPassword } from "./password";
import { passwordWeakness } from "./password-rules";
import type { ResetInput } from "./schema";

/** Sets a new password through the link of a mail. The link proves the address; every session of the account ends. */
export async function resetPassword(input: ResetInput): Promise<Answer<{ email: string }>> {
  const link = await lookAtLink("reset-password", input.token);
  if (link.state !== "open" && link.state !== "used") return { ok: false, error: LINK_REFUSALS[link.state] };
  const passwordHash = await hashPassword(input.password);
  return change({ writeId: input.writeId, userId: null, action: "reset-password" }, async (tx) => {
    const spent = await spendAccountToken(tx, "reset-password", tokenHash(input.token));
    const user = spent && (await findUser(tx, spent.userId));
    if (!user) return reject(LINK_REFUSALS.used.code, LINK_REFUSALS.used.message);
    const weakness = passwordWeakness(input.password, user.email);
    if (weakness) reject("invalid", "The password needs another look.", { fields: { password: weakness } });
    await tx
      .update(users)
      .set({ passwordHash, emailVerified: user.emailVerified ?? sql`now()`, mailBouncedAt: null })
      .where(eq(users.id, user.id));
    await spendAllAccountTokens(tx, "reset-password", user.id);
    await spendAllAccountTokens(tx, "confirm-address", user.id);
    await deleteSessions(tx, user.id);
    return { email: user.email };
  });
}
