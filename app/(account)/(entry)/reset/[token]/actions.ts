"use server";

import { openSessionWith } from "@/lib/account/open-session";
import { resetPassword } from "@/lib/account/reset-password";
import { resetInput } from "@/lib/account/schema";
import { defineAction } from "@/lib/actions/define-action";

export const reset = defineAction({
  name: "reset-password",
  permission: "public",
  input: resetInput,
  run: async (_scope, input) => {
    const done = await resetPassword(input);
    return done.ok ? openSessionWith({ email: done.value.email, password: input.password }, null) : done;
  },
});
