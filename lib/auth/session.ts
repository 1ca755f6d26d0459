import { randomBytes } from "node:crypto";
import { database } from "@/db/client";
import { sessions } from "@/db/schema/people";

/** Thirty days: people come back to the bench once a week or so. */
export const SESSION_SECONDS = 30 * 24 * 3600;

/** Makes the row of a new session and answers its token, which becomes the cookie. */
export async function openSession(userId: string): Promise<string> {
  const sessionToken = randomBytes(32).toString("base64url");
  await database()
    .insert(sessions)
    .values({ sessionToken, userId, expires: new Date(Date.now() + SESSION_SECONDS * 1000) });
  return sessionToken;
}
