import { database } from "@/db/client";
import { findUserByEmail } from "@/db/queries/users";
import { ok, type Answer } from "@/lib/actions/answer";
import { afterAnswer } from "@/lib/http/after-answer";
import type { Call } from "@/lib/http/call";
import { limit } from "@/lib/http/rate-limit";
import { issueAccountToken } from "./issue-token";
import type { ForgotInput } from "./schema";

/** Mails a link to set a new password, if the address has an account. The answer and its time are the same if not. */
export async function requestReset(input: ForgotInput, call: Call): Promise<Answer<null>> {
  for (const counted of [await limit("mail-ip", call.ip), await limit("reset", input.email)]) {
    if (!counted.ok) return counted;
  }
  await afterAnswer("request-reset", async () => {
    const user = await findUserByEmail(database(), input.email);
    if (user) await database().transaction((tx) => issueAccountToken(tx, "reset-password", user.id));
  });
  return ok(null);
}
