import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { spendAllAccountTokens } from "@/db/queries/account-tokens";
import { findUserByEmail } from "@/db/queries/users";
import { users } from "@/db/schema/people";
import { hashPassword } from "@/lib/account/password";
import { passwordWeakness } from "@/lib/account/password-rules";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { Call } from "@/lib/http/call";
import { limit } from "@/lib/http/rate-limit";
import { joinByInvitation, lockWorkingInvitation } from "./accept-invitation";
import type { SignUpByInvitationInput } from "./schema";

/**
 * Makes an account through an invitation and joins the project, all or nothing. The link came by mail, so the address
 * is confirmed with it; works whether or not sign-up is open.
 */
export async function signUpByInvitation(
  input: SignUpByInvitationInput,
  call: Call,
): Promise<Answer<{ slug: string; email: string }>> {
  const counted = await limit("sign-up", call.ip);
  if (!counted.ok) return counted;
  return change({ writeId: input.writeId, userId: null, action: "sign-up-by-invitation" }, async (tx) => {
    const invitation = await lockWorkingInvitation(tx, input.token);
    const { email } = invitation;
    const weakness = passwordWeakness(input.password, email);
    if (weakness) reject("invalid", "The password needs another look.", { fields: { password: weakness } });
    const userId = await makePerson(tx, email, input);
    const { slug } = await joinByInvitation(tx, invitation, { userId, timeZone: input.timeZone });
    return { slug, email };
  });
}

/** A sign-up that was never confirmed is taken over: only now has somebody proved the address. */
async function makePerson(tx: Transaction, email: string, input: SignUpByInvitationInput): Promise<string> {
  const known = await findUserByEmail(tx, email);
  if (known?.emailVerified) {
    return reject("conflict", `${email} has an account already. Sign in with it and open the link again.`);
  }
  const { name, timeZone } = input;
  const values = { name, timeZone, passwordHash: await hashPassword(input.password), emailVerified: new Date() };
  const [row] = known
    ? await tx.update(users).set(values).where(eq(users.id, known.id)).returning({ id: users.id })
    : await tx
        .insert(users)
        .values({ ...values, email })
        .onConflictDoNothing()
        .returning({ id: users.id });
  if (!row) return reject("conflict", `${email} was signed up in this very moment. Open the link again.`);
  await spendAllAccountTokens(tx, "confirm-address", row.id);
  await spendAllAccountTokens(tx, "reset-password", row.id);
  return row.id;
}
