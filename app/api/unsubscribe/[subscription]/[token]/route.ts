import { defineRoute } from "@/lib/actions/define-route";
import { endSubscription, unsubscribeInput } from "@/lib/digest/end-subscription";

/** RFC 8058: the mail reader posts here without cookies or sign-in; the address itself is the proof. */
export const POST = defineRoute({
  name: "unsubscribe",
  permission: "public",
  browserOnly: false,
  input: unsubscribeInput,
  run: (_scope, link) => endSubscription(link),
});
