import { env } from "@/lib/env";
import { afterAnswer } from "@/lib/http/after-answer";
import { mailSignInLink } from "./mail-sign-in-link";
import { safeNext } from "./safe-next";

/**
 * Mails the address of our own page, which asks for a press: mail scanners open every link they see, and the library's
 * own address would be used up by them. Sent when the answer is out, so that its time does not tell known addresses.
 */
export async function sendSignInLink(link: { email: string; token: string; url: string }): Promise<void> {
  const callback = new URL(new URL(link.url).searchParams.get("callbackUrl") ?? "/", env().APP_URL);
  const page = new URL("/sign-in/link", env().APP_URL);
  page.search = new URLSearchParams({
    token: link.token,
    email: link.email,
    next: safeNext(callback.pathname + callback.search),
  }).toString();
  await afterAnswer("sign-in-link", () => mailSignInLink(link.email, page.toString(), crypto.randomUUID()));
}
