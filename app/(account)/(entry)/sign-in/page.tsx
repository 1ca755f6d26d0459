import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { AccountSheet } from "@/components/account/AccountSheet";
import { DemoAccounts } from "@/components/account/DemoAccounts";
import { SignIn } from "@/components/account/SignIn";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { loadDemoAccounts } from "@/lib/account/load-demo-accounts";
import { safeNext } from "@/lib/account/safe-next";
import { isSignUpOpen } from "@/lib/account/sign-up";
import { sendSignInLink, signIn } from "./actions";

export const metadata: Metadata = { title: "Sign in" };

export default definePage({
  permission: "public",
  path: () => "/sign-in",
  render: async ({ viewer }, { search }) => {
    const next = safeNext(typeof search.next === "string" ? search.next : undefined);
    if (viewer) redirect(next);
    const people = loadDemoAccounts();
    return (
      <AccountSheet title="Sign in" foot={<SignUpHint />}>
        {typeof search.error === "string" && (
          <Notice kind="error" className="mb-4">
            {sentenceFor(search.error)}
          </Notice>
        )}
        {people.length > 0 && <DemoAccounts people={people} next={next} signIn={signIn} />}
        <SignIn next={next} signIn={signIn} sendLink={sendSignInLink} />
      </AccountSheet>
    );
  },
});

function SignUpHint() {
  return isSignUpOpen() ? (
    <p>
      No account yet?{" "}
      <Link className="link" href="/sign-up">
        Sign up
      </Link>
    </p>
  ) : (
    <p>New people come in by invitation: open the link in the mail that invited you.</p>
  );
}

/** The session library leads back here with a word when a link does not work. */
function sentenceFor(error: string): string {
  return error === "Verification"
    ? "This link was used already or has expired. Ask for a new one below."
    : "That did not work. Nothing was changed; try again, or ask for a link by e-mail.";
}
