"use server";

import { defineAction } from "@/lib/actions/define-action";
import { updateSubscriptionInput } from "@/lib/digest/subscription-schema";
import { updateSubscription as updateIt } from "@/lib/digest/update-subscription";

export const updateSubscription = defineAction({
  name: "update-subscription",
  permission: "digest.own",
  input: updateSubscriptionInput,
  run: updateIt,
});
