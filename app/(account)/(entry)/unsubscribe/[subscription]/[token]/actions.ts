"use server";

import { defineAction } from "@/lib/actions/define-action";
import { endSubscription, restoreSubscription, unsubscribeInput } from "@/lib/digest/end-subscription";

export const unsubscribe = defineAction({
  name: "unsubscribe",
  permission: "public",
  input: unsubscribeInput,
  run: (_scope, link) => endSubscription(link),
});

export const subscribeAgain = defineAction({
  name: "subscribe-again",
  permission: "public",
  input: unsubscribeInput,
  run: (_scope, link) => restoreSubscription(link),
});
