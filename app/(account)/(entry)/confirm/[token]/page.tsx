import type { Metadata } from "next";
import { AccountSheet } from "@/components/account/AccountSheet";
import { ConfirmForm } from "@/components/account/ConfirmForm";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { LINK_REFUSALS } from "@/lib/account/link-refusals";
import { lookAtLink } from "@/lib/account/look-at-link";
import { confirm } from "./actions";

export const metadata: Metadata = { title: "Confirm your address", referrer: "no-referrer" };

export default definePage({
  permission: "public",
  path: ({ token }) => `/confirm/${token}`,
  render: async (_scope, { params: { token = "" } }) => {
    const link = await lookAtLink("confirm-address", token);
    return (
      <AccountSheet
        title="Confirm your address"
        lede="The link shows that the mailbox is yours, the password that you are the one who signed up."
      >
        {link.state === "open" ? (
          <ConfirmForm token={token} email={link.email} confirm={confirm} />
        ) : (
          <Notice kind="error" actions={<ButtonLink href="/sign-in">Sign in</ButtonLink>}>
            <p>{LINK_REFUSALS[link.state].message}</p>
            <p>If the address is confirmed, you can sign in. If not, signing in sends you the link again.</p>
          </Notice>
        )}
      </AccountSheet>
    );
  },
});
