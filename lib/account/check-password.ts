import { database } from "@/db/client";
import { findUserByEmail } from "@/db/queries/users";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import type { Call } from "@/lib/http/call";
import { forgive, giveBack, limit } from "@/lib/http/rate-limit";
import { sendConfirmation } from "./send-confirmation";
import { passwordFits } from "./password";

type Given = { email: string; password: string };

/**
 * Who this is, by address and password. The answer to a wrong password and to an unknown address is the same, in words
 * and in time. That the address is not confirmed yet is said only to who knows the password.
 */
export async function checkPassword(given: Given, call: Call): Promise<Answer<{ userId: string }>> {
  const pair = `${given.email} ${call.ip}`;
  for (const counted of [await limit("sign-in-ip", call.ip), await limit("sign-in", pair)]) {
    if (!counted.ok) return counted;
  }
  const user = await findUserByEmail(database(), given.email);
  const fits = await passwordFits(user?.passwordHash, given.password);
  if (!user || !fits) {
    return refuse("invalid", "The address and the password do not belong together. Try again, or set a new password.");
  }
  await Promise.all([forgive("sign-in", pair), giveBack("sign-in-ip", call.ip)]);
  if (!user.emailVerified) {
    await sendConfirmation(user);
    return refuse(
      "forbidden",
      "Your address is not confirmed yet. We have sent you the link again: open it, then sign in.",
    );
  }
  return ok({ userId: user.id });
}
