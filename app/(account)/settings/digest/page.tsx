import type { Metadata } from "next";
import { SettingsPage } from "@/components/account/SettingsPage";
import { SubscriptionList } from "@/components/digest/SubscriptionList";
import { timeZones } from "@/lib/account/time-zones";
import { definePage } from "@/lib/actions/define-page";
import { loadSubscriptions } from "@/lib/digest/load-subscriptions";
import { updateSubscription } from "./actions";

export const metadata: Metadata = { title: "Weekly e-mail" };

export default definePage({
  permission: "own",
  path: () => "/settings/digest",
  render: async (scope) => (
    <SettingsPage
      title="Weekly e-mail"
      lede="What passed, failed and was reopened in the week, new log entries with pictures, and what is next. One mail a project, at the hour you choose."
    >
      <SubscriptionList subscriptions={await loadSubscriptions(scope)} zones={timeZones()} save={updateSubscription} />
    </SettingsPage>
  ),
});
