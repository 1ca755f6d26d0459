import { eq } from "drizzle-orm";
import { users } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { SetThemeInput } from "./schema";

/** The colours chosen in the header, for every device that is signed in on from now on. This one has its cookie. */
export async function setTheme(scope: OwnScope, { writeId, theme }: SetThemeInput): Promise<Answer<null>> {
  return change({ writeId, userId: scope.viewer.userId, action: "set-theme" }, async (tx) => {
    await tx.update(users).set({ theme }).where(eq(users.id, scope.viewer.userId));
    return null;
  });
}
