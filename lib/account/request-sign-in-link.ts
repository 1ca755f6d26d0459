import { ok, type Answer } from "@/lib/actions/answer";
import { signIn } from "@/lib/auth/auth";
import type { Call } from "@/lib/http/call";
import { limit } from "@/lib/http/rate-limit";
import type { LinkInput } from "./schema";

type Ask = (input: LinkInput) => Promise<unknown>;
const askLibrary: Ask = ({ email, next }) => signIn("link", { email, redirectTo: next, redirect: false });

/** Mails a link that signs in, if the address has a confirmed account. The answer is the same if not. */
export async function requestSignInLink(input: LinkInput, call: Call, ask: Ask = askLibrary): Promise<Answer<null>> {
  for (const counted of [await limit("mail-ip", call.ip), await limit("link", input.email)]) {
    if (!counted.ok) return counted;
  }
  await ask(input);
  return ok(null);
}
