import type { EmailConfig } from "next-auth/providers";
import { env } from "@/lib/env";

/** Minutes that a sign-in link works. */
export const LINK_MINUTES = 20;

/** The page of our own that the mail leads to: it asks for a press, since mail scanners open every link. */
export function signInLinkPage(token: string, email: string, next: string): string {
  const address = new URL("/sign-in/link", env().APP_URL);
  address.search = new URLSearchParams({ token, email, next }).toString();
  return address.toString();
}

/** Signing in with a link by mail: the session library makes and consumes the token, we send it. */
export function linkProvider(send: EmailConfig["sendVerificationRequest"]): EmailConfig {
  return {
    id: "link",
    type: "email",
    name: "Link by e-mail",
    maxAge: LINK_MINUTES * 60,
    sendVerificationRequest: send,
    options: {},
  };
}
