import { randomBytes } from "node:crypto";
import { headers } from "next/headers";
import { database } from "@/db/client";
import { sessions } from "@/db/schema/people";
import { SESSION_SECONDS, sessionKey } from "./session-cookie";

/** Makes the row of a new session and answers its token, which becomes the cookie. */
export async function openSession(userId: string): Promise<string> {
  const token = randomBytes(32).toString("base64url");
  await keepSession(userId, token, new Date(Date.now() + SESSION_SECONDS * 1000));
  return token;
}

export async function keepSession(userId: string, token: string, expires: Date): Promise<void> {
  const userAgent = await browserName();
  await database()
    .insert(sessions)
    .values({ sessionToken: sessionKey(token), userId, expires, userAgent });
}

/** There are no headers outside a request (tests). */
async function browserName(): Promise<string> {
  try {
    return (await headers()).get("user-agent")?.slice(0, 300) ?? "";
  } catch {
    return "";
  }
}
