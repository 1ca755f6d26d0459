"use server";

import { requestReset as mailReset } from "@/lib/account/request-reset";
import { forgotInput } from "@/lib/account/schema";
import { defineAction } from "@/lib/actions/define-action";

export const requestReset = defineAction({
  name: "request-reset",
  permission: "public",
  input: forgotInput,
  run: (_scope, input, call) => mailReset(input, call),
});
