import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { AccountSheet } from "@/components/account/AccountSheet";
import { SignUpForm } from "@/components/account/SignUpForm";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { isSignUpOpen } from "@/lib/account/sign-up";
import { HOME } from "@/lib/account/safe-next";
import { signUp } from "./actions";

export const metadata: Metadata = { title: "Sign up" };

export default definePage({
  permission: "public",
  path: () => "/sign-up",
  render: async ({ viewer }) => {
    if (viewer) redirect(HOME);
    const foot = (
      <p>
        You have an account?{" "}
        <Link className="link" href="/sign-in">
          Sign in
        </Link>
      </p>
    );
    if (!isSignUpOpen()) {
      return (
        <AccountSheet title="Sign up" foot={foot}>
          <Notice kind="info">
            <p>
              This installation takes people by invitation only. Ask a maintainer of your project to invite you, then
              open the link in the mail.
            </p>
          </Notice>
        </AccountSheet>
      );
    }
    return (
      <AccountSheet title="Sign up" lede="For people who build machines out of several circuit boards." foot={foot}>
        <SignUpForm signUp={signUp} />
      </AccountSheet>
    );
  },
});
