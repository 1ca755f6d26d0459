import type { Metadata } from "next";
import Link from "next/link";
import { SettingsPage } from "@/components/account/SettingsPage";
import { SubscriptionList } from "@/components/digest/SubscriptionList";
import { Notice } from "@/components/ui/Notice";
import { loadProfile } from "@/lib/account/load-profile";
import { timeZones } from "@/lib/account/time-zones";
import { definePage } from "@/lib/actions/define-page";
import { loadSubscriptions } from "@/lib/digest/load-subscriptions";
import { updateSubscription } from "./actions";

export const metadata: Metadata = { title: "Weekly e-mail" };

export default definePage({
  permission: "own",
  path: () => "/settings/digest",
  render: async (scope) => {
    const [profile, subscriptions] = await Promise.all([loadProfile(scope), loadSubscriptions(scope)]);
    return (
      <SettingsPage
        title="Weekly e-mail"
        lede="What passed, failed and was reopened in the week, new log entries with pictures, and what is next. One mail a project, at the hour you choose."
      >
        {profile.mailBounced && (
          <Notice kind="caution" title={`Mail to ${profile.email} came back`}>
            No weekly e-mail is sent until the address takes mail again.{" "}
            <Link href="/forgot" className="link">
              Ask for a link to set the password
            </Link>
            ; when you have used it, the e-mail goes on.
          </Notice>
        )}
        <SubscriptionList subscriptions={subscriptions} zones={timeZones()} save={updateSubscription} />
      </SettingsPage>
    );
  },
});
