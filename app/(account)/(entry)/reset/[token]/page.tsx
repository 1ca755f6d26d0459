import type { Metadata } from "next";
import { AccountSheet } from "@/components/account/AccountSheet";
import { ResetForm } from "@/components/account/ResetForm";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { LINK_REFUSALS } from "@/lib/account/link-refusals";
import { lookAtLink } from "@/lib/account/look-at-link";
import { reset } from "./actions";

export const metadata: Metadata = { title: "Set a new password", referrer: "no-referrer" };

export default definePage({
  permission: "public",
  path: ({ token }) => `/reset/${token}`,
  render: async (_scope, { params: { token = "" } }) => {
    const link = await lookAtLink("reset-password", token);
    return (
      <AccountSheet
        title="Set a new password"
        lede={link.state === "open" ? "Every session of the account ends with it, on all devices." : undefined}
      >
        {link.state === "open" ? (
          <ResetForm token={token} email={link.email} reset={reset} />
        ) : (
          <Notice kind="error" actions={<ButtonLink href="/forgot">Ask for a new link</ButtonLink>}>
            {LINK_REFUSALS[link.state].message}
          </Notice>
        )}
      </AccountSheet>
    );
  },
});
