import { defineRoute } from "@/lib/actions/define-route";
import { recordAttempt } from "@/lib/attempt/record-attempt";
import { recordAttemptInput } from "@/lib/attempt/schema";

/** The bench records here. Plain JSON, so that attempts held on a device survive a new build of the application. */
export const POST = defineRoute({
  name: "record-attempt",
  permission: "attempt.record",
  input: recordAttemptInput,
  run: recordAttempt,
});
