"use server";

import { defineAction } from "@/lib/actions/define-action";
import { voidAttempt } from "@/lib/attempt/void-attempt";
import { voidAttemptInput } from "@/lib/attempt/schema";

/** Taking back a slip just after it was recorded; the window and whose it is are the use case's to judge. */
export const voidSlipAction = defineAction({
  name: "void-slip",
  permission: "attempt.void-own",
  input: voidAttemptInput,
  run: voidAttempt,
});
