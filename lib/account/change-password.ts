import { eq } from "drizzle-orm";
import { database } from "@/db/client";
import { spendAllAccountTokens } from "@/db/queries/account-tokens";
import { deleteSessions } from "@/db/queries/sessions";
import { findUser } from "@/db/queries/users";
import { users } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import { refuse, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { forgive, limit } from "@/lib/http/rate-limit";
import { hashPassword, passwordFits } from "./password";
import { passwordWeakness } from "./password-rules";
import type { ChangePasswordInput } from "./schema";

/** Changes the password and ends every other session of the person in the same transaction. */
export async function changePassword(
  scope: OwnScope,
  input: ChangePasswordInput,
  keepSession: string | undefined,
): Promise<Answer<{ ended: number }>> {
  const { userId, email } = scope.viewer;
  const counted = await limit("sign-in", `change ${userId}`);
  if (!counted.ok) return counted;
  const user = await findUser(database(), userId);
  if (!user) return refuse("signed-out", "Sign in first.");
  if (user.passwordHash && !(await passwordFits(user.passwordHash, input.current))) {
    return refuse("invalid", "The password was not changed.", {
      fields: { current: "This is not your present password." },
    });
  }
  const weakness = passwordWeakness(input.password, email);
  if (weakness) return refuse("invalid", "The password was not changed.", { fields: { password: weakness } });
  await forgive("sign-in", `change ${userId}`);
  const passwordHash = await hashPassword(input.password);
  return change({ writeId: input.writeId, userId, action: "change-password" }, async (tx) => {
    await tx.update(users).set({ passwordHash }).where(eq(users.id, userId));
    await spendAllAccountTokens(tx, "reset-password", userId);
    return { ended: await deleteSessions(tx, userId, keepSession) };
  });
}
