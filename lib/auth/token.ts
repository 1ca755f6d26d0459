import { createHash, createHmac, timingSafeEqual } from "node:crypto";
import { env } from "@/lib/env";

export type TokenPurpose = "confirm-address" | "reset-password" | "invitation" | "unsubscribe";

/**
 * The token of a link, derived from the row's id with the installation's secret. It is never stored: the row keeps
 * tokenHash(token), and a job that mails the link needs only the id.
 */
export function tokenFor(purpose: TokenPurpose, id: string): string {
  return createHmac("sha256", env().AUTH_SECRET).update(`${purpose}:${id}`).digest("base64url");
}

export function tokenHash(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}

/** Compares in constant time. */
export function sameToken(left: string, right: string): boolean {
  const a = Buffer.from(tokenHash(left));
  const b = Buffer.from(tokenHash(right));
  return timingSafeEqual(a, b);
}
