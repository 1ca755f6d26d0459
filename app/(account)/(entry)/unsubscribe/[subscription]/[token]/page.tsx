import type { Metadata } from "next";
import { AccountSheet } from "@/components/account/AccountSheet";
import { EndSubscription } from "@/components/digest/EndSubscription";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { lookAtSubscription } from "@/lib/digest/end-subscription";
import { subscribeAgain, unsubscribe } from "./actions";

export const metadata: Metadata = { title: "Weekly e-mail", referrer: "no-referrer", robots: { index: false } };

export default definePage({
  permission: "public",
  path: ({ subscription, token }) => `/unsubscribe/${subscription}/${token}`,
  render: async (_scope, { params: { subscription = "", token = "" } }) => {
    const found = await lookAtSubscription({ subscription, token });
    return (
      <AccountSheet
        title={"projectName" in found && found.projectName ? `Weekly e-mail of ${found.projectName}` : "Weekly e-mail"}
      >
        {found.state === "unknown" ? (
          <Notice kind="error">{found.sentence}</Notice>
        ) : (
          <EndSubscription
            link={{ subscription, token }}
            projectName={found.projectName}
            isOn={found.state === "on"}
            unsubscribe={unsubscribe}
            subscribeAgain={subscribeAgain}
          />
        )}
      </AccountSheet>
    );
  },
});
