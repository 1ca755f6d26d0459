"use server";

import { confirmAddress } from "@/lib/account/confirm-address";
import { openSessionWith } from "@/lib/account/open-session";
import { confirmInput } from "@/lib/account/schema";
import { defineAction } from "@/lib/actions/define-action";

export const confirm = defineAction({
  name: "confirm-address",
  permission: "public",
  input: confirmInput,
  run: async (_scope, input, call) => {
    const done = await confirmAddress(input, call);
    return done.ok ? openSessionWith({ email: done.value.email, password: input.password }, null) : done;
  },
});
