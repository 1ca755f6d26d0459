import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { database } from "@/db/client";
import { users } from "@/db/schema/people";
import { hashPassword } from "@/lib/account/password";
import { makeViewer } from "../support/people";

export const PASSWORD = "copper and solder 9";

export const freshAddress = (name: string) => `${name}.${randomUUID()}@example.org`;

/** Somebody with a confirmed address and the password above, and no project. */
export async function makeAccount(name = "Ada") {
  const viewer = await makeViewer({ name });
  const passwordHash = await hashPassword(PASSWORD);
  await database().update(users).set({ passwordHash }).where(eq(users.id, viewer.userId));
  return viewer;
}
