import type { Metadata } from "next";
import Link from "next/link";
import { AccountSheet } from "@/components/account/AccountSheet";
import { ForgotForm } from "@/components/account/ForgotForm";
import { definePage } from "@/lib/actions/define-page";
import { requestReset } from "./actions";

export const metadata: Metadata = { title: "Set a new password" };

export default definePage({
  permission: "public",
  path: () => "/forgot",
  render: async () => (
    <AccountSheet
      title="Set a new password"
      lede="We mail you a link. It works once, within two hours; the old password holds until then."
      foot={
        <p>
          <Link className="link" href="/sign-in">
            Back to sign in
          </Link>
        </p>
      }
    >
      <ForgotForm requestReset={requestReset} />
    </AccountSheet>
  ),
});
