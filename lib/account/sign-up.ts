import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findUserByEmail, type UserRow } from "@/db/queries/users";
import { users } from "@/db/schema/people";
import { refuse, type Answer } from "@/lib/actions/answer";
import { env } from "@/lib/env";
import { change } from "@/lib/event/change";
import type { Call } from "@/lib/http/call";
import { limit } from "@/lib/http/rate-limit";
import { issueAccountToken } from "./issue-token";
import { hashPassword } from "./password";
import type { SignUpInput } from "./schema";

/**
 * Asks for an account. The answer is the same whether or not the address has one; the mail tells its owner which.
 * Nobody is signed in before the link in the mail was opened and the password typed again there: an account that a
 * stranger prepared with somebody's address is of no use to the stranger.
 */
export async function signUp(input: SignUpInput, call: Call): Promise<Answer<null>> {
  if (env().SIGN_UP === "invitation") {
    return refuse(
      "forbidden",
      "This installation takes people by invitation only. Ask a maintainer of your project to invite you.",
    );
  }
  const counted = await limit("sign-up", call.ip);
  if (!counted.ok) return counted;
  const perAddress = await limit("confirm", input.email);
  if (!perAddress.ok) return perAddress;
  const passwordHash = await hashPassword(input.password);
  return change({ writeId: input.writeId, userId: null, action: "sign-up" }, async (tx) => {
    const known = await findUserByEmail(tx, input.email);
    if (known?.emailVerified) await issueAccountToken(tx, "reset-password", known.id);
    else await prepare(tx, known, input, passwordHash);
    return null;
  });
}

async function prepare(
  tx: Transaction,
  known: UserRow | undefined,
  input: SignUpInput,
  passwordHash: string,
): Promise<void> {
  const values = { name: input.name, passwordHash, timeZone: input.timeZone };
  const [row] = known
    ? await tx.update(users).set(values).where(eq(users.id, known.id)).returning({ id: users.id })
    : await tx
        .insert(users)
        .values({ ...values, email: input.email })
        .onConflictDoNothing()
        .returning({ id: users.id });
  // No row: the same address was signed up in this very moment, and its mail is on the way.
  if (row) await issueAccountToken(tx, "confirm-address", row.id);
}

/** Whether people may sign up without an invitation. */
export const isSignUpOpen = () => env().SIGN_UP === "open";
