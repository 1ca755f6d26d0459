import { createHash, randomBytes } from "node:crypto";
import type { BrowserContext } from "@playwright/test";
import { database } from "@/db/client";
import { sessions } from "@/db/schema/people";

export const appUrl = process.env["BASE_URL"] ?? process.env["APP_URL"] ?? "http://localhost:4310";

const day = 86_400_000;

/** The cookie of a fresh session, as signing in would leave it in the browser. */
export async function sessionCookie(viewer: { userId: string }) {
  const token = randomBytes(32).toString("base64url");
  const sessionToken = createHash("sha256").update(token).digest("base64url");
  await database()
    .insert(sessions)
    .values({ sessionToken, userId: viewer.userId, expires: new Date(Date.now() + day), userAgent: "Chromium" });
  return { name: "authjs.session-token", value: token };
}

/** Opens a session for the person in this browser. */
export async function signInAs(context: BrowserContext, viewer: { userId: string }): Promise<void> {
  const { name, value } = await sessionCookie(viewer);
  await context.addCookies([{ name, value, url: appUrl, httpOnly: true, sameSite: "Lax" }]);
}
