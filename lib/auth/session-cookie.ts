import { createHash } from "node:crypto";
import { cookies } from "next/headers";
import { env } from "@/lib/env";

/** Thirty days: people come back to the bench once a week or so. */
export const SESSION_SECONDS = 30 * 24 * 3600;

const isSecure = () => env().APP_URL.startsWith("https:");

/** The session library's own name of the cookie, written out because we read it ourselves. */
export const sessionCookieName = () => `${isSecure() ? "__Secure-" : ""}authjs.session-token`;

/** What the sessions table keeps of a token. */
export const sessionKey = (token: string) => createHash("sha256").update(token).digest("base64url");

/** Key of the row of the session that asks, if the request carries one. */
export async function currentSessionKey(): Promise<string | undefined> {
  const token = (await cookies()).get(sessionCookieName())?.value;
  return token ? sessionKey(token) : undefined;
}
