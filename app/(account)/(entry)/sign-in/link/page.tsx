import type { Metadata } from "next";
import Link from "next/link";
import { AccountSheet } from "@/components/account/AccountSheet";
import { AccountOf } from "@/components/account/AccountOf";
import { buttonStyle } from "@/components/ui/button-style";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { safeNext } from "@/lib/account/safe-next";

export const metadata: Metadata = { title: "Sign in", referrer: "no-referrer" };

/** Opening the link does nothing: mail scanners open it too. Only the press uses it up. */
export default definePage({
  permission: "public",
  path: () => "/sign-in/link",
  render: async (_scope, { search }) => {
    const { token, email } = search;
    const next = safeNext([search.next, search.callbackUrl].find((one) => typeof one === "string"));
    if (typeof token !== "string" || typeof email !== "string" || !token || !email) {
      return (
        <AccountSheet title="Sign in">
          <Notice kind="error">
            <p>
              This link is not complete. Open it from the mail once more, or{" "}
              <Link className="link" href="/sign-in">
                ask for a new one
              </Link>
              .
            </p>
          </Notice>
        </AccountSheet>
      );
    }
    return (
      <AccountSheet title="Sign in" lede="One press, and you are in. The link works once.">
        <form action="/api/auth/callback/link" method="get" className="flex flex-col gap-4">
          <AccountOf email={email} />
          <input type="hidden" name="token" value={token} />
          <input type="hidden" name="email" value={email} />
          <input type="hidden" name="callbackUrl" value={next} />
          <button type="submit" className={buttonStyle("primary", "lg")}>
            Sign in
          </button>
        </form>
      </AccountSheet>
    );
  },
});
