import { EmptyState } from "@/components/ui/EmptyState";
import type { Option } from "@/components/ui/option";
import { SubscriptionForm, type Save, type Subscription } from "./SubscriptionForm";

type Props = { subscriptions: readonly Subscription[]; zones: readonly Option[]; save: Save };

export function SubscriptionList({ subscriptions, zones, save }: Props) {
  if (subscriptions.length === 0) {
    return (
      <EmptyState title="You are on no project">
        The weekly e-mail of a project can be switched on and off here once you have set one up or joined one.
      </EmptyState>
    );
  }
  return subscriptions.map((subscription) => (
    <SubscriptionForm key={subscription.project} subscription={subscription} zones={zones} save={save} />
  ));
}
