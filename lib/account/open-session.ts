import { AuthError } from "next-auth";
import { ok, type Answer } from "@/lib/actions/answer";
import { signIn } from "@/lib/auth/auth";
import { SignInRefused } from "@/lib/auth/config";

type Given = { email: string; password: string };

/** Checks the password, opens a session and sets its cookie; answers `value` then. Runs in a server action only. */
export async function openSessionWith<Value>(given: Given, value: Value): Promise<Answer<Value>> {
  try {
    await signIn("password", { email: given.email, password: given.password, redirect: false });
    return ok(value);
  } catch (error) {
    if (error instanceof SignInRefused) return { ok: false, error: error.refusal };
    // The library wraps what went wrong inside, for instance a database that does not answer.
    if (error instanceof AuthError && error.cause?.err) throw error.cause.err;
    throw error;
  }
}
