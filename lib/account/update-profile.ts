import { eq } from "drizzle-orm";
import { users } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { ProfileInput } from "./schema";

export async function updateProfile(scope: OwnScope, input: ProfileInput): Promise<Answer<null>> {
  const { writeId, ...values } = input;
  return change({ writeId, userId: scope.viewer.userId, action: "update-profile" }, async (tx) => {
    await tx.update(users).set(values).where(eq(users.id, scope.viewer.userId));
    return null;
  });
}
